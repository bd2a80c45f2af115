import type { DesignList } from '#shared/api/designs.ts';
import type { Kind } from '#shared/api/vocabulary.ts';
import type { Drawer } from '../../components/PlanChest.tsx';
import { kindLabels } from '../../words/labels.ts';
import type { Filters } from './filters.ts';

export type Facets = DesignList['facets'];

export const countOf = (facet: Facets['kind'], value: string): number =>
  facet.find((line) => line.value === value)?.count ?? 0;

/** The kinds as drawers of the plan chest, the first one with all of them. */
export const drawersOf = (
  facets: Facets,
  { kind }: Pick<Filters, 'kind'>,
  hrefWith: (change: Partial<Filters>) => string,
): Drawer[] => [
  {
    value: 'all',
    label: 'All designs',
    count: facets.kind.reduce((sum, { count }) => sum + count, 0),
    href: hrefWith({ kind: null }),
    isOpen: kind === null,
  },
  ...(Object.entries(kindLabels) as [Kind, string][]).map(([value, label]) => ({
    value,
    label,
    count: countOf(facets.kind, value),
    href: hrefWith({ kind: value }),
    isOpen: kind === value,
  })),
];
