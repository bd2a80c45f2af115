import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Machine } from '#shared/api/bench.ts';
import { type Design, type DesignList, designList } from '#shared/api/designs.ts';
import { cutOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { sharedDesign } from './support/share-design.ts';

// 30 plates that differ in all that the loft can ask for. The numbers expected below are counted from this rule.
const kinds = ['gauges', 'boxes', 'hold-downs'] as const;
const materials = ['mdf', 'plywood', 'hardwood'] as const;
const bitMms = [3.175, 3.19, 3.2, 6] as const;
const plates = Array.from({ length: 30 }, (_, place) => ({
  title: place === 7 ? 'Wedge hold-down' : `Plate ${place}`,
  kind: kinds[place % 3] ?? 'gauges',
  // Every tenth has not been cut; every fifth is longer than the bed is across its corners.
  cut: place % 10 !== 9,
  material: materials[Math.floor(place / 3) % 3] ?? 'mdf',
  bitMm: bitMms[place % 4] ?? 6,
  runTimeS: (place + 1) * 60,
  widthMm: place % 5 === 0 ? 400 + place : 40 + place,
}));
const count = (test: (plate: (typeof plates)[number]) => boolean) => plates.filter(test).length;

let club: TestClub;
let wren: Person;
let machine: Machine;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  machine = await club.machine(wren);
  for (const { title, kind, cut, material, bitMm, runTimeS, widthMm } of plates) {
    const made = cutOf(machine.id, {
      materialId: material,
      bit: { diameterMm: bitMm, flutes: 2, kind: 'up-cut' },
      runTimeS,
    });
    await sharedDesign(wren, { title, kind, tags: [], ...(cut ? { cut: made } : {}) }, plateSvg(widthMm, 30));
  }
});
afterAll(() => club.close());

const list = async (query = '') =>
  (await wren.call('get', `/api/designs${query}`).expect(200)).body as DesignList;
const titles = ({ items }: Pick<DesignList, 'items'>) => items.map(({ title }) => title);

describe('filters', () => {
  it.each([
    ['nothing', '', () => true],
    ['a kind', 'kind=gauges', ({ kind }) => kind === 'gauges'],
    ['a material', 'material=plywood', ({ cut, material }) => cut && material === 'plywood'],
    ['a bit size, within 0.02 mm', 'bitMm=3.175', ({ cut, bitMm }) => cut && [3.175, 3.19].includes(bitMm)],
    ['a bit size between two', 'bitMm=3.1951', ({ cut, bitMm }) => cut && [3.19, 3.2].includes(bitMm)],
    ['a bit size that none has', 'bitMm=4', () => false],
    ['the standing uncut', 'standing=uncut', ({ cut }) => !cut],
    ['the standing cut once', 'standing=cut-once', ({ cut }) => cut],
    ['a run time', 'maxMinutes=10', ({ cut, runTimeS }) => cut && runTimeS <= 600],
    [
      'two together',
      'kind=boxes&material=mdf',
      ({ kind, cut, material }) => kind === 'boxes' && cut && material === 'mdf',
    ],
  ] as [string, string, (plate: (typeof plates)[number]) => boolean][])('by %s', async (_by, query, test) => {
    const found = await list(`?${query}`);
    expect(found.total).toBe(count(test));
    const expected = plates.filter(test).map(({ title }) => title);
    const shown = titles(found);
    expect(shown).toHaveLength(Math.min(24, expected.length));
    for (const title of shown) expect(expected).toContain(title);
  });

  it('by what fits the machine in use', async () => {
    const found = await list(`?fits=true&machineId=${machine.id}`);
    // The bed is 300 × 180 with margins of 4: its diagonal is under 400.
    expect(found.total).toBe(count(({ widthMm }) => widthMm < 400));
    const small = await club.machine(wren, { bedXMm: 60, bedYMm: 60 });
    // 52 mm are left, less the bit or nothing while uncut; at 30 mm wide none longer than 60 lies across.
    const onSmall = await list(`?fits=true&machineId=${small.id}`);
    expect(onSmall.total).toBeGreaterThan(0);
    for (const item of onSmall.items) expect(item.revision.drawing.widthMm).toBeLessThan(60);
  });

  it.each([
    ['fits without a machine', 'fits=true', 400],
    ['an unknown filter', 'colour=blue', 400],
    ['an unknown kind', 'kind=weapons', 400],
    ['a bit size that is no number', 'bitMm=six', 400],
    ['an unknown order', 'sort=luck', 400],
    ['a filter given twice', 'kind=gauges&kind=boxes', 400],
    ['a search of 201 letters', `q=${'x'.repeat(201)}`, 400],
    ['a machine that is nobody’s', 'machineId=ffffffff-ffff-7fff-bfff-ffffffffffff', 404],
  ])('refuse %s', async (_what, query, status) => {
    const answer = await wren.call('get', `/api/designs?${query}`);
    expect(answer.status).toBe(status);
    if (status === 400) expect(answer.body.errors.length).toBeGreaterThan(0);
  });

  it('refuse the machine of another member', async () => {
    const tarn = await club.person('Tarn');
    await tarn.call('get', `/api/designs?fits=true&machineId=${machine.id}`).expect(404);
  });
});

