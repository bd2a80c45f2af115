import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type Kind,
  kinds,
  materialFamilies,
  type StandingWord,
  standingWords,
} from '#shared/api/vocabulary.ts';
import type { SearchDocument, SearchFacets, SearchQuery } from './document.ts';
import { SearchIndex } from './index.ts';
import { rectangle, sampleDocument, sampleMachine } from './testing/sample-document.ts';

const someOf = <T>(values: readonly T[]) => fc.constantFrom(...values);
const families = materialFamilies.slice(0, 3);
const words = ['comb', 'tray', 'wedge'] as const;

const document = fc
  .record({
    title: fc.array(someOf(words), { minLength: 1, maxLength: 3 }).map((some) => some.join(' ')),
    kind: someOf(kinds.slice(0, 3)),
    day: fc.integer({ min: 1, max: 4 }),
    standings: fc.uniqueArray(
      fc.record({ material: someOf(families), word: someOf(standingWords.slice(1, 5)) }),
      { selector: ({ material }) => material, maxLength: 3 },
    ),
    withheld: fc.integer({ min: 0, max: 5 }).map((n) => n === 0),
    bitMms: fc.array(someOf([3, 3.17, 3.175, 3.19, 3.3, 6]), { maxLength: 3 }),
    minutes: fc.option(fc.integer({ min: 1, max: 6 }), { nil: null }),
    widthMm: someOf([50, 100, 200]),
    heightMm: someOf([50, 100, 200]),
    bitMm: someOf([null, 6]),
  })
  .map(({ day, withheld, ...rest }): Partial<SearchDocument> => {
    const best: StandingWord = withheld ? 'withheld' : (rest.standings[0]?.word ?? 'uncut');
    return {
      ...rest,
      createdAt: `2026-01-0${day}T00:00:00.000Z`,
      materials: rest.standings.map(({ material }) => material),
      bestStanding: best,
      hullMm: rectangle(rest.widthMm, rest.heightMm),
    };
  });
const library = fc
  .array(document, { maxLength: 25 })
  .map((all) => all.map((given, n) => sampleDocument(`id-${String(n).padStart(2, '0')}`, given)));

const maybe = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: undefined, freq: 1 });
const query = fc
  .record({
    q: maybe(someOf(words)),
    kind: maybe(someOf(kinds.slice(0, 3))),
    material: maybe(someOf(families)),
    bitMm: maybe(someOf([3.175, 3.18, 6])),
    standing: maybe(someOf(standingWords)),
    maxMinutes: maybe(fc.integer({ min: 1, max: 6 })),
    machine: maybe(someOf([sampleMachine(120, 60), sampleMachine(206, 206)])),
    fits: fc.boolean(),
    sort: maybe(someOf(['match', 'newest', 'title', 'size'] as const)),
    limit: fc.integer({ min: 1, max: 7 }),
  })
  .map((given): SearchQuery => ({ ...given, fits: given.machine !== undefined && given.fits }));

/** The rules said once more, by looking at every document. Rectangles fit as drawn or turned by 90°, or not. */
function modelMatches(one: SearchDocument, asked: SearchQuery): boolean {
  const { machine } = asked;
  const inMaterial = one.standings.find((standing) => standing.material === asked.material)?.word ?? 'uncut';
  const word = one.bestStanding === 'withheld' || !asked.material ? one.bestStanding : inMaterial;
  const [short, long] = [one.widthMm, one.heightMm]
    .map((mm) => mm + (one.bitMm ?? 0))
    .toSorted((a, b) => a - b);
  const bed = machine && [machine.bedXMm, machine.bedYMm].toSorted((a, b) => a - b);
  return (
    (!asked.q || one.title.split(' ').includes(asked.q)) &&
    (!asked.kind || one.kind === asked.kind) &&
    (!asked.material || one.materials.includes(asked.material)) &&
    (!asked.bitMm || one.bitMms.some((mm) => Math.round(Math.abs(mm - asked.bitMm!) * 1000) <= 20)) &&
    (!asked.standing || word === asked.standing) &&
    (!asked.maxMinutes || (one.minutes !== null && one.minutes <= asked.maxMinutes)) &&
    (!asked.fits || (short! <= bed![0]! && long! <= bed![1]!))
  );
}
const modelTotal = (all: readonly SearchDocument[], asked: SearchQuery) =>
  all.filter((one) => modelMatches(one, asked)).length;

