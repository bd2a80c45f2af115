import type { Sort } from '#shared/api/vocabulary.ts';
import { readCursor, writeCursor } from './cursor.ts';
import type { SearchAnswer, SearchDocument, SearchQuery } from './document.ts';
import { FitsCache } from './fits-cache.ts';
import { comparePositions, firstAfter, KeptOrder, type Position } from './orders.ts';
import { Sieve } from './sieve.ts';
import { TextIndex } from './text-index.ts';

/** The loft's search, in memory: words, filters, facets and pages. Built from the database, never the record. */
export class SearchIndex {
  readonly #documents = new Map<string, SearchDocument>();
  #text = new TextIndex();
  readonly #orders = {
    newest: new KeptOrder('newest'),
    title: new KeptOrder('title'),
    size: new KeptOrder('size'),
  };
  readonly #fits = new FitsCache();

  upsert(document: SearchDocument): void {
    this.remove(document.id);
    this.#documents.set(document.id, document);
    this.#text.add(document);
    for (const order of Object.values(this.#orders)) order.add(document);
  }

  remove(id: string): void {
    const document = this.#documents.get(id);
    if (document === undefined) return;
    this.#documents.delete(id);
    this.#text.remove(document);
    for (const order of Object.values(this.#orders)) order.remove(document);
    this.#fits.forget(id);
  }

  replaceAll(documents: readonly SearchDocument[]): void {
    this.#documents.clear();
    this.#fits.clear();
    this.#text = new TextIndex();
    for (const document of documents) this.#documents.set(document.id, document);
    const all = [...this.#documents.values()];
    for (const document of all) this.#text.add(document);
    for (const order of Object.values(this.#orders)) order.fill(all);
  }

  /** Throws BadCursor. */
  search(query: SearchQuery): SearchAnswer {
    const matched = this.#text.match(query.q ?? '');
    const sort: Sort = query.sort ?? 'match';
    const inOrder =
      sort === 'match' && matched !== null ? byMatch(matched) : this.#inKeptOrder(sort, matched);
    const sieve = new Sieve(query, this.#fitsMachine(query));
    const passed = inOrder.positions.filter(({ id }) => {
      const document = this.#documents.get(id);
      return document !== undefined && sieve.passes(document);
    });
    const page = pageOf(inOrder.sort, passed, query);
    return { ...page, total: passed.length, facets: sieve.facets() };
  }

  #inKeptOrder(sort: Sort, matched: Map<string, number> | null): InOrder {
    // Without words nothing matches better than anything else.
    const kept = sort === 'match' ? 'newest' : sort;
    const { positions } = this.#orders[kept];
    return {
      sort: kept,
      positions: matched === null ? positions : positions.filter(({ id }) => matched.has(id)),
    };
  }

  #fitsMachine({ machine, fits }: SearchQuery): ((document: SearchDocument) => boolean) | null {
    if (machine !== undefined) return this.#fits.forMachine(machine);
    if (fits === true) throw new Error('A search for what fits needs the machine');
    return null;
  }
}

interface InOrder {
  readonly sort: Sort;
  readonly positions: readonly Position[];
}

function byMatch(matched: Map<string, number>): InOrder {
  const positions = [...matched].map(([id, value]) => ({ id, value }));
  return { sort: 'match', positions: positions.sort((a, b) => comparePositions('match', a, b)) };
}

function pageOf(
  sort: Sort,
  positions: readonly Position[],
  { cursor, limit }: SearchQuery,
): Pick<SearchAnswer, 'ids' | 'nextCursor'> {
  const from = cursor === undefined ? 0 : firstAfter(sort, positions, readCursor(sort, cursor));
  const page = positions.slice(from, from + limit);
  const last = page.at(-1);
  const hasMore = last !== undefined && from + limit < positions.length;
  return { ids: page.map(({ id }) => id), nextCursor: hasMore ? writeCursor(sort, last) : null };
}
