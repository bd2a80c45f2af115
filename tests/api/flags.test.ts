import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { auditEntry, decision, flag, notice, outbox, revision } from '#server/db/schema/index.ts';
import type { Flag } from '#shared/api/flags.ts';
import { type cutOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { flagged } from './support/raise-flag.ts';
import { recorded } from './support/record-cut.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let moss: Person;
let ada: Person;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  moss = await club.person('Moss', 'moderator');
  ada = await club.person('Ada', 'administrator');
});
afterAll(() => club.close());

let widthMm = 300;
const newDesign = (title: string, cut?: ReturnType<typeof cutOf>) => {
  widthMm += 1;
  return sharedDesign(wren, { title, ...(cut === undefined ? {} : { cut }) }, plateSvg(widthMm));
};
const rows = async () => {
  const { db } = club.deps.database;
  return {
    flags: await db.$count(flag),
    decisions: await db.$count(decision),
    notices: await db.$count(notice),
    mails: await db.$count(outbox),
    entries: await db.$count(auditEntry),
  };
};

describe('a flag', () => {
  it('is about the newest revision, as a caution, and says who raised it why', async () => {
    const design = await newDesign('Peg');
    const raised = await flagged(tarn, design.slug, { reason: 'The peg is too thin.' });
    expect(raised).toMatchObject({
      version: 1,
      state: 'open',
      design: { slug: design.slug, title: 'Peg', ownerId: wren.id },
      revision: 1,
      level: 'caution',
      reason: 'The peg is too thin.',
      raisedBy: { id: tarn.id, name: 'Tarn' },
      takeCount: 0,
    });
    expect(raised.recordId).toBeUndefined();
    expect(raised.decision).toBeUndefined();
  });

  it('on a record is about its revision, and as grave as a hazard that it reports', async () => {
    const design = await newDesign('Latch');
    const harmless = await recorded(club, tarn, design.slug, { wentWrong: ['tear-out'] });
    const hazardous = await recorded(club, tarn, design.slug, {
      outcome: 'failed',
      wentWrong: ['bit-broke'],
    });
    expect(await flagged(wren, design.slug, { recordId: harmless.id })).toMatchObject({
      recordId: harmless.id,
      level: 'caution',
    });
    expect(await flagged(wren, design.slug, { recordId: hazardous.id, revision: 1 })).toMatchObject({
      recordId: hazardous.id,
      revision: 1,
      level: 'do-not-cut',
    });
  });

  it('may be raised on one’s own design', async () => {
    const design = await newDesign('My own');
    await flagged(wren, design.slug);
  });

  it('is one a member and target while it is open, also when it is sent twice at once', async () => {
    const design = await newDesign('Twice');
    const record = await recorded(club, wren, design.slug);
    const raise = () =>
      tarn.call('post', '/api/flags').send({ designSlug: design.slug, reason: 'Sent twice.' });
    const answers = await Promise.all([raise(), raise()]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    const refused = answers.find(({ status }) => status === 409);
    expect(refused?.body).toMatchObject({
      type: 'flag.already-open',
      current: { reason: 'Sent twice.', state: 'open' },
    });
    await flagged(tarn, design.slug, { recordId: record.id });
    await flagged(moss, design.slug);
  });

  it('is raised once by a request that is repeated with its key', async () => {
    const design = await newDesign('Once');
    const raise = () =>
      tarn
        .call('post', '/api/flags')
        .set('Idempotency-Key', 'flag-once')
        .send({ designSlug: design.slug, reason: 'Sent again by the phone.' })
        .expect(201);
    const first = await raise();
    expect((await raise()).body).toEqual(first.body);
  });

  it.each([
    ['a design that is not there', { designSlug: 'no-such-design' }, 404, 'design.not-found'],
    ['an address that is none', { designSlug: 'Not A Slug' }, 404, 'design.not-found'],
    ['a revision that is not there', { revision: 2 }, 404, 'revision.not-found'],
    [
      'a record that is not there',
      { recordId: '01890000-0000-7000-8000-000000000000' },
      404,
      'record.not-found',
    ],
    ['a record id that is none', { recordId: 'the third one' }, 422, 'input.invalid'],
    ['no reason', { reason: '  ' }, 422, 'input.invalid'],
    ['a reason of a book', { reason: 'x'.repeat(1001) }, 422, 'input.invalid'],
    ['more than is known', { level: 'note' }, 422, 'input.invalid'],
    ['a decision without a reason', { decision: { action: 'dismiss', reason: '' } }, 422, 'input.invalid'],
    ['a decision that is none', { decision: { action: 'burn', reason: 'No.' } }, 422, 'input.invalid'],
  ])('with %s is refused, and nothing is half stored', async (_what, change, status, type) => {
    const design = await newDesign('Refused');
    const before = await rows();
    const body = { designSlug: design.slug, reason: 'The hole is off.', ...change };
    const answer = await moss.call('post', '/api/flags').send(body).expect(status);
    expect(answer.body).toMatchObject({ type, detail: expect.stringMatching(/\w.*\./) });
    expect(await rows()).toEqual(before);
  });

  it('names no record of another design, even one of the same geometry', async () => {
    const svg = plateSvg(777);
    const one = await sharedDesign(wren, { title: 'Plate' }, svg);
    const other = await sharedDesign(wren, { title: 'Plate again' }, svg);
    const record = await recorded(club, tarn, one.slug);
    const body = { designSlug: other.slug, recordId: record.id, reason: 'Not this one’s.' };
    const answer = await tarn.call('post', '/api/flags').send(body).expect(404);
    expect(answer.body.type).toBe('record.not-found');
  });

  it('comes from nobody who is suspended: their session is gone', async () => {
    const reed = await club.person('Reed');
    const design = await newDesign('Out of reach');
    await ada.call('patch', `/api/members/${reed.id}`).send({ suspended: true, version: 1 }).expect(200);
    const before = await rows();
    await reed
      .call('post', '/api/flags')
      .send({ designSlug: design.slug, reason: 'Still here?' })
      .expect(401);
    expect(await rows()).toEqual(before);
  });
});

describe('a flag that carries its decision', () => {
  const withDecision = (designSlug: string) => ({
    designSlug,
    reason: 'The core flies out.',
    decision: { action: 'withholdDesign', reason: 'It wants tabs.' },
  });

  it('is a moderator’s alone', async () => {
    const design = await newDesign('Not for members');
    const before = await rows();
    const answer = await tarn.call('post', '/api/flags').send(withDecision(design.slug)).expect(403);
    expect(answer.body.type).toBe('role.too-low');
    expect(await rows()).toEqual(before);
  });

  it('is raised and decided in one step', async () => {
    const design = await newDesign('In one step');
    const answer = await moss.call('post', '/api/flags').send(withDecision(design.slug)).expect(201);
    expect(answer.body).toMatchObject({
      state: 'decided',
      version: 2,
      raisedBy: { id: moss.id },
      decision: {
        action: 'withholdDesign',
        reason: 'It wants tabs.',
        decidedBy: { id: moss.id, name: 'Moss' },
      },
    });
    const page = await tarn.call('get', `/api/designs/${design.slug}`).expect(200);
    expect(page.body.withheld).toEqual({ reason: 'It wants tabs.' });
  });

  it('is not there when its decision is not possible', async () => {
    const { slug } = await newDesign('Both or neither');
    const before = await rows();
    const send = (action: string) =>
      moss.call('post', '/api/flags').send({ ...withDecision(slug), decision: { action, reason: 'No.' } });
    const settings = await send('withholdSettings').expect(422);
    expect(settings.body.errors).toMatchObject([{ path: 'decision.action' }]);
    const restored = await send('restore').expect(422);
    expect(restored.body.errors).toMatchObject([{ path: 'decision.action' }]);
    expect(await rows()).toEqual(before);
  });
});

describe('the review desk', () => {
  let desk: TestClub;
  let moderator: Person;
  const expectedOpen: string[] = [];
  beforeAll(async () => {
    desk = await testClub();
    moderator = await desk.person('Moss', 'moderator');
    const owner = await desk.person('Wren');
    const { slug, id: designId } = await sharedDesign(owner);
    const { db } = desk.deps.database;
    const [newest] = await db
      .select({ id: revision.id })
      .from(revision)
      .where(eq(revision.designId, designId));
    const [sample] = [await flagged(owner, slug)];
    await moderator
      .call('post', `/api/flags/${sample.id}/decision`)
      .send({ action: 'dismiss', reason: 'As drawn.', version: 1 })
      .expect(200);
    // 120 flags, put in by hand in an order that is not the desk's: level and age by turns.
    const levels = ['note', 'do-not-cut', 'caution'] as const;
    const made = Array.from({ length: 120 }, (_, place) => ({
      id: desk.deps.ids.next(),
      designId,
      revisionId: newest?.id ?? '',
      level: levels[place % 3] ?? 'note',
      reason: `number ${place}`,
      createdAt: new Date(Date.UTC(2026, 5, 1, 0, (place * 37) % 120)),
    }));
    await db.insert(flag).values(made);
    const gravity = ['do-not-cut', 'caution', 'note'];
    const sorted = [...made].sort(
      (a, b) =>
        gravity.indexOf(a.level) - gravity.indexOf(b.level) || a.createdAt.getTime() - b.createdAt.getTime(),
    );
    expectedOpen.push(...sorted.map(({ id }) => id));
    for (let count = 0; count < 3; count += 1) {
      const taker = await desk.person(`Taker${count}`);
      await taker.call('get', `/api/designs/${slug}/revisions/1/drawing.svg`).expect(200);
      await taker.call('get', `/api/designs/${slug}/revisions/1/package.zip`).expect(200);
    }
  });
  afterAll(() => desk.close());

  const page = async (query: string) =>
    (await moderator.call('get', `/api/flags?${query}`).expect(200)).body as {
      items: Flag[];
      total: number;
      nextCursor: string | null;
    };

  it('shows the gravest first, then the oldest, and the decided after the open, page by page', async () => {
    const seen: Flag[] = [];
    let cursor: string | null = '';
    while (cursor !== null) {
      const got = await page(cursor === '' ? '' : `cursor=${cursor}`);
      expect(got.total).toBe(121);
      seen.push(...got.items);
      cursor = got.nextCursor;
    }
    expect(seen.slice(0, 120).map(({ id }) => id)).toEqual(expectedOpen);
    expect(seen.slice(120)).toMatchObject([{ state: 'decided', decision: { action: 'dismiss' } }]);
  });

  it('counts each member who took the revision once', async () => {
    expect((await page('')).items[0]?.takeCount).toBe(3);
  });

  it('shows the open or the decided alone', async () => {
    expect(await page('state=open')).toMatchObject({ total: 120 });
    const { items, total, nextCursor } = await page('state=decided');
    expect({ count: items.length, total, nextCursor }).toEqual({ count: 1, total: 1, nextCursor: null });
  });

  it('says which cursor or state is none', async () => {
    for (const query of ['cursor=nonsense', 'cursor=', 'state=lost', 'page=2']) {
      await moderator.call('get', `/api/flags?${query}`).expect(400);
    }
  });
});
