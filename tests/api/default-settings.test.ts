import { strFromU8, unzipSync } from 'fflate';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { CutRecord } from '#shared/api/cuts.ts';
import type { Design } from '#shared/api/designs.ts';
import type { Flag } from '#shared/api/flags.ts';
import type { PackageSettings } from '#shared/api/package.ts';
import type { DecisionAction } from '#shared/api/vocabulary.ts';
import { chosenRecord, evidenceOf } from '#src/routes/design/evidence.ts';
import { cutOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { bytesOf } from './support/bytes-of.ts';
import { decideOn } from './support/decide.ts';
import { decided } from './support/raise-flag.ts';
import { recorded } from './support/record-cut.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let moss: Person;
let machineId: string;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  moss = await club.person('Moss', 'moderator');
  machineId = (await club.machine(wren)).id;
});
afterAll(() => club.close());

let widthMm = 150;
/** Evidence is for a geometry, so each design here has one of its own. Its first record has a run time of 1000 s. */
const cutDesign = () => {
  widthMm += 1;
  return sharedDesign(wren, { cut: cutOf(machineId, { runTimeS: 1000 }) }, plateSvg(widthMm));
};
const at = ({ slug }: Design) => `/api/designs/${slug}/revisions/1`;
const packageFiles = async (design: Design, query = '') => {
  const answer = await bytesOf(tarn.call('get', `${at(design)}/package.zip${query}`));
  expect(answer.status).toBe(200);
  const files = unzipSync(answer.body);
  const text = (name: string) => strFromU8(files[name] ?? new Uint8Array());
  return {
    settings: JSON.parse(text('settings.json')) as PackageSettings,
    credits: text('LICENCE-AND-CREDITS.txt'),
  };
};

/** The run times by which the package, the fit report and the page choose: the three must choose alike. */
async function chosenEverywhere(design: Design) {
  const machines = (await wren.call('get', '/api/machines').expect(200)).body.items as { id: string }[];
  const fit = await wren.call('get', `${at(design)}/fit?machineId=${machines[0]?.id}`).expect(200);
  const page = (await tarn.call('get', `/api/designs/${design.slug}`).expect(200)).body as Design;
  const needed = fit.body.checks.find(({ id }: { id: string }) => id === 'feed')?.need;
  const { record } = (await packageFiles(design)).settings;
  const onPage = chosenRecord(evidenceOf(page).ofThis, null);
  expect(onPage?.runTimeS).toBe(record?.runTimeS);
  expect(needed ?? undefined).toBe(record?.settings.feedMmPerMin);
  return record?.runTimeS;
}
/** A moderator decides on the one flag that the program raised on a design. */
async function decideOpenFlag({ slug }: Design, action: DecisionAction, reason: string) {
  const { items } = (await moss.call('get', '/api/flags?state=open').expect(200)).body as { items: Flag[] };
  const flags = items.filter(({ design }) => design.slug === slug);
  expect(flags).toHaveLength(1);
  for (const flag of flags) await decided(moss, flag, action, reason);
}

const { settings } = cutOf('');
/** 1300 is 8 % more than 1200 (C), within the 15 % of same settings; 1500 is 25 % more. */
const alike = { ...settings, feedMmPerMin: 1300 };
const other = { ...settings, feedMmPerMin: 1500 };

describe('settings that nobody asked for by name', () => {
  it('are those of the newest clean record', async () => {
    const design = await cutDesign();
    await recorded(club, tarn, design.slug, { runTimeS: 1001, settings: other });
    await recorded(club, tarn, design.slug, { runTimeS: 1002, outcome: 'failed', settings: alike });
    expect(await chosenEverywhere(design)).toBe(1001);
  });

  it('are not those of a part that broke in use', async () => {
    const design = await cutDesign();
    const { id } = await recorded(club, tarn, design.slug, { runTimeS: 1001, settings: other });
    await tarn.call('post', `/api/cuts/${id}/in-service`).send({ result: 'broke' }).expect(201);
    expect(await chosenEverywhere(design)).toBe(1000);
    await tarn.call('post', `/api/cuts/${id}/in-service`).send({ result: 'holds' }).expect(201);
    expect(await chosenEverywhere(design)).toBe(1001);
  });

  it('are not those of a record with a hazard, until a moderator settles it', async () => {
    const design = await cutDesign();
    const told = { runTimeS: 1001, settings: other, wentWrong: ['bit-broke'] };
    await recorded(club, tarn, design.slug, told);
    expect(await chosenEverywhere(design)).toBe(1000);
    await decideOpenFlag(design, 'dismiss', 'A worn bit.');
    expect(await chosenEverywhere(design)).toBe(1001);
  });

  it('are none when something speaks against every record', async () => {
    const design = await cutDesign();
    const id = design.cuts[0]?.id;
    await wren.call('post', `/api/cuts/${id}/in-service`).send({ result: 'broke' }).expect(201);
    expect(await chosenEverywhere(design)).toBeUndefined();
  });
});

