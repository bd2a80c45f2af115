import { and, eq } from 'drizzle-orm';
import { pino } from 'pino';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createApp } from '#server/app.ts';
import { auditEntry, decision, flag, notice, outbox, take } from '#server/db/schema/index.ts';
import type { Design } from '#shared/api/designs.ts';
import type { Flag } from '#shared/api/flags.ts';
import { cutOf, plateSvg } from '../support/samples.ts';
import { origin, type Person, signIn, type TestClub, testClub } from '../support/test-club.ts';
import { decide, decided, flagged } from './support/raise-flag.ts';
import { recorded } from './support/record-cut.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let fern: Person;
let moss: Person;
let heron: Person;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  fern = await club.person('Fern');
  moss = await club.person('Moss', 'moderator');
  heron = await club.person('Heron', 'moderator');
});
afterAll(() => club.close());

let widthMm = 400;
const newDesign = (title: string, by = wren): Promise<Design> => {
  widthMm += 1;
  return sharedDesign(by, { title }, plateSvg(widthMm));
};
const files = ['drawing.svg', 'package.zip'] as const;
const takeOf = (person: Person, slug: string, file: (typeof files)[number], query = '') =>
  person.call('get', `/api/designs/${slug}/revisions/1/${file}${query}`);
const pageOf = async (slug: string) =>
  (await tarn.call('get', `/api/designs/${slug}`).expect(200)).body as Design;
const noticesOf = async (person: Person, designId: string) =>
  (
    await club.deps.database.db
      .select()
      .from(notice)
      .where(and(eq(notice.memberId, person.id), eq(notice.designId, designId)))
      .orderBy(notice.createdAt, notice.id)
  ).map(({ kind, sentence }) => ({ kind, sentence }));

describe.each(['withholdRevision', 'withholdDesign'] as const)('%s', (action) => {
  it('stops the taking with the reason, on the page, in the API and in the search, until it is restored', async () => {
    const design = await newDesign(`Stopped by ${action}`);
    for (const file of files) await takeOf(fern, design.slug, file).expect(200);
    const taken = await club.deps.database.db.$count(take);
    const flag = await flagged(tarn, design.slug);
    const withheld = await decided(moss, flag, action, 'The wall breaks out.');
    expect(withheld).toMatchObject({ state: 'decided', version: 2, decision: { action } });
    for (const file of files) {
      const answer = await takeOf(fern, design.slug, file).expect(403);
      expect(answer.body).toMatchObject({
        type: 'revision.withheld',
        detail: expect.stringContaining('The wall breaks out.'),
      });
      expect(answer.headers['content-disposition']).toBeUndefined();
    }
    expect(await club.deps.database.db.$count(take)).toBe(taken);
    const page = await pageOf(design.slug);
    expect(page.withheld).toEqual({ reason: 'The wall breaks out.' });
    expect(page.revision.withheld).toEqual({ reason: 'The wall breaks out.' });
    const inSearch = async (standing: string) => {
      const answer = await tarn.call('get', `/api/designs?standing=${standing}&q=${action}`).expect(200);
      return (answer.body.items as Design[]).some(({ id }) => id === design.id);
    };
    expect(await inSearch('withheld')).toBe(true);

    const restored = await decided(heron, withheld, 'restore', 'It was drawn anew.');
    expect(restored).toMatchObject({ state: 'decided', version: 3, decision: { action: 'restore' } });
    for (const file of files) await takeOf(fern, design.slug, file).expect(200);
    expect((await pageOf(design.slug)).withheld).toBeUndefined();
    expect(await inSearch('withheld')).toBe(false);
    expect(await inSearch('uncut')).toBe(true);
  });
});

