import { strFromU8, unzipSync } from 'fflate';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { decision, flag, notice, revision } from '#server/db/schema/index.ts';
import type { Design } from '#shared/api/designs.ts';
import type { DecisionAction, Licence } from '#shared/api/vocabulary.ts';
import { cutOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { bytesOf } from './support/bytes-of.ts';
import { sharedDesign, shareRemix, shareRevision } from './support/share-design.ts';
import { storedThings } from './support/stored-things.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let fern: Person;
let moss: Person;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  fern = await club.person('Fern');
  moss = await club.person('Moss', 'moderator');
});
afterAll(() => club.close());

const remixed = async (person: Person, slug: string, change: object = {}, svg = plateSvg()) =>
  (await shareRemix(person, slug, change, { svg }).expect(201)).body as Design;
const page = async (slug: string) =>
  (await fern.call('get', `/api/designs/${slug}`).expect(200)).body as Design;

const refused = async (request: () => PromiseLike<{ status: number; body: unknown }>, status: number) => {
  const before = await storedThings(club);
  const answer = await request();
  expect(answer.status).toBe(status);
  expect(await storedThings(club)).toEqual(before);
  return (answer.body as { detail: string }).detail;
};

/** A decision as the review desk writes it, so that this test is about remixes alone. */
async function decide(designId: string, action: DecisionAction, reason: string, onFlag?: string) {
  const { database, ids, clock } = club.deps;
  const rows = await database.db.select().from(revision);
  const [newest] = rows.filter((row) => row.designId === designId).sort((a, b) => b.number - a.number);
  const flagId = onFlag ?? ids.next();
  const target = { designId, revisionId: newest?.id ?? '', level: 'caution' as const };
  if (onFlag === undefined) {
    await database.db
      .insert(flag)
      .values({ id: flagId, ...target, reason, raisedBy: fern.id, createdAt: clock.now(), isOpen: false });
  }
  const decidedAt = clock.now();
  await database.db
    .insert(decision)
    .values({ id: ids.next(), flagId, action, reason, decidedBy: moss.id, decidedAt });
  return flagId;
}

