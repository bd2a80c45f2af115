export type BenchThing = 'machine' | 'bit' | 'stock';

// The form that is open stands in the address: the back button closes it.

/** Where a thing of the bench is added. */
export const addHref = (thing: BenchThing): string => `/bench?add=${thing}`;

/** Where a thing of the bench is changed. */
export const changeHref = (thing: BenchThing, id: string): string => `/bench?change=${thing}&id=${id}`;

export interface OpenForm {
  readonly thing: BenchThing;
  /** Null for something new. */
  readonly id: string | null;
}

const isThing = (text: string | null): text is BenchThing =>
  text === 'machine' || text === 'bit' || text === 'stock';

/** The form that an address opens, or null for the bench itself. */
export const openForm = (search: URLSearchParams): OpenForm | null => {
  const added = search.get('add');
  if (isThing(added)) return { thing: added, id: null };
  const changed = search.get('change');
  const id = search.get('id');
  return isThing(changed) && id !== null ? { thing: changed, id } : null;
};
