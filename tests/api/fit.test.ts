import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Bit, Machine } from '#shared/api/bench.ts';
import type { Design } from '#shared/api/designs.ts';
import type { FitReport } from '#shared/api/fit.ts';
import { fitReport } from '#shared/fit/fit-report.ts';
import { bitOf, cutOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let cutDesign: Design;
let uncut: Design;
let machine: Machine;
let bits: Bit[];
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  const wrens = await club.machine(wren, { maxFeedMmPerMin: 5000 });
  const cut = cutOf(wrens.id);
  cutDesign = await sharedDesign(wren, {
    cut: { ...cut, settings: { ...cut.settings, feedMmPerMin: 3500 } },
  });
  uncut = await sharedDesign(wren, { title: 'Uncut' }, plateSvg(500, 30));
  machine = await club.machine(tarn);
  for (const bit of [bitOf(), bitOf({ name: '6 mm', diameterMm: 6, shankMm: 6, cuttingLengthMm: 10 })])
    await tarn.call('post', '/api/bits').send(bit).expect(201);
  bits = (await tarn.call('get', '/api/bits').expect(200)).body.items as Bit[];
});
afterAll(() => club.close());

const ask = (design: Design, query: string, by = tarn) =>
  by.call('get', `/api/designs/${design.slug}/revisions/1/fit?${query}`);
const report = async (design: Design, query: string) =>
  (await ask(design, query).expect(200)).body as FitReport;

/** The same question, answered here as a browser answers it: from what the API hands out. */
async function answeredHere(design: Design, given: { bits: Bit[]; stock?: object }): Promise<FitReport> {
  const geometry = await tarn.call('get', `/api/designs/${design.slug}/revisions/1/geometry`).expect(200);
  const [cut] = design.cuts;
  const input = {
    hullMm: geometry.body.hullMm,
    bit: cut?.bit,
    settings: cut?.settings,
    stockThicknessMm: cut?.stockThicknessMm,
    runTimeS: cut?.runTimeS,
    machine,
    ...given,
  };
  return JSON.parse(JSON.stringify(fitReport(input as Parameters<typeof fitReport>[0]))) as FitReport;
}

describe('the fit report', () => {
  it('is the same in the server and here', async () => {
    const answer = await report(cutDesign, `machineId=${machine.id}`);
    expect(answer).toEqual(await answeredHere(cutDesign, { bits }));
    // 120 × 80 on a bed of 300 × 180; but 3 500 mm/min were shared, and this machine makes 3 000.
    expect(answer.checks.find(({ id }) => id === 'bed')).toMatchObject({ result: 'fits' });
    expect(answer.checks.find(({ id }) => id === 'feed')).toMatchObject({ have: 3000, need: 3500 });
  });

  it('takes the bits that are named, once or more often', async () => {
    const [small, large] = bits;
    const withOne = await report(cutDesign, `machineId=${machine.id}&bitIds=${large?.id}`);
    expect(withOne).toEqual(await answeredHere(cutDesign, { bits: bits.slice(1) }));
    const withBoth = await report(
      cutDesign,
      `machineId=${machine.id}&bitIds=${large?.id}&bitIds=${small?.id}`,
    );
    expect(withBoth).toEqual(await answeredHere(cutDesign, { bits: [...bits].reverse() }));
    const bitCheck = ({ checks }: FitReport) => checks.find(({ id }) => id === 'bit')?.result;
    expect(bitCheck(withBoth)).toBe('fits');
    expect(bitCheck(withOne)).not.toBe('fits');
  });

  it('takes the stock that is named', async () => {
    const query = (stockMm: string) => `machineId=${machine.id}&stockMm=${stockMm}`;
    const stock = { lengthMm: 100.5, widthMm: 90, thicknessMm: 12 };
    const small = await report(cutDesign, query('100.5x90x12'));
    expect(small).toEqual(await answeredHere(cutDesign, { bits, stock }));
    expect(small.checks.find(({ id }) => id === 'stock')?.result).toBe('doesNotFit');
    const large = await report(cutDesign, query('300x200x12'));
    expect(large.checks.find(({ id }) => id === 'stock')?.result).toBe('fits');
  });

  it('says of an uncut design what can be said: its bed', async () => {
    const answer = await report(uncut, `machineId=${machine.id}`);
    expect(answer).toEqual(await answeredHere(uncut, { bits }));
    expect(answer.verdict).toBe('doesNotFit');
    expect(answer.checks.find(({ id }) => id === 'feed')?.result).toBe('notKnown');
  });
});

describe('a question about what is not there, or not the member’s', () => {
  it('is 404 for another’s machine or bit, an unknown design or revision', async () => {
    await ask(cutDesign, `machineId=${machine.id}`, wren).expect(404);
    const wrens = (await wren.call('get', '/api/machines')).body.items[0] as Machine;
    await ask(cutDesign, `machineId=${wrens.id}&bitIds=${bits[0]?.id}`, wren).expect(404);
    const fitOf = (path: string) => tarn.call('get', `/api/designs/${path}/fit?machineId=${machine.id}`);
    await fitOf('none/revisions/1').expect(404);
    await fitOf(`${cutDesign.slug}/revisions/2`).expect(404);
    await fitOf(`${cutDesign.slug}/revisions/0`).expect(404);
  });

  it.each([
    ['no machine', ''],
    ['a machine that is no id', 'machineId=mine'],
    ['a bit that is no id', 'machineId=%&bitIds=mine'],
    ...['300x200', '300x200x', '-1x200x18', '1e3x200x18', '300 x 200 x 18', 'axbxc', ''].map((stock) => [
      `stock of “${stock}”`,
      `machineId=%&stockMm=${encodeURIComponent(stock)}`,
    ]),
    ['stock of nothing', 'machineId=%&stockMm=300x200x0'],
    ['stock longer than any number', `machineId=%&stockMm=${'9'.repeat(400)}x200x18`],
    ['stock named twice', 'machineId=%&stockMm=1x1x1&stockMm=2x2x2'],
  ] as [string, string][])('is 400 with %s', async (_what, query) => {
    const answer = await ask(cutDesign, query.replace('%', machine.id)).expect(400);
    expect(answer.body.errors.length).toBeGreaterThan(0);
  });
});
