import type { Kind, MaterialFamily, Sort, StandingWord } from '#shared/api/vocabulary.ts';
import { familyLabels, kindLabels, sortLabels, standingLabels } from '../../words/labels.ts';

/** What the member looks for. It lives in the address, under the names of `GET /api/designs`. */
export interface Filters {
  readonly q: string;
  readonly kind: Kind | null;
  readonly material: MaterialFamily | null;
  readonly bitMm: number | null;
  readonly standing: StandingWord | null;
  readonly fits: boolean;
  readonly maxMinutes: number | null;
  readonly sort: Sort | null;
}

export const noFilters: Filters = {
  q: '',
  kind: null,
  material: null,
  bitMm: null,
  standing: null,
  fits: false,
  maxMinutes: null,
  sort: null,
};

const codeIn = <Code extends string>(
  labels: Readonly<Record<Code, string>>,
  text: string | null,
): Code | null => (text !== null && Object.hasOwn(labels, text) ? (text as Code) : null);

const numberIn = (text: string | null): number | null => {
  const value = text !== null && /^\d{1,6}(\.\d{1,6})?$/.test(text) ? Number(text) : 0;
  return value > 0 ? value : null;
};

/** Reads the address; what it does not understand is left out, so that an old link still opens. */
export const filtersFrom = (params: URLSearchParams): Filters => ({
  q: (params.get('q') ?? '').trim().slice(0, 200),
  kind: codeIn(kindLabels, params.get('kind')),
  material: codeIn(familyLabels, params.get('material')),
  bitMm: numberIn(params.get('bitMm')),
  standing: codeIn(standingLabels, params.get('standing')),
  fits: params.get('fits') === 'true',
  maxMinutes: numberIn(params.get('maxMinutes')),
  sort: codeIn(sortLabels, params.get('sort')),
});

/** The address for these filters; what is not set is left out. */
export const paramsOf = (filters: Filters): URLSearchParams => {
  const params = new URLSearchParams();
  for (const [name, value] of Object.entries(filters)) {
    if (value !== null && value !== false && value !== '') params.set(name, String(value));
  }
  return params;
};

/** What the list asks of the server: the machine is named always, so that it counts what fits. */
export const searchOf = (filters: Filters, machineId: string | null): string => {
  const params = paramsOf({ ...filters, fits: filters.fits && machineId !== null });
  if (machineId !== null) params.set('machineId', machineId);
  return params.toString();
};
