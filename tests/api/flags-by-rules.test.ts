import { eq } from 'drizzle-orm';
import { unzipSync } from 'fflate';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { cut, flag, notice } from '#server/db/schema/index.ts';
import { hazardFlag } from '#server/features/review/hazard-flag.ts';
import { raiseRuleFlags } from '#server/features/review/raise-rule-flags.ts';
import type { Design } from '#shared/api/designs.ts';
import type { Finding } from '#shared/api/findings.ts';
import type { Flag } from '#shared/api/flags.ts';
import type { Hazard } from '#shared/evidence/went-wrong.ts';
import { cutOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { bytesOf } from './support/bytes-of.ts';
import { decide, decided } from './support/raise-flag.ts';
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

const finding = (change: Partial<Finding> = {}): Finding => ({
  ruleId: 'invented-rule',
  title: 'Too much at once',
  level: 'do-not-cut',
  sentence: 'The bit takes four times what it stands.',
  advice: 'Halve the feed twice.',
  figures: [{ name: 'chip load', value: 0.4, unit: 'mm' }],
  source: 'common practice, no published source',
  ...change,
});

let widthMm = 500;
/** A design with one record of its owner, and what rules are told of it. */
async function withRecord(title: string) {
  widthMm += 1;
  const machine = await club.machine(wren);
  const design = await sharedDesign(wren, { title, cut: cutOf(machine.id) }, plateSvg(widthMm));
  const cutId = design.cuts[0]?.id ?? '';
  const { db } = club.deps.database;
  const [row] = await db.select({ revisionId: cut.revisionId }).from(cut).where(eq(cut.id, cutId));
  const target = { designId: design.id, revisionId: row?.revisionId ?? '', cutId };
  const flags = async () => {
    const { items } = (await moss.call('get', '/api/flags').expect(200)).body as { items: Flag[] };
    return items.filter(({ design: { slug } }) => slug === design.slug);
  };
  return {
    slug: design.slug,
    target,
    raise: (...findings: Finding[]) =>
      db.transaction((tx) => raiseRuleFlags(club.deps, tx, { ...target, findings })),
    hazards: (...hazards: Hazard[]) =>
      db.transaction((tx) => hazardFlag(club.deps, tx, { ...target, hazards })),
    flags,
    page: async () => (await tarn.call('get', `/api/designs/${design.slug}`).expect(200)).body as Design,
    take: (file: string) => tarn.call('get', `/api/designs/${design.slug}/revisions/1/${file}`),
    async settingsInPackage() {
      const { body } = await bytesOf(this.take('package.zip'));
      const text = unzipSync(body)['settings.json'];
      return JSON.parse(new TextDecoder().decode(text)) as { record?: object };
    },
  };
}

describe('a rule', () => {
  it('flags a do-not-cut finding by itself, with the finding, and nothing milder', async () => {
    const { raise, flags, target } = await withRecord('By itself');
    await raise(
      finding(),
      finding({ ruleId: 'milder', level: 'caution' }),
      finding({ ruleId: 'mild', level: 'note' }),
    );
    const raised = await flags();
    expect(raised).toMatchObject([
      {
        state: 'open',
        level: 'do-not-cut',
        recordId: target.cutId,
        reason: 'The bit takes four times what it stands.',
        finding: finding(),
      },
    ]);
    expect(raised[0]?.raisedBy).toBeUndefined();
  });

  it('flags a target once while it is open, brings its figures up to date, and flags it again later', async () => {
    const { raise, flags } = await withRecord('Once while open');
    await raise(finding());
    await raise(finding(), finding());
    const [first] = await flags();
    expect(first?.version).toBe(1);
    await raise(finding({ sentence: 'The bit takes three times what it stands.' }));
    const [updated, ...others] = await flags();
    expect(others).toEqual([]);
    expect(updated).toMatchObject({ version: 2, reason: 'The bit takes three times what it stands.' });
    if (first === undefined || updated === undefined) throw new Error('no flag');
    const stale = await decide(moss, first, 'dismiss').expect(409);
    expect(stale.body).toMatchObject({ type: 'flag.changed', current: updated });
    await raise(updated.finding ?? finding(), finding({ ruleId: 'another' }));
    expect(await flags()).toHaveLength(2);
    await decided(moss, updated, 'dismiss');
    await raise(finding());
    expect(await flags()).toHaveLength(3);
  });

  it('tells the owner, who learns that the settings wait', async () => {
    const { raise, target } = await withRecord('Told the owner');
    await raise(finding());
    const { db } = club.deps.database;
    const told = await db.select().from(notice).where(eq(notice.designId, target.designId));
    expect(told).toMatchObject([{ memberId: wren.id, kind: 'flag-raised' }]);
    expect(told[0]?.sentence).toContain('not handed out until a moderator decides');
  });
});

describe('settings with a do-not-cut finding', () => {
  it.each(['dismiss', 'caution'] as const)(
    'are handed out to nobody until a moderator decides to %s',
    async (action) => {
      const it = await withRecord(`Waits, then ${action}`);
      expect((await it.settingsInPackage()).record).toBeDefined();
      await it.raise(finding());
      const reason = 'waits for a moderator: The bit takes four times what it stands.';
      expect((await it.page()).cuts[0]?.settingsWithheld).toEqual({ reason });
      expect((await it.page()).settingsStanding[0]?.word).toBe('withheld');
      for (const file of ['drawing.svg', 'package.zip']) {
        const answer = await it.take(`${file}?recordId=${it.target.cutId}`).expect(403);
        expect(answer.body).toMatchObject({
          type: 'settings.withheld',
          detail: `These settings carry a “do not cut” finding, which ${reason}`,
        });
      }
      expect((await it.settingsInPackage()).record).toBeUndefined();
      const page = await it.page();
      expect(page.withheld).toBeUndefined();

      const [open] = await it.flags();
      if (open === undefined) throw new Error('no flag');
      await decided(moss, open, action);
      expect((await it.page()).cuts[0]?.settingsWithheld).toBeUndefined();
      expect((await it.settingsInPackage()).record).toBeDefined();
      await it.take(`package.zip?recordId=${it.target.cutId}`).expect(200);
    },
  );

  it('wait no more once they were corrected to good ones, while the flag stays as a note', async () => {
    const it = await withRecord('Mended');
    await it.raise(finding());
    await it.raise();
    expect((await it.page()).cuts[0]?.settingsWithheld).toBeUndefined();
    const [open] = await it.flags();
    expect(open).toMatchObject({ state: 'open', level: 'note', version: 2 });
    expect(open?.reason).toContain('finds this no more');
    await it.raise(finding());
    expect(await it.flags()).toMatchObject([{ level: 'do-not-cut', reason: finding().sentence, version: 3 }]);
    expect((await it.page()).cuts[0]?.settingsWithheld).toBeDefined();
  });

  it('are flagged anew by a correction of the settings, not by one of anything else', async () => {
    const it = await withRecord('Corrected after a decision');
    const [record] = (await it.page()).cuts;
    if (record === undefined) throw new Error('no record');
    await it.raise(finding());
    const [open] = await it.flags();
    if (open === undefined) throw new Error('no flag');
    await decided(moss, open, 'dismiss');
    const told = cutOf(record.machine.id);
    const correct = (version: number, change: object) =>
      wren
        .call('patch', `/api/cuts/${record.id}`)
        .send({ ...told, version, ...change })
        .expect(200);
    await correct(record.version, { notes: 'The tape was new.' });
    await it.raise(finding());
    expect(await it.flags()).toHaveLength(1);
    await correct(record.version + 1, { stockThicknessMm: told.stockThicknessMm + 1 });
    await it.raise(finding());
    expect(await it.flags()).toHaveLength(2);
  });

  it('wait for each finding, and stay withheld for a moderator’s reason', async () => {
    const it = await withRecord('Two findings');
    await it.raise(finding(), finding({ ruleId: 'second', sentence: 'It is deeper than the stock.' }));
    const [first, second] = await it.flags();
    if (first === undefined || second === undefined) throw new Error('no flags');
    await decided(moss, first, 'dismiss');
    expect((await it.page()).cuts[0]?.settingsWithheld?.reason).toBe(
      `waits for a moderator: ${second.reason}`,
    );
    await decided(moss, second, 'withholdSettings', 'Too deep.');
    expect((await it.page()).cuts[0]?.settingsWithheld?.reason).toBe('Too deep.');
  });
});

describe('a record with hazards', () => {
  it('is flagged with the hazards named, once, and named anew when it is corrected', async () => {
    const { hazards, flags, page } = await withRecord('Hazards');
    await hazards();
    expect(await flags()).toEqual([]);
    await hazards('bit-broke');
    await hazards('bit-broke');
    const raised = await flags();
    expect(raised).toMatchObject([{ level: 'do-not-cut', reason: expect.stringContaining('the bit broke') }]);
    expect(raised[0]?.finding).toBeUndefined();
    expect((await page()).cuts[0]?.settingsWithheld).toBeUndefined();
    await hazards('bit-broke', 'fire-or-smoke', 'part-came-loose');
    expect(await flags()).toMatchObject([
      {
        version: 2,
        reason: expect.stringMatching(/the bit broke, there was fire or smoke and the part came loose/),
      },
    ]);
    expect(await club.deps.database.db.$count(flag, eq(flag.id, raised[0]?.id ?? ''))).toBe(1);
  });
});
