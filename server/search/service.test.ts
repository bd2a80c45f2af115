import { afterEach, describe, expect, it } from 'vitest';
import { startFromSource } from '#server/worker-path.ts';
import { BadCursor, type SearchDocument } from './document.ts';
import { inThreadSearch, inWorkerSearch, type SearchService } from './service.ts';
import { rectangle, sampleDocument, sampleMachine } from './testing/sample-document.ts';

const comb = sampleDocument('comb', { title: 'Cable comb', createdAt: '2026-01-02T00:00:00.000Z' });
const tray = sampleDocument('tray', { title: 'Bit tray', kind: 'bit-trays', hullMm: rectangle(300, 300) });
let search: SearchService;
afterEach(() => search.close());

describe.each([
  ['in the calling thread', () => inThreadSearch()],
  ['in a worker', () => inWorkerSearch({ load: async () => [] })],
])('a search service %s', (_where, open) => {
  it('finds what was put in, changed and taken out', async () => {
    search = open();
    await search.replaceAll([comb, tray]);
    expect((await search.search({ q: 'comb', limit: 5 })).ids).toEqual(['comb']);
    await search.upsert({ ...comb, title: 'Cable rack' });
    expect((await search.search({ q: 'comb', limit: 5 })).ids).toEqual([]);
    await search.remove('comb');
    expect((await search.search({ limit: 5 })).ids).toEqual(['tray']);
    await search.replaceAll([comb]);
    expect((await search.search({ limit: 5 })).ids).toEqual(['comb']);
  });

  it('answers with total, facets and pages', async () => {
    search = open();
    await search.replaceAll([comb, tray]);
    const machine = sampleMachine(120, 80);
    const first = await search.search({ machine, limit: 1 });
    expect(first).toMatchObject({ ids: ['comb'], total: 2 });
    expect(first.facets.fits).toEqual([{ value: 'true', count: 1 }]);
    const second = await search.search({ machine, limit: 1, cursor: first.nextCursor ?? '' });
    expect(second).toMatchObject({ ids: ['tray'], nextCursor: null });
  });

  it('throws BadCursor for a cursor that is not its own', async () => {
    search = open();
    await expect(search.search({ cursor: 'mine', limit: 1 })).rejects.toBeInstanceOf(BadCursor);
  });
});

describe('a search worker that ends', () => {
  const start = startFromSource(new URL('./testing/crashing-worker.ts', import.meta.url));
  const endIt = () => search.search({ q: 'end the worker', limit: 1 });

  it('is replaced, refilled from the loader, and other calls under way are answered', async () => {
    let loads = 0;
    const library: SearchDocument[] = [comb];
    search = inWorkerSearch({
      start,
      load: async () => {
        loads++;
        return library;
      },
    });
    await search.replaceAll(library);
    const ended = endIt().catch((error: Error) => error);
    const change = search.upsert(tray);
    const meanwhile = search.search({ limit: 5 });
    // Tried once more, then given up: the query itself ends the worker.
    expect(await ended).toBeInstanceOf(Error);
    await change;
    expect((await meanwhile).ids).toEqual(['comb', 'tray']);
    expect(loads).toBe(2);
  });

  it('says so when the loader fails, and tries again with the next call', async () => {
    let works = false;
    search = inWorkerSearch({
      start,
      load: async () => {
        if (!works) throw new Error('the database is away');
        return [comb];
      },
    });
    await expect(endIt()).rejects.toThrow('the database is away');
    works = true;
    expect((await search.search({ limit: 5 })).ids).toEqual(['comb']);
  });
});