describe('withheld settings', () => {
  const refusedEverywhere = async (design: Design, record: Pick<CutRecord, 'id'>, reason: string) => {
    const machine = await club.machine(tarn);
    for (const path of ['package.zip?', 'drawing.svg?', `fit?machineId=${machine.id}&`]) {
      const answer = await tarn.call('get', `${at(design)}/${path}recordId=${record.id}`).expect(403);
      expect(answer.body).toMatchObject({ type: 'settings.withheld' });
      expect(answer.body.detail).toContain(reason);
    }
  };

  it('are refused by the fit report and with a take, and nobody gets them unasked', async () => {
    const design = await cutDesign();
    const record = await recorded(club, tarn, design.slug, { runTimeS: 1001, settings: other });
    await decideOn(moss, record, 'withholdSettings', 'Too fast for tape.');
    await refusedEverywhere(design, record, 'Too fast for tape.');
    expect(await chosenEverywhere(design)).toBe(1000);
  });

  it('are withheld in every record that has the same ones in this material, earlier and later', async () => {
    const design = await cutDesign();
    const [first] = design.cuts as [CutRecord];
    const record = await recorded(club, tarn, design.slug, { runTimeS: 1001, settings: alike });
    const ply = { runTimeS: 1002, settings: alike, materialId: 'plywood' };
    const inPlywood = await recorded(club, tarn, design.slug, ply);
    await decideOn(moss, record, 'withholdSettings', 'Too fast for tape.');
    const again = await recorded(club, wren, design.slug, { runTimeS: 1003 });
    for (const same of [first, record, again]) await refusedEverywhere(design, same, 'Too fast for tape.');
    expect(await chosenEverywhere(design)).toBe(1002);
    const page = (await tarn.call('get', `/api/designs/${design.slug}`).expect(200)).body as Design;
    const withheld = page.cuts.filter((cut) => cut.settingsWithheld !== undefined).map(({ id }) => id);
    expect(new Set(withheld)).toEqual(new Set([first.id, record.id, again.id]));
    expect(withheld).not.toContain(inPlywood.id);
    await decideOn(moss, record, 'restore', 'Screws hold it.');
    expect(await chosenEverywhere(design)).toBe(1003);
  });

  it('are not the same when the override makes another feed of them', async () => {
    const design = await cutDesign();
    const record = await recorded(club, tarn, design.slug, { runTimeS: 1001, overridePercent: 130 });
    await decideOn(moss, record, 'withholdSettings', 'Too fast for tape.');
    expect(await chosenEverywhere(design)).toBe(1000);
  });
});

describe('a package tells what speaks against it', () => {
  it('the feed really cut with, what went wrong, how it holds, and what the rules say', async () => {
    const design = await cutDesign();
    // 3.5 mm with a bit of 3.175 in MDF: over the cap of one diameter, under twice it.
    const told = {
      settings: { ...settings, depthOfCutMm: 3.5 },
      overridePercent: 80,
      wentWrong: ['burning'],
    };
    const { id } = await recorded(club, tarn, design.slug, told);
    await tarn.call('post', `/api/cuts/${id}/in-service`).send({ result: 'broke', notes: 'At the hole.' });
    const { settings: sent, credits } = await packageFiles(design, `?recordId=${id}`);
    // 1200 at 80 % is 960 (C).
    expect(sent.record).toMatchObject({
      overridePercent: 80,
      effectiveFeedMmPerMin: 960,
      wentWrong: ['burning'],
      inService: { result: 'broke', notes: 'At the hole.' },
      findings: [{ level: 'caution', source: 'common practice, no published source' }],
    });
    expect(sent.record?.findings[0]?.sentence).toContain('3.5 mm');
    expect(credits).not.toContain('BEFORE YOU CUT');
    const first = (await packageFiles(design)).settings.record;
    expect(first).toMatchObject({ effectiveFeedMmPerMin: 1200, wentWrong: [], findings: [] });
    expect(first?.overridePercent).toBeUndefined();
  });

  it('an override may make a chip that is not to be cut', async () => {
    // 1200 at 300 % with 16 000 rev/min and one flute: 0.225 mm a tooth (C), over the 0.15 of 3.175 mm in MDF (P).
    const design = await cutDesign();
    const told = { overridePercent: 300, bit: { diameterMm: 3.175, flutes: 1, kind: 'up-cut' } };
    const record = await recorded(club, tarn, design.slug, told);
    expect(record.findings).toMatchObject([{ ruleId: 'chip-load', level: 'caution' }]);
    const settingsTwice = { ...settings, feedMmPerMin: 2000 };
    const far = await recorded(club, tarn, design.slug, { ...told, settings: settingsTwice });
    expect(far.findings).toMatchObject([{ ruleId: 'chip-load', level: 'do-not-cut' }]);
    expect(far.settingsWithheld?.reason).toContain('override of 300 %');
  });

  it('cautions of moderators and findings not to cut by, under a heading of their own', async () => {
    const design = await cutDesign();
    const settingsDeep = { ...settings, depthOfCutMm: 7 };
    const record = await recorded(club, tarn, design.slug, { settings: settingsDeep });
    await tarn.call('get', `${at(design)}/package.zip?recordId=${record.id}`).expect(403);
    await decideOpenFlag(design, 'caution', 'Only in foam-backed MDF.');
    const { settings: sent, credits } = await packageFiles(design, `?recordId=${record.id}`);
    expect(sent.cautions).toEqual(['Only in foam-backed MDF.']);
    const [, warned = ''] = credits.split('READ THIS BEFORE YOU CUT');
    expect(warned).toContain('- A moderator says: Only in foam-backed MDF.');
    expect(warned).toMatch(/- Do not cut with these settings: A pass of 7 mm/);
    expect(credits).toContain('Settings recorded by Tarn');
  });
});
