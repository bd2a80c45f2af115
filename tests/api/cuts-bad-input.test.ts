import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { auditEntry, cut, flag, notice } from '#server/db/schema/index.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { ownBit, record, recorded, toldOf } from './support/record-cut.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let slug: string;
let machineId: string;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  slug = (await sharedDesign(wren)).slug;
  machineId = (await club.machine(tarn)).id;
});
afterAll(() => club.close());

/** Everything that recording a cut writes. */
async function written() {
  const { db } = club.deps.database;
  return [await db.$count(cut), await db.$count(flag), await db.$count(notice), await db.$count(auditEntry)];
}

async function refused(told: object, status: number) {
  const before = await written();
  const answer = await record(tarn, slug, told);
  expect({ status: answer.status, body: answer.body }).toMatchObject({ status });
  expect(answer.body.detail).toMatch(/\w+.*\.$/s);
  expect(await written()).toEqual(before);
  return answer.body as { type: string; detail: string; errors?: { path: string; message: string }[] };
}

const tomorrow = () => new Date(Date.now() + 86_400_000).toISOString().slice(0, 10);

describe('a record that cannot be right', () => {
  it.each<[what: string, change: Record<string, unknown>, path: string, sentence: RegExp]>([
    ['a run time of nought', { runTimeS: 0 }, 'runTimeS', /more than 0 s/],
    ['a run time of a month', { runTimeS: 30 * 86_400 }, 'runTimeS', /at most 172800 s/],
    [
      'a size measured in inches',
      { measured: [{ drawnMm: 19.05, measuredMm: 0.75 }] },
      'measured.0.measuredMm',
      /^0\.75 measured for 19\.05 drawn: is that inches\? Write 19\.05, or say sizesAreMm$/,
    ],
    ['a thing named twice', { wentWrong: ['other', 'other'] }, 'wentWrong.1', /once/],
    ['an unknown thing', { wentWrong: ['bad-luck'] }, 'wentWrong.0', /./],
    ['a date to come', { cutOn: tomorrow() }, 'cutOn', /later than today/],
    ['a date of the last century', { cutOn: '1999-12-31' }, 'cutOn', /2000/],
    ['a date that is none', { cutOn: '2026-02-30' }, 'cutOn', /Date must be as/],
    ['a bit wider than the bed', { bit: { diameterMm: 100, flutes: 2, kind: 'surfacing' } }, 'x', /./],
    ['neither bit', { bit: undefined }, 'bit', /describe one/],
    ['a revision of nought', { revision: 0 }, 'revision', /at least 1/],
    ['a field that is not known', { price: 3 }, 'price', /leave it out/],
  ])('%s', async (what, change, path, sentence) => {
    const small = what.startsWith('a bit') ? await club.machine(tarn, { bedXMm: 90, bedYMm: 60 }) : null;
    const { errors } = await refused(toldOf(small?.id ?? machineId, change), 422);
    const at = small === null ? path : 'bit.diameterMm';
    expect(errors?.map((error) => error.path)).toEqual([at]);
    expect(errors?.[0]?.message).toMatch(sentence);
  });

  it('is told all that is wrong at once', async () => {
    const {
      bit: _described,
      settings,
      ...told
    } = toldOf(machineId, {
      bitId: (await ownBit(tarn)).id,
      measured: [
        { drawnMm: 50, measuredMm: 5 },
        { drawnMm: 12, measuredMm: 12 },
      ],
      cutOn: tomorrow(),
    });
    const wide = { ...settings, stepoverMm: 3.2 };
    const { errors, detail } = await refused({ ...told, settings: wide }, 422);
    const paths = ['settings.stepoverMm', 'measured.0.measuredMm', 'cutOn'];
    expect(errors?.map(({ path }) => path)).toEqual(paths);
    for (const path of paths) expect(detail).toContain(path);
  });

  it('is taken when the member says that the sizes are millimetres', async () => {
    const measured = [{ drawnMm: 19.05, measuredMm: 0.75 }];
    const made = await record(tarn, slug, toldOf(machineId, { measured, sizesAreMm: true })).expect(201);
    expect(made.body.measured).toEqual(measured);
  });
});

describe('what is not there for this member', () => {
  it('another member’s bit, or one that was removed', async () => {
    const { bit: _described, ...told } = toldOf(machineId);
    const another = await refused({ ...told, bitId: (await ownBit(wren)).id }, 404);
    expect(another).toMatchObject({ type: 'bit.not-found', detail: expect.stringContaining('your drawer') });
    const own = await ownBit(tarn);
    await tarn.call('delete', `/api/bits/${own.id}`).expect(204);
    await refused({ ...told, bitId: own.id }, 404);
  });

  it('another member’s machine', async () => {
    const { type, detail } = await refused(toldOf((await club.machine(wren)).id), 404);
    expect({ type, detail }).toEqual({
      type: 'machine.not-found',
      detail: expect.stringContaining('your bench'),
    });
  });

  it('a revision or design that there is none of', async () => {
    expect(await refused(toldOf(machineId, { revision: 2 }), 404)).toMatchObject({
      type: 'revision.not-found',
      detail: expect.stringContaining('no revision 2'),
    });
    await record(tarn, 'no-such-design', toldOf(machineId)).expect(404);
    await tarn.call('get', '/api/designs/no-such-design/cuts').expect(404);
  });

  it('a record that there is none of', async () => {
    for (const id of ['none', machineId]) {
      await tarn.call('get', `/api/cuts/${id}`).expect(404);
      await tarn.call('post', `/api/cuts/${id}/in-service`).send({ result: 'holds' }).expect(404);
    }
  });

  it('another member’s bench, in a correction', async () => {
    const made = await recorded(club, tarn, slug);
    const { revision: _revision, bit: _described, ...told } = toldOf(made.machine.id);
    const correct = (change: object) =>
      tarn.call('patch', `/api/cuts/${made.id}`).send({ ...told, version: 1, ...change });
    const before = await written();
    await correct({ bit: made.bit, machineId: (await club.machine(wren)).id }).expect(404);
    await correct({ bitId: (await ownBit(wren)).id }).expect(404);
    await correct({ bit: made.bit, runTimeS: 0 }).expect(422);
    await correct({ bit: made.bit, cutOn: tomorrow() }).expect(422);
    expect(await written()).toEqual(before);
    expect((await tarn.call('get', `/api/cuts/${made.id}`)).body).toEqual({ ...made, earlier: [] });
  });
});