const filled = (all: readonly SearchDocument[]) => {
  const index = new SearchIndex();
  index.replaceAll(all);
  return index;
};
const allPages = (index: SearchIndex, asked: SearchQuery): string[] => {
  const { ids, nextCursor } = index.search(asked);
  return nextCursor === null ? ids : [...ids, ...allPages(index, { ...asked, cursor: nextCursor })];
};

describe('the index against a look at every document', () => {
  it('finds the same, each once over all pages, with the right total', () => {
    fc.assert(
      fc.property(library, query, (all, asked) => {
        const index = filled(all);
        const expected = all.filter((one) => modelMatches(one, asked)).map(({ id }) => id);
        const paged = allPages(index, asked);
        expect(paged.toSorted()).toEqual(expected);
        expect(index.search(asked).total).toBe(expected.length);
      }),
      { numRuns: 300 },
    );
  });

  it('counts for each facet value what choosing it would find', () => {
    fc.assert(
      fc.property(library, query, (all, asked) => {
        const { facets } = filled(all).search(asked);
        const counts = (name: keyof SearchFacets) =>
          Object.fromEntries(facets[name].map(({ value, count }) => [value, count]));
        const expected = <T extends string>(
          values: readonly T[],
          choose: (value: T) => Partial<SearchQuery>,
        ) =>
          Object.fromEntries(
            values
              .map((value) => [value, modelTotal(all, { ...asked, ...choose(value) })] as const)
              .filter(([, count]) => count > 0),
          );
        expect(counts('kind')).toEqual(expected(kinds, (kind: Kind) => ({ kind })));
        expect(counts('material')).toEqual(expected(materialFamilies, (material) => ({ material })));
        expect(counts('standing')).toEqual(expected(standingWords, (standing) => ({ standing })));
        for (const { value, count } of facets.bitMm)
          expect(count).toBe(modelTotal(all, { ...asked, bitMm: Number(value) }));
        const fits = modelTotal(all, { ...asked, fits: true, machine: asked.machine ?? sampleMachine(1, 1) });
        expect(facets.fits).toEqual(asked.machine ? [{ value: 'true', count: fits }] : []);
      }),
      { numRuns: 300 },
    );
  });

  it('leaves no bit size out: each is within 0.02 mm of a counted one', () => {
    fc.assert(
      fc.property(library, (all) => {
        const sizes = filled(all)
          .search({ limit: 1 })
          .facets.bitMm.map(({ value }) => Number(value));
        for (const mm of all.flatMap(({ bitMms }) => bitMms))
          expect(Math.min(...sizes.map((size) => Math.abs(size - mm)))).toBeLessThanOrEqual(0.0200001);
        expect(sizes).toEqual(sizes.toSorted((a, b) => a - b));
      }),
    );
  });

  it('puts documents in the order asked for', () => {
    fc.assert(
      fc.property(library, (all) => {
        const byId = new Map(all.map((one) => [one.id, one]));
        const values = (sort: SearchQuery['sort'], value: (one: SearchDocument) => string | number) =>
          filled(all)
            .search({ sort, limit: 100 })
            .ids.map((id) => value(byId.get(id)!));
        const dates = all.map(({ createdAt }) => createdAt).toSorted();
        expect(values('newest', ({ createdAt }) => createdAt)).toEqual(dates.toReversed());
        expect(values(undefined, ({ createdAt }) => createdAt)).toEqual(dates.toReversed());
        expect(values('title', ({ title }) => title)).toEqual(all.map(({ title }) => title).toSorted());
        expect(values('size', (one) => one.widthMm * one.heightMm)).toEqual(
          all.map((one) => one.widthMm * one.heightMm).toSorted((a, b) => a - b),
        );
      }),
    );
  });

  it('is the same after documents came, changed and went as when filled at once', () => {
    fc.assert(
      fc.property(library, library, query, (before, after, asked) => {
        const index = filled(before);
        // Asked in between, so that answers about fit are kept and must be forgotten again.
        index.search({ machine: asked.machine, limit: 1 });
        for (const one of after) index.upsert(one);
        for (const { id } of before) if (!after.some((one) => one.id === id)) index.remove(id);
        const fresh = filled(after);
        expect(index.search({ ...asked, limit: 50 }).total).toBe(fresh.search(asked).total);
        const inFixedOrder = { ...asked, sort: 'title', limit: 50 } as const;
        expect(index.search(inFixedOrder)).toEqual(fresh.search(inFixedOrder));
      }),
    );
  });
});
