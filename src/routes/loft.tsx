import { keepPreviousData, useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { bitsQuery } from '../api/bits.ts';
import { designListQuery } from '../api/designs.ts';
import { Button } from '../components/Button.tsx';
import { LoadProblem } from '../components/LoadProblem.tsx';
import { PageTitle } from '../components/PageTitle.tsx';
import { Skeleton } from '../components/Skeleton.tsx';
import { useMyMachine } from '../machine/use-my-machine.ts';
import { useUnits } from '../units/units-context.tsx';
import { ActiveFilters } from './loft/ActiveFilters.tsx';
import { CardGrid } from './loft/CardGrid.tsx';
import { chipsOf } from './loft/chips.ts';
import { countOf } from './loft/drawers.ts';
import { EmptyLoft } from './loft/EmptyLoft.tsx';
import { FilterColumn } from './loft/FilterColumn.tsx';
import { searchOf } from './loft/filters.ts';
import { headingOf, subheadingOf } from './loft/heading.ts';
import { SortField } from './loft/SortField.tsx';
import { useFilters } from './loft/use-filters.ts';

const noFacets = { kind: [], material: [], bitMm: [], standing: [], fits: [] };

export function Component() {
  const { system } = useUnits();
  const { machine, isPending: isBenchPending } = useMyMachine();
  const { filters, hrefWith, change } = useFilters();
  const bits = useQuery(bitsQuery).data?.items ?? [];
  const list = useInfiniteQuery({
    ...designListQuery(searchOf(filters, machine?.id ?? null)),
    enabled: !isBenchPending,
    placeholderData: keepPreviousData,
  });

  const [first] = list.data?.pages ?? [];
  const facets = first?.facets ?? noFacets;
  // The counts of the last answer may stand for a moment; its cards may not, since filters exclude them.
  const isFresh = first !== undefined && !list.isPlaceholderData;
  const items = isFresh ? (list.data?.pages.flatMap((page) => page.items) ?? []) : [];
  const chips = chipsOf(filters, machine?.name ?? null, system);
  const counts = {
    total: first?.total ?? 0,
    fitting: machine === null ? null : countOf(facets.fits, 'true'),
    machineName: machine?.name ?? null,
    onlyFitting: filters.fits && machine !== null,
  };
  const left = counts.total - items.length;

  return (
    <div className="gap-x-8 md:grid md:grid-cols-[15rem_minmax(0,1fr)] md:grid-rows-[auto_1fr]">
      <div className="mb-4 md:col-start-2">
        <PageTitle tab="Loft">{isFresh ? headingOf(counts) : 'Loft'}</PageTitle>
        <div className="mt-1 flex flex-wrap items-center gap-x-4 gap-y-3">
          <p className="min-w-0 flex-1 basis-72 text-ink-soft" aria-live="polite">
            {isFresh ? subheadingOf(counts) : 'Looking through the loft.'}
          </p>
          <div className="flex flex-wrap items-center gap-2">
            <SortField filters={filters} onChange={(sort) => change({ sort })} />
            <ActiveFilters chips={chips} hrefWith={hrefWith} />
          </div>
        </div>
      </div>
      <div className="max-md:mb-4 md:col-start-1 md:row-span-2 md:row-start-1">
        <FilterColumn
          facets={facets}
          filters={filters}
          machineName={machine?.name ?? null}
          chosenCount={chips.length}
          hrefWith={hrefWith}
          change={change}
        />
      </div>
      <section aria-label="Designs" aria-busy={!isFresh} className="min-w-0 md:col-start-2">
        {list.error !== null && <LoadProblem error={list.error} onRetry={() => void list.refetch()} />}
        {list.error === null && !isFresh && <Skeleton shape="cards" />}
        {isFresh && items.length === 0 && <EmptyLoft chips={chips} hrefWith={hrefWith} />}
        {items.length > 0 && (
          <CardGrid items={items} machine={machine} bits={bits} material={filters.material} />
        )}
        {isFresh && list.hasNextPage && (
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