describe('facets', () => {
  it('count what each filter would show', async () => {
    const { facets } = await list(`?machineId=${machine.id}`);
    for (const [name, values] of Object.entries(facets)) {
      expect(values.length, name).toBeGreaterThan(0);
      for (const { value, count } of values) {
        const found = await list(`?machineId=${machine.id}&${name}=${value}`);
        expect(found.total, `${name} ${value}`).toBe(count);
      }
    }
    expect(facets.kind).toContainEqual({ value: 'gauges', count: count(({ kind }) => kind === 'gauges') });
    expect(facets.standing).toContainEqual({ value: 'uncut', count: count(({ cut }) => !cut) });
  });

  it('go on counting the other values of a chosen filter, within the others', async () => {
    const { facets } = await list('?kind=gauges&material=mdf');
    expect(facets.kind).toContainEqual({
      value: 'boxes',
      count: count(({ kind, cut, material }) => kind === 'boxes' && cut && material === 'mdf'),
    });
    expect(facets.material).toContainEqual({
      value: 'plywood',
      count: count(({ kind, cut, material }) => kind === 'gauges' && cut && material === 'plywood'),
    });
  });
});

describe('pages', () => {
  it.each(['sort=newest', 'sort=title', 'sort=size', 'q=plate', 'q=plate&sort=size', 'kind=gauges'])(
    'of %s show every design once',
    async (query) => {
      const seen: string[] = [];
      let cursor: string | null = '';
      let total = 0;
      for (let page = 0; cursor !== null && page < 5; page += 1) {
        const more = cursor === '' ? '' : `&cursor=${encodeURIComponent(cursor)}`;
        const found: DesignList = await list(`?${query}${more}`);
        seen.push(...found.items.map(({ slug }) => slug));
        cursor = found.nextCursor;
        total = found.total;
      }
      expect(cursor).toBeNull();
      expect(seen).toHaveLength(total);
      expect(new Set(seen).size).toBe(total);
      expect(total).toBe(query.startsWith('kind') ? 10 : query.startsWith('q') ? 29 : 30);
    },
  );

  it('go on where they were when a design comes in between', async () => {
    const first = await list('?sort=newest');
    const { slug } = await sharedDesign(wren, { title: 'Come in between' }, plateSvg(33, 30));
    const second = await list(`?sort=newest&cursor=${encodeURIComponent(first.nextCursor ?? '')}`);
    expect(second.items.map((item) => item.slug)).not.toContain(slug);
    expect(titles(first).concat(titles(second)).sort()).toEqual(plates.map(({ title }) => title).sort());
    await wren.call('delete', `/api/designs/${slug}`).expect(204);
  });

  it.each(['x', 'bmV3ZXN0', '%00', '..%2F..'])('refuse the cursor %s', async (cursor) => {
    const answer = await wren.call('get', `/api/designs?cursor=${cursor}`).expect(400);
    expect(answer.body.type).toBe('cursor.bad');
  });

  it('refuse a cursor of another order', async () => {
    const { nextCursor } = await list('?sort=newest');
    await wren.call('get', `/api/designs?sort=title&cursor=${nextCursor}`).expect(400);
  });
});

describe('orders', () => {
  it('newest first, by title with numbers in their order, smallest first', async () => {
    expect(titles(await list())[0]).toBe('Plate 29');
    const byTitle = titles(await list('?sort=title'));
    expect(byTitle.slice(0, 9)).toEqual([0, 1, 2, 3, 4, 5, 6, 8, 9].map((number) => `Plate ${number}`));
    const areas = (await list('?sort=size')).items.map(
      ({ revision }) => revision.drawing.widthMm * revision.drawing.heightMm,
    );
    expect(areas).toEqual([...areas].sort((a, b) => a - b));
  });
});

describe('words', () => {
  it.each([
    ['a word', 'wedge'],
    ['the beginning of a word', 'wedg'],
    ['a word with a slip', 'wadge'],
    ['capitals', 'WEDGE'],
    ['two words', 'wedge hold'],
  ])('find a design by %s', async (_by, q) => {
    expect(titles(await list(`?q=${encodeURIComponent(q)}`))[0]).toBe('Wedge hold-down');
  });

  it('find a design by its drawing number, and nothing by nonsense', async () => {
    const [item] = (await list('?q=wedge')).items;
    expect(titles(await list(`?q=${item?.drawingNumber}`))[0]).toBe('Wedge hold-down');
    expect(await list('?q=zzzzzzzz')).toMatchObject({ items: [], total: 0, nextCursor: null });
  });

  it('are learned again when they change', async () => {
    const { slug } = await sharedDesign(wren, { title: 'Marking batten' }, plateSvg(34, 30));
    const design = (await wren.call('get', `/api/designs/${slug}`)).body as Design;
    await wren
      .call('patch', `/api/designs/${slug}`)
      .send({ title: 'Trammel', version: design.version })
      .expect(200);
    expect(titles(await list('?q=batten'))).not.toContain('Trammel');
    expect(titles(await list('?q=trammel'))).toEqual(['Trammel']);
    await wren.call('delete', `/api/designs/${slug}`).expect(204);
  });
});

describe('a card', () => {
  it('has an outline of at most 4 kB, however detailed the drawing', async () => {
    const wave = Array.from(
      { length: 4000 },
      (_, place) => `L${place / 20} ${(40 + 39 * Math.sin(place / 3)).toFixed(3)}`,
    ).join('');
    const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="200mm" height="80mm" viewBox="0 0 200 80"><path d="M0 40${wave}" fill="none"/></svg>`;
    const { slug } = await sharedDesign(wren, { title: 'Detailed wave' }, svg);
    const { items } = await list('?q=detailed');
    const card = items.find((item) => item.slug === slug);
    expect(card?.revision.drawing.widthMm).toBeGreaterThan(199);
    expect(Buffer.byteLength(card?.outline ?? '')).toBeGreaterThan(500);
    for (const { outline } of [...items, ...(await list()).items]) {
      expect(outline).toMatch(/^M/);
      expect(Buffer.byteLength(outline)).toBeLessThanOrEqual(4096);
    }
  });

  it('has what the contract names and no more', async () => {
    const answer = await list();
    expect(designList.parse(answer)).toEqual(answer);
  });
});
