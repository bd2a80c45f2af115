import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { auditEntry, cut, flag, notice } from '#server/db/schema/index.ts';
import type { CutRecord, CutRecordWithHistory } from '#shared/api/cuts.ts';
import type { Design } from '#shared/api/designs.ts';
import { plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { decideOn } from './support/decide.ts';
import { ownBit, record, recorded, toldOf } from './support/record-cut.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let moss: Person;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  moss = await club.person('Moss', 'moderator');
});
afterAll(() => club.close());

/** Each test has a geometry of its own: evidence is shared by geometry. */
let widthMm = 200;
const newDesign = (title: string): Promise<Design> => {
  widthMm += 1;
  return sharedDesign(wren, { title }, plateSvg(widthMm));
};
const today = () => new Date().toISOString().slice(0, 10);
const auditsOf = (cutId: string) =>
  club.deps.database.db
    .select({ action: auditEntry.action, actorId: auditEntry.actorId })
    .from(auditEntry)
    .where(eq(auditEntry.subject, `cut:${cutId}`))
    .orderBy(auditEntry.number);

describe('recording a cut', () => {
  it('keeps all that was told, with machine and bit as they were, and today as its date', async () => {
    const { slug } = await newDesign('Told in full');
    const machine = await club.machine(tarn, { accelerationMmPerS2: 400 });
    const bit = await ownBit(tarn, { maxRpm: 24_000, flutes: 1 });
    const { bit: _described, ...cutToldInFull } = toldOf(machine.id, {
      bitId: bit.id,
      overridePercent: 80,
      outcome: 'usable',
      wentWrong: ['tear-out', 'size-off'],
      measured: [{ drawnMm: 12, measuredMm: 12.1 }],
      notes: 'Second pass of air.',
    });
    const before = today();
    const answer = await record(tarn, slug, cutToldInFull).expect(201);
    const made = answer.body as CutRecord;
    expect(made).toMatchObject({
      version: 1,
      revision: 1,
      design: { slug },
      member: { id: tarn.id, name: 'Tarn' },
      machine: { id: machine.id, name: machine.name, bedXMm: 300, bedYMm: 180 },
      bit: { diameterMm: 3.175, flutes: 1, kind: 'up-cut' },
      materialFamily: 'mdf',
      overridePercent: 80,
      outcome: 'usable',
      wentWrong: ['tear-out', 'size-off'],
      measured: [{ drawnMm: 12, measuredMm: 12.1 }],
      notes: 'Second pass of air.',
      photos: [],
    });
    expect([before, today()]).toContain(made.cutOn);
    await tarn.call('delete', `/api/machines/${machine.id}`).expect(204);
    await tarn.call('delete', `/api/bits/${bit.id}`).expect(204);
    const read = (await wren.call('get', `/api/cuts/${made.id}`).expect(200)).body as CutRecordWithHistory;
    expect(read).toEqual({ ...made, earlier: [] });
    const [row] = await club.deps.database.db.select().from(cut).where(eq(cut.id, made.id));
    expect(row?.bitMaxRpm).toBe(24_000);
    expect(row?.machine.accelerationMmPerS2).toBe(400);
    expect(await auditsOf(made.id)).toEqual([{ action: 'cut.recorded', actorId: tarn.id }]);
    const list = await wren.call('get', `/api/designs/${slug}/cuts`).expect(200);
    expect(list.body).toEqual({ items: [made], total: 1, nextCursor: null });
  });

  it('tells the member who shared the design, and nobody of their own', async () => {
    const design = await newDesign('Told to its owner');
    await recorded(club, wren, design.slug);
    await recorded(club, tarn, design.slug, { outcome: 'failed', wentWrong: ['bit-broke'] });
    const told = await club.deps.database.db.select().from(notice).where(eq(notice.designId, design.id));
    const ofCuts = told.filter(({ kind }) => kind === 'cut-recorded');
    expect(ofCuts).toMatchObject([{ memberId: wren.id, kind: 'cut-recorded' }]);
    expect(ofCuts[0]?.sentence).toMatch(/^Tarn recorded a cut of “Told to its owner” .*failed.*hazard.*\.$/);
  });

  it('sent twice with one key makes one record', async () => {
    const { slug } = await newDesign('Sent twice');
    const machine = await club.machine(tarn);
    const first = await record(tarn, slug, toldOf(machine.id), 'cut-again').expect(201);
    const second = await record(tarn, slug, toldOf(machine.id), 'cut-again').expect(201);
    expect(second.body).toEqual(first.body);
    expect((await tarn.call('get', `/api/designs/${slug}/cuts`)).body.total).toBe(1);
    await record(tarn, slug, toldOf(machine.id, { runTimeS: 9 }), 'cut-again').expect(422);
  });

  it('of a withdrawn design is still taken: what happened is evidence', async () => {
    const { slug } = await newDesign('Withdrawn');
    await wren.call('delete', `/api/designs/${slug}`).expect(204);
    await recorded(club, tarn, slug);
    expect((await wren.call('get', `/api/designs/${slug}`)).body.cuts).toHaveLength(1);
  });

  it('of a withheld design is still taken, and does not lift the withholding', async () => {
    const { slug } = await newDesign('Withheld');
    const first = await recorded(club, tarn, slug);
    await decideOn(moss, first, 'withholdDesign', 'The counterbore is too deep.');
    await recorded(club, tarn, slug, { outcome: 'failed', wentWrong: ['part-came-loose'] });
    const { body } = await wren.call('get', `/api/designs/${slug}`).expect(200);
    expect(body.cuts).toHaveLength(2);
    expect(body.withheld).toEqual({ reason: 'The counterbore is too deep.' });
    expect(body.standing.map(({ word }: { word: string }) => word)).toEqual(['withheld']);
  });

  it('of hazardous stock is taken, has no family, and is flagged by the rules', async () => {
    const { slug } = await newDesign('In PVC');
    const made = await recorded(club, tarn, slug, { materialId: 'pvc' });
    expect(made).toMatchObject({ materialId: 'pvc', materialFamily: null });
    const flags = await club.deps.database.db.select().from(flag).where(eq(flag.cutId, made.id));
    expect(flags.map(({ level, raisedBy }) => ({ level, raisedBy }))).toContainEqual({
      level: 'do-not-cut',
      raisedBy: null,
    });
  });

  it('with a spindle over the mark of the bit in the drawer is flagged; within it, not', async () => {
    const { slug } = await newDesign('Over the mark');
    const machine = await club.machine(tarn);
    const flagged = async (maxRpm: number) => {
      const { bit: _described, ...told } = toldOf(machine.id, { bitId: (await ownBit(tarn, { maxRpm })).id });
      const { id } = (await record(tarn, slug, told).expect(201)).body as CutRecord;
      return (await club.deps.database.db.select().from(flag).where(eq(flag.cutId, id))).length;
    };
    expect(await flagged(12_000)).toBe(1);
    expect(await flagged(20_000)).toBe(0);
  });
});

