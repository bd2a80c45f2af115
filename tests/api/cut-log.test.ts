import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { cut } from '#server/db/schema/index.ts';
import type { CutRecord } from '#shared/api/cuts.ts';
import { plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { decideOn } from './support/decide.ts';
import { recorded } from './support/record-cut.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let moss: Person;
/** In the order they were made. */
const ids: string[] = [];
let plywood: CutRecord;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  moss = await club.person('Moss', 'moderator');
  const { slug } = await sharedDesign(wren, { title: '=Peg, "long"' }, plateSvg());
  // Two pages and a bit; several made in the same millisecond.
  for (let place = 0; place < 52; place += 1) {
    ids.push((await recorded(club, wren, slug, { materialId: 'mdf', notes: `Cut ${place}` })).id);
  }
  plywood = await recorded(club, tarn, slug, {
    materialId: 'plywood',
    outcome: 'failed',
    wentWrong: ['tear-out', 'burning'],
    measured: [
      { drawnMm: 12, measuredMm: 12.1 },
      { drawnMm: 40, measuredMm: 39.95 },
    ],
    notes: '@SUM(A1:A9)\nsaid "never", again',
    cutOn: '2026-03-01',
  });
  ids.push(plywood.id);
  const instant = new Date('2026-04-05T06:07:08.009Z');
  for (const id of ids.slice(10, 30))
    await club.deps.database.db.update(cut).set({ createdAt: instant }).where(eq(cut.id, id));
});
afterAll(() => club.close());

const page = async (person: Person, query = '') =>
  (await person.call('get', `/api/cuts?${query}`).expect(200)).body as {
    items: CutRecord[];
    total: number;
    nextCursor: string | null;
  };

/** A reader of CSV of its own, by the grammar of RFC 4180, section 2. */
function readCsv(text: string): string[][] {
  const rows: string[][] = [[]];
  const field = /("(?:[^"]|"")*"|[^",\r\n]*)(,|\r\n)/gy;
  for (let found = field.exec(text); found !== null; found = field.exec(text)) {
    const [, cell = '', end] = found;
    rows.at(-1)?.push(cell.startsWith('"') ? cell.slice(1, -1).replaceAll('""', '"') : cell);
    if (end === '\r\n') rows.push([]);
    if (field.lastIndex === text.length) return rows.slice(0, -1);
  }
  throw new Error('not CSV of RFC 4180');
}

const csv = async (person: Person, query = '') => {
  const answer = await person.call('get', `/api/cuts.csv?${query}`).expect(200);
  const [header = [], ...rows] = readCsv(answer.text);
  return { answer, rows: rows.map((row) => Object.fromEntries(header.map((name, at) => [name, row[at]]))) };
};

describe('the cut log', () => {
  it('gives every record once, newest first, page by page', async () => {
    const first = await page(wren);
    expect(first.total).toBe(53);
    expect(first.items).toHaveLength(50);
    const second = await page(wren, `cursor=${first.nextCursor}`);
    expect(second).toMatchObject({ total: 53, nextCursor: null });
    const all = [...first.items, ...second.items];
    expect(all.map(({ id }) => id).sort()).toEqual([...ids].sort());
    const order = all.map(({ createdAt, id }) => `${createdAt} ${id}`);
    expect(order).toEqual([...order].sort().reverse());
  });

  it('is the club’s unless mine is asked for, and is filtered', async () => {
    expect((await page(tarn)).total).toBe(53);
    expect((await page(tarn, 'whose=club')).total).toBe(53);
    expect(await page(tarn, 'whose=mine')).toEqual({ items: [plywood], total: 1, nextCursor: null });
    expect((await page(tarn, 'material=plywood')).items.map(({ id }) => id)).toEqual([plywood.id]);
    expect((await page(tarn, 'outcome=failed')).total).toBe(1);
    expect((await page(tarn, `machineId=${plywood.machine.id}`)).total).toBe(1);
    expect((await page(tarn, 'whose=mine&material=mdf')).items).toEqual([]);
  });

  it.each([
    'cursor=nonsense',
    'cursor=',
    `cursor=${Buffer.from('2026-04-05T06:07:08.009Z\nnone').toString('base64url')}`,
    `cursor=${Buffer.from('tomorrow\n018f0000-0000-7000-8000-000000000000').toString('base64url')}`,
    'whose=theirs',
    'material=cheese',
    'machineId=1',
    'page=2',
  ])('refuses %s', async (query) => {
    for (const path of ['/api/cuts', '/api/cuts.csv']) {
      const answer = await wren.call('get', `${path}?${query}`).expect(400);
      expect(answer.body.detail).toMatch(/\w+.*\.$/);
    }
  });
});

describe('the cut log as CSV', () => {
  it('has a header row, every record, and units in the names', async () => {
    const { answer, rows } = await csv(wren);
    expect(answer.headers).toMatchObject({
      'content-type': expect.stringMatching(/^text\/csv; charset=utf-8/),
      'content-disposition': 'attachment; filename="cut-log.csv"',
    });
    expect(rows.map(({ record_id }) => record_id).sort()).toEqual([...ids].sort());
    expect(rows.find(({ record_id }) => record_id === plywood.id)).toMatchObject({
      cut_on: '2026-03-01',
      design: '\'=Peg, "long"',
      revision: '1',
      member: 'Tarn',
      bed_x_mm: '300',
      bit_kind: 'up-cut',
      bit_diameter_mm: '3.175',
      bit_flutes: '2',
      material: 'plywood',
      stock_thickness_mm: '12',
      spindle_rev_per_min: '16000',
      feed_mm_per_min: '1200',
      plunge_mm_per_min: '400',
      depth_of_cut_mm: '1.5',
      stepover_mm: '1.2',
      outcome: 'failed',
      run_time_s: '1800',
      went_wrong: 'tear-out; burning',
      drawn_mm: '12; 40',
      measured_mm: '12.1; 39.95',
      in_service: '',
      notes: '\'@SUM(A1:A9)\nsaid "never", again',
      settings_withheld: '',
    });
  });

  it('is filtered as the log is', async () => {
    expect((await csv(tarn, 'whose=mine')).rows.map(({ record_id }) => record_id)).toEqual([plywood.id]);
  });

  it('does not hand out settings that a moderator withheld, and says why', async () => {
    await decideOn(moss, plywood, 'withholdSettings', 'Too deep for this bit.');
    const { rows } = await csv(tarn, 'whose=mine');
    expect(rows).toMatchObject([
      { feed_mm_per_min: '', spindle_rev_per_min: '', settings_withheld: 'Too deep for this bit.' },
    ]);
  });
});