describe('a remix', () => {
  it('is a design of the remixer’s own, linked both ways to the revision it was made from', async () => {
    const original = await sharedDesign(wren, { title: 'Collet wheel' });
    await shareRevision(wren, original.slug, {}, { svg: plateSvg(130) }).expect(201);
    const searchedBefore = await fern.call('get', '/api/designs?q=collet+wheel').expect(200);
    const remix = await remixed(
      tarn,
      original.slug,
      { title: 'Twelve places', parentRevision: 2 },
      plateSvg(131),
    );
    expect(remix).toMatchObject({
      title: 'Twelve places',
      owner: { id: tarn.id },
      revision: { number: 1, changeNote: 'for a larger bed' },
      parent: {
        slug: original.slug,
        revision: 2,
        title: 'Collet wheel',
        drawingNumber: original.drawingNumber,
        ownerName: 'Wren',
      },
      remixes: [],
    });
    expect((await page(original.slug)).remixes).toEqual([
      {
        slug: remix.slug,
        title: 'Twelve places',
        drawingNumber: remix.drawingNumber,
        ownerName: 'Tarn',
        fromRevision: 2,
        withheld: false,
      },
    ]);
    const searchedAfter = await fern.call('get', '/api/designs?q=collet+wheel').expect(200);
    const card = (body: { items: Design[] }) => body.items.find(({ slug }) => slug === original.slug);
    expect(card(searchedAfter.body)).toEqual(card(searchedBefore.body));
  });

  it('is told to the maker of its original, but not to oneself', async () => {
    const original = await sharedDesign(wren, { title: 'Told of' });
    const remix = await remixed(tarn, original.slug, { title: 'Made from it' });
    await remixed(wren, original.slug, { title: 'My own again' });
    const notices = await club.deps.database.db.select().from(notice);
    const told = notices.filter(({ sentence }) => sentence.includes('Told of'));
    expect(told).toMatchObject([{ memberId: wren.id, kind: 'remixed', designId: remix.id, readAt: null }]);
    expect(told[0]?.sentence).toBe(
      `Tarn remixed revision 1 of your “Told of” (${original.drawingNumber}) as “Made from it”.`,
    );
  });

  it('is withheld beside its original when nothing of it is handed out', async () => {
    const original = await sharedDesign(wren, { title: 'Beside' }, plateSvg(160));
    const remix = await remixed(tarn, original.slug, { title: 'Beside it' }, plateSvg(161));
    const isWithheld = async () => (await page(original.slug)).remixes[0]?.withheld;
    expect(await isWithheld()).toBe(false);
    const flagId = await decide(remix.id, 'withholdRevision', 'Too thin.');
    expect(await isWithheld()).toBe(true);
    await shareRevision(tarn, remix.slug, {}, { svg: plateSvg(162) }).expect(201);
    expect(await isWithheld()).toBe(false);
    expect(flagId).not.toBe(await decide(remix.id, 'withholdDesign', 'All of it.'));
    expect(await isWithheld()).toBe(true);
  });

  it('brings its own cut', async () => {
    const machine = await club.machine(tarn);
    const original = await sharedDesign(wren);
    const remix = await remixed(tarn, original.slug, { cut: cutOf(machine.id) }, plateSvg(140));
    expect(remix.standing).toMatchObject([{ material: 'mdf', word: 'cut-once' }]);
  });

  it('of the third generation names every original in its package, a withdrawn one too', async () => {
    const first = await sharedDesign(wren, { title: 'Wheel', licence: 'CC-BY-4.0' });
    const second = await remixed(tarn, first.slug, { title: 'Wheel of twelve', licence: 'CC-BY-NC-4.0' });
    const change = {
      title: 'Wheel with magnets',
      licence: 'CC-BY-NC-SA-4.0',
      changeNote: 'pockets for magnets',
    };
    const third = await remixed(fern, second.slug, change);
    await tarn.call('delete', `/api/designs/${second.slug}`).expect(204);
    expect((await page(third.slug)).parent).toMatchObject({ slug: second.slug, title: 'Wheel of twelve' });
    expect((await page(second.slug)).parent).toMatchObject({ slug: first.slug });

    const zip = await bytesOf(wren.call('get', `/api/designs/${third.slug}/revisions/1/package.zip`));
    const text = strFromU8(unzipSync(zip.body)['LICENCE-AND-CREDITS.txt'] ?? new Uint8Array());
    const named = [
      ['Wheel with magnets', third.drawingNumber, 'Fern', 'CC-BY-NC-SA-4.0', 'pockets for magnets'],
      ['Wheel of twelve', second.drawingNumber, 'Tarn', 'CC-BY-NC-4.0', 'for a larger bed'],
      ['Wheel', first.drawingNumber, 'Wren', 'CC-BY-4.0', 'first issue'],
    ];
    const [own, parent, grandparent, ...more] = text.split(/(?:Remixed from|Which was remixed from) /);
    expect(more).toEqual([]);
    for (const [place, part] of [own, parent, grandparent].entries()) {
      for (const words of named[place] ?? ['missing']) expect(part).toContain(words);
      expect(part).toContain('revision 1');
    }
  });
});