describe('withheld settings', () => {
  it('leave the drawing free, go along with no package, and say why when they are asked for', async () => {
    const machine = await club.machine(wren);
    widthMm += 1;
    const { slug, cuts } = await sharedDesign(
      wren,
      { title: 'Settings', cut: cutOf(machine.id) },
      plateSvg(widthMm),
    );
    const recordId = cuts[0]?.id ?? '';
    const flag = await flagged(tarn, slug, { recordId });
    const withheld = await decided(moss, flag, 'withholdSettings', 'Far too fast.');
    await takeOf(fern, slug, 'drawing.svg').expect(200);
    await takeOf(fern, slug, 'package.zip').expect(200);
    for (const file of files) {
      const answer = await takeOf(fern, slug, file, `?recordId=${recordId}`).expect(403);
      expect(answer.body).toMatchObject({
        type: 'settings.withheld',
        detail: expect.stringContaining('Far too fast.'),
      });
    }
    const page = await pageOf(slug);
    expect(page.withheld).toBeUndefined();
    expect(page.cuts[0]?.settingsWithheld).toEqual({ reason: 'Far too fast.' });
    expect(page.settingsStanding[0]?.word).toBe('withheld');
    await decided(moss, withheld, 'restore', 'They were measured.');
    await takeOf(fern, slug, 'package.zip', `?recordId=${recordId}`).expect(200);
  });

  it('need a record to be withheld', async () => {
    const { slug } = await newDesign('No record');
    const flag = await flagged(tarn, slug);
    const answer = await decide(moss, flag, 'withholdSettings').expect(422);
    expect(answer.body).toMatchObject({ errors: [{ path: 'action' }] });
    await decided(moss, flag, 'dismiss');
  });
});

