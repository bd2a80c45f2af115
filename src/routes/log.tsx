import { useInfiniteQuery } from '@tanstack/react-query';
import { Download } from 'lucide-react';
import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { cutLogCsvHref, cutLogQuery } from '../api/cuts.ts';
import { Button } from '../components/Button.tsx';
import { buttonLook } from '../components/button-look.ts';
import { LoadProblem } from '../components/LoadProblem.tsx';
import { PageTitle } from '../components/PageTitle.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { useMyMachine } from '../machine/use-my-machine.ts';
import { EmptyLog } from './log/EmptyLog.tsx';
import { LogFilterBar } from './log/LogFilterBar.tsx';
import { LogTable } from './log/LogTable.tsx';
import { type LogFilters, logFiltersFrom, logParamsOf, logSearchOf } from './log/log-filters.ts';

const countWords = (total: number, { whose }: LogFilters): string => {
  const cuts = total === 1 ? '1 cut' : `${total} cuts`;
  return whose === 'mine' ? `${cuts} of yours` : `${cuts} in the club`;
};

export function Component() {
  const [params, setParams] = useSearchParams();
  const filters = useMemo(() => logFiltersFrom(params), [params]);
  const { machines } = useMyMachine();
  const search = logSearchOf(filters);
  const list = useInfiniteQuery(cutLogQuery(search));
  const records = useMemo(() => list.data?.pages.flatMap(({ items }) => items) ?? [], [list.data]);
  const total = list.data?.pages[0]?.total ?? 0;
  const change = (next: LogFilters) => setParams(logParamsOf(next), { preventScrollReset: true });
  const left = total - records.length;
  return (
    <div className="space-y-6">
      <div className="flex flex-wrap items-end justify-between gap-4">
        <div>
          <PageTitle>Cut log</PageTitle>
          <p className="mt-1 text-ink-soft" aria-live="polite">
            {list.data === undefined ? 'Reading the log.' : `${countWords(total, filters)}.`}
            {left > 0 && ` The newest ${records.length} are here, and sorted among themselves.`}
          </p>
        </div>
        {records.length > 0 && (
          <a href={cutLogCsvHref(search)} download className={buttonLook('line')}>
            <Download size={18} strokeWidth={1.5} aria-hidden="true" />
            Take as CSV
          </a>
        )}
      </div>
      <LogFilterBar filters={filters} machines={machines} onChange={change} />
      <section aria-label="Cuts" aria-busy={list.isPending}>
        {list.error !== null && <LoadProblem error={list.error} onRetry={() => void list.refetch()} />}
        {list.isPending && <Skeleton />}
        {list.data !== undefined && records.length === 0 && (
          <EmptyLog
            filters={filters}
            onClear={() => change({ whose: filters.whose, material: null, outcome: null, machineId: null })}
          />
        )}
        {records.length > 0 && <LogTable records={records} withMember={filters.whose === 'club'} />}
        {list.hasNextPage && (
          <p className="mt-8 text-center">
            <Button disabled={list.isFetchingNextPage} onClick={() => void list.fetchNextPage()}>
              {list.isFetchingNextPage ? 'Fetching more' : `Show more (${left} left)`}
            </Button>
          </p>
        )}
      </section>
    </div>
  );
}