describe('correcting a record', () => {
  const correctionOf = (machineId: string, version: number, change: Record<string, unknown> = {}) => {
    const { revision: _revision, ...told } = toldOf(machineId, change);
    return { ...told, version };
  };

  it('says it anew, and keeps what it said before to be read', async () => {
    const { slug } = await newDesign('Corrected');
    const made = await recorded(club, tarn, slug, { runTimeS: 1800, notes: 'First.' });
    const { id } = made.machine;
    const send = (version: number, change: object) =>
      tarn.call('patch', `/api/cuts/${made.id}`).send(correctionOf(id, version, { ...change }));
    await send(1, { runTimeS: 1900, notes: 'Second.' }).expect(200);
    const third = await send(2, { runTimeS: 2000, notes: 'Third.' }).expect(200);
    expect(third.body).toMatchObject({ version: 3, runTimeS: 2000, correctedAt: expect.any(String) });
    const { earlier, ...now } = (await wren.call('get', `/api/cuts/${made.id}`).expect(200))
      .body as CutRecordWithHistory;
    expect(now).toEqual(third.body);
    expect(earlier.map(({ version, runTimeS, notes }) => ({ version, runTimeS, notes }))).toEqual([
      { version: 2, runTimeS: 1900, notes: 'Second.' },
      { version: 1, runTimeS: 1800, notes: 'First.' },
    ]);
    expect((await auditsOf(made.id)).map(({ action }) => action)).toEqual([
      'cut.recorded',
      'cut.corrected',
      'cut.corrected',
    ]);
  });

  it('of a stale version, once or twice at once, gets 409 with the record as it is', async () => {
    const { slug } = await newDesign('Corrected twice');
    const made = await recorded(club, tarn, slug);
    const send = (runTimeS: number) =>
      tarn.call('patch', `/api/cuts/${made.id}`).send(correctionOf(made.machine.id, 1, { runTimeS }));
    const answers = await Promise.all([send(100), send(200)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const good = answers.find(({ status }) => status === 200);
    const stale = answers.find(({ status }) => status === 409);
    expect(stale?.body).toMatchObject({ type: 'cut.changed', current: good?.body });
    const again = await send(300).expect(409);
    expect(again.body.current).toEqual(good?.body);
    const read = await tarn.call('get', `/api/cuts/${made.id}`).expect(200);
    expect(read.body.earlier).toHaveLength(1);
  });

  it('is for the member who made the cut alone', async () => {
    const { slug } = await newDesign('Not theirs');
    const made = await recorded(club, tarn, slug);
    const machine = await club.machine(wren);
    const answer = await wren
      .call('patch', `/api/cuts/${made.id}`)
      .send(correctionOf(machine.id, 1))
      .expect(403);
    expect(answer.body.detail).toContain('Tarn');
    await wren.call('post', `/api/cuts/${made.id}/in-service`).send({ result: 'holds' }).expect(403);
    expect((await tarn.call('get', `/api/cuts/${made.id}`)).body).toEqual({ ...made, earlier: [] });
  });

  it('keeps machine and bit as they were copied, though both were changed or removed since', async () => {
    const { slug } = await newDesign('Bench changed');
    const machine = await club.machine(tarn);
    const bit = await ownBit(tarn, { maxRpm: 20_000 });
    const { bit: _described, ...told } = toldOf(machine.id, { bitId: bit.id });
    const made = (await record(tarn, slug, told).expect(201)).body as CutRecord;
    await tarn.call('delete', `/api/machines/${machine.id}`).expect(204);
    await tarn.call('delete', `/api/bits/${bit.id}`).expect(204);
    const corrected = await tarn
      .call('patch', `/api/cuts/${made.id}`)
      .send(correctionOf(machine.id, 1, { outcome: 'failed', bit: made.bit }))
      .expect(200);
    expect(corrected.body).toMatchObject({ outcome: 'failed', machine: made.machine, bit: made.bit });
    const [row] = await club.deps.database.db.select().from(cut).where(eq(cut.id, made.id));
    expect(row).toMatchObject({ bitId: bit.id, bitMaxRpm: 20_000 });
  });

  it('keeps the date of the cut when it says none', async () => {
    const { slug } = await newDesign('Dated');
    const made = await recorded(club, tarn, slug, { cutOn: '2025-03-04' });
    const corrected = await tarn
      .call('patch', `/api/cuts/${made.id}`)
      .send(correctionOf(made.machine.id, 1))
      .expect(200);
    expect(corrected.body.cutOn).toBe('2025-03-04');
  });
});

describe('notes in service', () => {
  it('are added, and the newest counts', async () => {
    const { slug } = await newDesign('In service');
    const made = await recorded(club, tarn, slug);
    const note = (body: object) => tarn.call('post', `/api/cuts/${made.id}/in-service`).send(body);
    await note({ result: 'holds' }).expect(201);
    const broke = await note({ result: 'broke', notes: 'The counterbore cracked.' }).expect(201);
    expect(broke.body.inService).toMatchObject({ result: 'broke', notes: 'The counterbore cracked.' });
    expect(broke.body.version).toBe(1);
    await note({ result: 'perhaps' }).expect(422);
    const read = await wren.call('get', `/api/cuts/${made.id}`).expect(200);
    expect(read.body.inService.result).toBe('broke');
  });
});