describe('the licence of the original', () => {
  it.each<[Licence, Licence, number]>([
    ['CC-BY-SA-4.0', 'CC-BY-SA-4.0', 201],
    ['CC-BY-SA-4.0', 'CC-BY-4.0', 403],
    ['CC-BY-NC-4.0', 'CC-BY-4.0', 403],
    ['CC-BY-4.0', 'CC0-1.0', 403],
    ['CC0-1.0', 'CERN-OHL-S-2.0', 201],
    ['CERN-OHL-S-2.0', 'CERN-OHL-P-2.0', 403],
    ['CERN-OHL-P-2.0', 'CC-BY-4.0', 403],
  ])('%s as %s: %d', async (parent, chosen, status) => {
    const { slug } = await sharedDesign(wren, { licence: parent });
    if (status === 201) {
      expect((await remixed(tarn, slug, { licence: chosen })).licence).toBe(chosen);
      return;
    }
    const sentence = await refused(() => shareRemix(tarn, slug, { licence: chosen }), status);
    expect(sentence).toContain(`is under ${parent}`);
    expect(sentence).toContain(`not under ${chosen}`);
  });

  it.each<Licence>(['CC-BY-ND-4.0', 'CC-BY-NC-ND-4.0'])(
    '%s forbids every remix by others',
    async (licence) => {
      const { slug } = await sharedDesign(wren, { title: 'As it is', licence });
      const sentence = await refused(() => shareRemix(tarn, slug, { licence }), 403);
      expect(sentence).toContain('may be cut as it is, but not changed and shared');
      expect((await remixed(wren, slug, { licence: 'CC0-1.0' })).licence).toBe('CC0-1.0');
    },
  );

  it('of somebody further up binds through one’s own remix', async () => {
    const first = await sharedDesign(wren, { title: 'Far up', licence: 'CC-BY-NC-4.0' });
    const second = await remixed(tarn, first.slug, { licence: 'CC-BY-NC-SA-4.0' });
    const sentence = await refused(() => shareRemix(tarn, second.slug, { licence: 'CC-BY-4.0' }), 403);
    expect(sentence).toContain('“Far up” is under CC-BY-NC-4.0');
    await remixed(tarn, second.slug, { licence: 'CC-BY-NC-4.0' });
  });

  it('is that of the revision it was made from', async () => {
    const { slug } = await sharedDesign(wren, { licence: 'CC-BY-ND-4.0' });
    await shareRevision(wren, slug, { licence: 'CC-BY-4.0' }).expect(201);
    await refused(() => shareRemix(tarn, slug, { licence: 'CC-BY-4.0', parentRevision: 1 }), 403);
    await remixed(tarn, slug, { licence: 'CC-BY-4.0', parentRevision: 2 });
  });
});

describe('is refused', () => {
  it('of a design or revision that is not there', async () => {
    const { slug } = await sharedDesign(wren);
    await refused(() => shareRemix(tarn, 'no-such-thing'), 404);
    await refused(() => shareRemix(tarn, slug, { parentRevision: 2 }), 404);
    await refused(() => shareRemix(tarn, slug, { parentRevision: 0 }), 422);
  });

  it('of a withdrawn design, with the day', async () => {
    const { slug } = await sharedDesign(wren, { title: 'Taken back' });
    await wren.call('delete', `/api/designs/${slug}`).expect(204);
    expect(await refused(() => shareRemix(tarn, slug), 403)).toMatch(/“Taken back” was withdrawn on \d{4}/);
  });

  it.each<DecisionAction>(['withholdDesign', 'withholdRevision'])(
    'after %s, with the reason',
    async (action) => {
      const { id, slug } = await sharedDesign(wren);
      const flagId = await decide(id, action, 'The shoulder cracks.');
      expect(await refused(() => shareRemix(tarn, slug), 403)).toContain('The shoulder cracks.');
      // The owner is bound by it as well.
      await refused(() => shareRemix(wren, slug), 403);
      await decide(id, 'restore', 'Mended.', flagId);
      await remixed(tarn, slug);
    },
  );

  it('but a revision that was not withheld may still be remixed', async () => {
    const { id, slug } = await sharedDesign(wren);
    await shareRevision(wren, slug, {}, { svg: plateSvg(150) }).expect(201);
    await decide(id, 'withholdRevision', 'Too thin.');
    await refused(() => shareRemix(tarn, slug, { parentRevision: 2 }), 403);
    await remixed(tarn, slug, { parentRevision: 1 });
  });
});

it('the same request again makes nothing twice, even when sent at once', async () => {
  const { slug } = await sharedDesign(wren, { title: 'Twice' });
  const before = await storedThings(club);
  const told = () => club.deps.database.db.$count(notice);
  const toldBefore = await told();
  const send = () => shareRemix(tarn, slug, {}, { key: 'remix-again' });
  const answers = await Promise.all([send(), send(), send()]);
  expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
  expect((await send().expect(201)).body).toEqual(answers[0]?.body);
  expect(await storedThings(club)).toMatchObject({
    designs: before.designs + 1,
    revisions: before.revisions + 1,
  });
  expect(await told()).toBe(toldBefore + 1);
  await shareRemix(tarn, slug, { title: 'Other' }, { key: 'remix-again' }).expect(422);
});