describe('a decision', () => {
  it('without a reason, at no version, or of no kind is refused with the fields named', async () => {
    const { slug } = await newDesign('Without a reason');
    const { id } = await flagged(tarn, slug);
    const send = (body: object) => moss.call('post', `/api/flags/${id}/decision`).send(body).expect(422);
    const answer = await send({ action: 'burn', reason: ' ' });
    const paths = answer.body.errors.map(({ path }: { path: string }) => path).sort();
    expect(paths).toEqual(['action', 'reason', 'version']);
  });

  it('on a flag that is not there is 404', async () => {
    for (const id of ['no-id', '01890000-0000-7000-8000-000000000000']) {
      await decide(moss, { id, version: 1 }, 'dismiss').expect(404);
    }
  });

  it('is no member’s, not even the owner’s or the flagger’s', async () => {
    const { slug } = await newDesign('Not by members');
    const flag = await flagged(tarn, slug);
    for (const person of [wren, tarn]) await decide(person, flag, 'dismiss').expect(403);
  });

  it('on one’s own design is nobody’s, whatever the way and whoever they are', async () => {
    const { slug } = await newDesign('Of a moderator', moss);
    const flag = await flagged(tarn, slug);
    const before = await club.deps.database.db.$count(decision);
    for (const action of ['dismiss', 'caution', 'withholdDesign'] as const) {
      const answer = await decide(moss, flag, action).expect(403);
      expect(answer.body).toMatchObject({
        type: 'decision.own-design',
        detail: expect.stringContaining('own design'),
      });
    }
    const both = { designSlug: slug, reason: 'Mine.', decision: { action: 'dismiss', reason: 'Mine.' } };
    await moss.call('post', '/api/flags').send(both).expect(403);
    expect(await club.deps.database.db.$count(decision)).toBe(before);
    await decided(heron, flag, 'dismiss');
  });

  it('on one’s own cut record is nobody’s, on whoever’s design', async () => {
    const { slug } = await newDesign('Cut by a moderator');
    const record = await recorded(club, moss, slug);
    const flag = await flagged(tarn, slug, { recordId: record.id });
    const answer = await decide(moss, flag, 'dismiss').expect(403);
    expect(answer.body).toMatchObject({ type: 'decision.own-record' });
    expect(answer.body.detail).toContain('own cut record');
    await decided(heron, flag, 'dismiss');
  });

  it('that restores a revision leaves a design withheld, and says so', async () => {
    const design = await newDesign('Design first');
    const whole = await decided(moss, await flagged(tarn, design.slug), 'withholdDesign');
    const part = await decided(moss, await flagged(fern, design.slug), 'withholdRevision');
    await decided(heron, part, 'restore', 'Drawn anew.');
    await takeOf(fern, design.slug, 'drawing.svg').expect(403);
    const said = (await noticesOf(wren, design.id)).at(-1)?.sentence;
    expect(said).toContain('“Drawn anew.” The whole design is still withheld.');
    await decide(heron, await flagged(fern, design.slug), 'restore').expect(422);
    await decided(heron, whole, 'restore', 'All of it.');
    await takeOf(fern, design.slug, 'drawing.svg').expect(200);
    expect((await noticesOf(wren, design.id)).at(-1)?.sentence).not.toContain('still withheld');
  });

  it('of two moderators at once is one, and the other hears who did what', async () => {
    const { slug } = await newDesign('At once');
    const flag = await flagged(tarn, slug);
    const answers = await Promise.all([
      decide(moss, flag, 'caution', 'Thin walls.'),
      decide(heron, flag, 'withholdDesign', 'Thin walls, I say.'),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const won = answers.find(({ status }) => status === 200);
    const lost = answers.find(({ status }) => status === 409);
    expect(lost?.body.current).toEqual(won?.body);
    const said =
      won?.body.decision.action === 'caution'
        ? 'Moss decided this a moment ago: caution, “Thin walls.”.'
        : 'Heron decided this a moment ago: design withheld, “Thin walls, I say.”.';
    expect(lost?.body.detail).toBe(said);
    const { db } = club.deps.database;
    expect(await db.$count(decision, eq(decision.flagId, flag.id))).toBe(1);
  });

  it('is made once: a second one at the right version is refused, save to restore what was withheld', async () => {
    const { slug } = await newDesign('Made once');
    const flag = await flagged(tarn, slug);
    const cautioned = await decided(moss, flag, 'caution');
    for (const action of ['dismiss', 'withholdDesign', 'restore'] as const) {
      const answer = await decide(heron, cautioned, action).expect(409);
      expect(answer.body).toMatchObject({ type: 'flag.decided', current: cautioned });
    }
    const withheld = await decided(moss, await flagged(fern, slug), 'withholdRevision');
    for (const action of ['dismiss', 'caution', 'withholdRevision'] as const) {
      await decide(heron, withheld, action).expect(409);
    }
    await decide(heron, { ...withheld, version: 1 }, 'restore').expect(409);
    const restored = await decided(heron, withheld, 'restore');
    await decide(moss, restored, 'restore').expect(409);
    await decide(moss, restored, 'withholdRevision').expect(409);
  });

  it('that restores needs something that is withheld', async () => {
    const { slug } = await newDesign('Nothing withheld');
    const answer = await decide(moss, await flagged(tarn, slug), 'restore').expect(422);
    expect(answer.body.errors).toMatchObject([{ path: 'action' }]);
  });

  it('of caution is read by everyone, and takes nothing away', async () => {
    const { slug } = await newDesign('With care');
    await decided(moss, await flagged(tarn, slug), 'caution', 'Clamp it twice.');
    const page = await pageOf(slug);
    expect(page.cautions).toMatchObject([{ reason: 'Clamp it twice.' }]);
    await takeOf(fern, slug, 'drawing.svg').expect(200);
  });

  it.each(['dismiss', 'caution'] as const)('to %s settles the hazards of its record', async (action) => {
    const { slug } = await newDesign(`Hazard, ${action}`);
    await recorded(club, wren, slug);
    const record = await recorded(club, tarn, slug, { outcome: 'usable', wentWrong: ['part-came-loose'] });
    expect((await pageOf(slug)).standing).toMatchObject([{ word: 'disputed' }]);
    // Another flag on the record is not about its hazards.
    await decided(moss, await flagged(fern, slug, { recordId: record.id }), action);
    expect((await pageOf(slug)).standing).toMatchObject([{ word: 'disputed' }]);
    const { items } = (await moss.call('get', '/api/flags?state=open').expect(200)).body as { items: Flag[] };
    const raised = items.find(({ recordId }) => recordId === record.id);
    if (raised === undefined) throw new Error('no flag for the hazards');
    await decided(moss, raised, action);
    expect((await pageOf(slug)).standing).toMatchObject([{ word: 'proven' }]);
  });

  it('stands in the audit log by ids, with the hash of its reason', async () => {
    const { slug, id } = await newDesign('Logged');
    const raised = await flagged(tarn, slug);
    await decided(moss, raised, 'withholdDesign', 'abc');
    const entries = await club.deps.database.db
      .select()
      .from(auditEntry)
      .where(eq(auditEntry.subject, `flag:${raised.id}`))
      .orderBy(auditEntry.number);
    expect(entries).toMatchObject([
      { action: 'flag.raised', actorId: tarn.id, detail: { design: id } },
      {
        action: 'flag.decided',
        actorId: moss.id,
        detail: {
          action: 'withholdDesign',
          design: id,
          // FIPS 180-4, example of SHA-256 for "abc".
          reasonSha256: 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad',
        },
      },
    ]);
  });

  it('is all or nothing: when its mail cannot be kept, the flag is still open', async () => {
    const { slug } = await newDesign('All or nothing');
    const raised = await flagged(tarn, slug);
    // The outbox row gets the id of one that is there, so the last insert but those of takers fails.
    const { db } = club.deps.database;
    const [taken] = await db.select({ id: outbox.id }).from(outbox).limit(1);
    let count = 0;
    const ids = { next: () => (++count < 4 ? club.deps.ids.next() : (taken?.id ?? '')) };
    const app = createApp({ ...club.deps, ids, log: pino({ level: 'silent' }) });
    const cookie = await signIn(app, moss.email);
    count = 0;
    const before = await db.$count(notice);
    await supertest(app)
      .post(`/api/flags/${raised.id}/decision`)
      .set('Origin', origin)
      .set('Cookie', cookie)
      .send({ action: 'caution', reason: 'Thin walls.', version: 1 })
      .expect(500);
    expect(count).toBeGreaterThanOrEqual(4);
    const [row] = await db.select().from(flag).where(eq(flag.id, raised.id));
    expect(row).toMatchObject({ isOpen: true, version: 1 });
    expect(await db.$count(notice)).toBe(before);
    await decided(moss, raised, 'caution');
  });
});

describe('whom a decision concerns', () => {
  it('are the owner, the flagger, the member whose record it is, and everyone who took it', async () => {
    const design = await newDesign('Told of');
    const record = await recorded(club, heron, design.slug, { outcome: 'usable' });
    await takeOf(fern, design.slug, 'drawing.svg').expect(200);
    await takeOf(fern, design.slug, 'package.zip').expect(200);
    const raised = await flagged(tarn, design.slug, { recordId: record.id });
    const withheld = await decided(moss, raised, 'withholdSettings', 'It chattered.');
    const kinds = async (person: Person) => (await noticesOf(person, design.id)).map(({ kind }) => kind);
    expect(await kinds(tarn)).toEqual(['flag-decided']);
    expect(await kinds(heron)).toEqual(['flag-raised', 'flag-decided']);
    expect(await kinds(fern)).toEqual(['withheld']);
    expect(await kinds(moss)).toEqual([]);
    expect(await kinds(wren)).toEqual(expect.arrayContaining(['flag-raised', 'flag-decided']));
    for (const person of [wren, tarn, heron, fern]) {
      const told = (await noticesOf(person, design.id)).at(-1)?.sentence;
      expect(told).toContain('It chattered.');
      expect(told).toContain('Told of');
    }
    await decided(moss, withheld, 'restore', 'Slower now.');
    expect(await kinds(fern)).toEqual(['withheld', 'restored']);
    expect((await noticesOf(fern, design.id)).at(-1)?.sentence).toContain(
      'A moderator restored settings recorded for it: “Slower now.”',
    );
    expect((await noticesOf(wren, design.id)).at(-1)?.sentence).toContain('restored settings recorded for');
  });

  it('are not those who took another revision or nothing, when one revision is withheld', async () => {
    const design = await newDesign('Others');
    await decided(moss, await flagged(tarn, design.slug), 'withholdRevision');
    expect(await noticesOf(fern, design.id)).toEqual([]);
  });

  it('are told once, when they own and took it themselves', async () => {
    const design = await newDesign('Mine and taken');
    await takeOf(wren, design.slug, 'drawing.svg').expect(200);
    await decided(moss, await flagged(wren, design.slug), 'withholdDesign');
    expect(await noticesOf(wren, design.id)).toHaveLength(1);
  });
});
