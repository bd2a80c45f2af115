import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { CutRecord } from '#shared/api/cuts.ts';
import { cutQuery } from '../../../api/cuts.ts';
import { LoadProblem } from '../../../components/LoadProblem.tsx';
import { OutcomeMark } from '../../../components/OutcomeMark.tsx';
import { Skeleton } from '../../../components/Skeleton.tsx';
import { WentWrongList } from '../../../components/WentWrongList.tsx';
import { sayDay } from '../../../words/say-day.ts';
import { MeasuredTable } from './MeasuredTable.tsx';
import { RecordFacts } from './RecordFacts.tsx';

/** A corrected record says so, and what it said before stays readable. */
export function EarlierVersions({ record }: { readonly record: CutRecord }) {
  const [isOpen, setIsOpen] = useState(false);
  const { data, error, refetch } = useQuery({ ...cutQuery(record.id), enabled: isOpen });
  if (record.correctedAt === undefined) return null;
  return (
    <details className="text-sm leading-5" onToggle={(event) => setIsOpen(event.currentTarget.open)}>
      <summary className="text-layout underline underline-offset-4">
        Corrected on {sayDay(record.correctedAt)}: what it said before
      </summary>
      <div className="mt-2 space-y-4 border-l-2 border-rule pl-4">
        {error !== null && <LoadProblem error={error} onRetry={() => void refetch()} />}
        {data === undefined && error === null && <Skeleton />}
        {data?.earlier.map((told) => (
          <section key={told.version} aria-label={`Version ${told.version}`} className="space-y-1">
            <p>
              Version {told.version}, until {sayDay(told.replacedAt)}: <OutcomeMark outcome={told.outcome} />{' '}
              <WentWrongList codes={told.wentWrong} />
            </p>
            <RecordFacts told={told} withSettings={record.settingsWithheld === undefined} />
            {told.measured.length > 0 && <MeasuredTable measured={told.measured} />}
            {told.notes !== '' && <p className="whitespace-pre-line">{told.notes}</p>}
          </section>
        ))}
      </div>
    </details>
  );
}
