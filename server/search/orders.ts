import type { Sort } from '#shared/api/vocabulary.ts';
import type { SearchDocument } from './document.ts';

/** Where a document stands in an order: its sort value, and its id where values are equal. */
export interface Position {
  readonly value: string | number;
  readonly id: string;
}
type FixedSort = Exclude<Sort, 'match'>;

const titles = new Intl.Collator('en-GB', { numeric: true });
const byCode = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);

const compareValues: Record<Sort, (a: never, b: never) => number> = {
  match: (a: number, b: number) => b - a,
  newest: (a: string, b: string) => byCode(b, a),
  title: (a: string, b: string) => titles.compare(a, b),
  /** The smallest first. */
  size: (a: number, b: number) => a - b,
};

export function comparePositions(sort: Sort, a: Position, b: Position): number {
  const values = compareValues[sort] as (a: Position['value'], b: Position['value']) => number;
  return values(a.value, b.value) || (sort === 'newest' ? byCode(b.id, a.id) : byCode(a.id, b.id));
}

export function positionIn(sort: FixedSort, document: SearchDocument): Position {
  const { id } = document;
  if (sort === 'newest') return { value: document.createdAt, id };
  if (sort === 'size') return { value: document.widthMm * document.heightMm, id };
  // As a cursor gives it back: UTF-8 has no half characters.
  return { value: Buffer.from(document.title).toString(), id };
}

/** Index of the first position that comes after `position`. */
export function firstAfter(sort: Sort, sorted: readonly Position[], position: Position): number {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    const at = sorted[middle];
    if (at !== undefined && comparePositions(sort, at, position) <= 0) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** All documents in one order, kept while they come and go: sorting 100 000 titles at each search is too slow. */
export class KeptOrder {
  readonly #sort: FixedSort;
  #positions: Position[] = [];

  constructor(sort: FixedSort) {
    this.#sort = sort;
  }

  get positions(): readonly Position[] {
    return this.#positions;
  }

  fill(documents: readonly SearchDocument[]): void {
    this.#positions = documents
      .map((document) => positionIn(this.#sort, document))
      .sort((a, b) => comparePositions(this.#sort, a, b));
  }

  add(document: SearchDocument): void {
    const position = positionIn(this.#sort, document);
    this.#positions.splice(firstAfter(this.#sort, this.#positions, position), 0, position);
  }

  remove(document: SearchDocument): void {
    const position = positionIn(this.#sort, document);
    this.#positions.splice(firstAfter(this.#sort, this.#positions, position) - 1, 1);
  }
}
