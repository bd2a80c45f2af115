import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { auditEntry } from '#server/db/schema/index.ts';
import type { Design } from '#shared/api/designs.ts';
import { readDrawing } from '#shared/drawing/read.ts';
import { cutOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { sharedDesign, shareRemix, shareRevision } from './support/share-design.ts';
import { storedThings } from './support/stored-things.ts';

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

const revised = async (person: Person, slug: string, change: object = {}, svg = plateSvg()) =>
  (await shareRevision(person, slug, change, { svg }).expect(201)).body as Design;

/** A refusal with its sentence; nothing may be stored by it. */
const refused = async (request: () => PromiseLike<{ status: number; body: unknown }>, status: number) => {
  const before = await storedThings(club);
  const answer = await request();
  expect(answer.status).toBe(status);
  expect(await storedThings(club)).toEqual(before);
  return (answer.body as { detail: string }).detail;
};

describe('a new revision', () => {
  it('is numbered next, with its note, drawing and the licence as before; the first one stays', async () => {
    const first = await sharedDesign(wren, { title: 'Wedge' }, plateSvg(100));
    const design = await revised(wren, first.slug, { changeNote: 'longer by 20' }, plateSvg(120));
    expect(design).toMatchObject({ id: first.id, slug: first.slug, drawingNumber: first.drawingNumber });
    expect(design.revision).toMatchObject({
      number: 2,
      changeNote: 'longer by 20',
      licence: 'CC-BY-SA-4.0',
      createdBy: { id: wren.id },
    });
    expect(design.revision.drawing.widthMm).toBeCloseTo(120, 6);
    const { drawing: _drawing, ...firstRevision } = first.revision;
    expect(design.revisions.map(({ number }) => number)).toEqual([2, 1]);
    expect(design.revisions[1]).toEqual(firstRevision);
    for (const [number, widthMm] of [
      [1, 100],
      [2, 120],
    ]) {
      const svg = await tarn.call('get', `/api/designs/${first.slug}/revisions/${number}/drawing.svg`);
      expect(svg.status).toBe(200);
      const read = readDrawing(String(svg.body));
      expect(read.ok && read.drawing.widthMm).toBeCloseTo(widthMm ?? 0, 6);
    }
    const found = await tarn.call('get', '/api/designs?q=wedge').expect(200);
    expect(found.body.items[0].revision.number).toBe(2);
  });

  it('is in the audit log', async () => {
    const { id, slug } = await sharedDesign(wren);
    await revised(wren, slug);
    const entries = await club.deps.database.db.select().from(auditEntry);
    expect(entries).toContainEqual(
      expect.objectContaining({
        action: 'revision.issued',
        actorId: wren.id,
        subject: `design:${id}`,
        detail: expect.objectContaining({ revision: 2 }),
      }),
    );
  });

  it('with the same geometry keeps its evidence, with another one starts uncut', async () => {
    const machine = await club.machine(wren);
    const svg = plateSvg(91);
    const { slug } = await sharedDesign(wren, { cut: cutOf(machine.id) }, svg);
    const kept = await revised(wren, slug, { changeNote: 'drawn again' }, svg);
    expect(kept.standing).toMatchObject([{ material: 'mdf', word: 'cut-once', votesFor: 1 }]);
    const changed = await revised(wren, slug, {}, plateSvg(92));
    expect(changed.standing).toEqual([]);
    expect(changed.cuts).toHaveLength(1);
    const uncut = await wren.call('get', '/api/designs?standing=uncut').expect(200);
    expect(uncut.body.items.map((item: Design) => item.slug)).toContain(slug);
  });

  it('brings its own cut, and others of that geometry learn of it in the search', async () => {
    const machine = await club.machine(wren);
    const svg = plateSvg(93);
    const other = await sharedDesign(tarn, { title: 'Same outline elsewhere' }, svg);
    const { slug } = await sharedDesign(wren, {}, plateSvg(94));
    const design = await revised(wren, slug, { cut: cutOf(machine.id) }, svg);
    expect(design.cuts[0]).toMatchObject({ revision: 2, member: { id: wren.id } });
    const found = await tarn.call('get', '/api/designs?standing=cut-once').expect(200);
    expect(found.body.items.map((item: Design) => item.slug)).toEqual(
      expect.arrayContaining([slug, other.slug]),
    );
  });

  it('may carry another licence: the owner licenses own work anew', async () => {
    const { slug } = await sharedDesign(wren);
    const design = await revised(wren, slug, { licence: 'CC0-1.0' });
    expect(design.revisions.map(({ licence }) => licence)).toEqual(['CC0-1.0', 'CC-BY-SA-4.0']);
  });

  it('of a remix keeps to what its original allows, and stays linked to it', async () => {
    const original = await sharedDesign(wren, { title: 'Original', licence: 'CC-BY-NC-4.0' });
    const remix = (await shareRemix(tarn, original.slug, { licence: 'CC-BY-NC-4.0' }).expect(201)).body;
    const sentence = await refused(() => shareRevision(tarn, remix.slug, { licence: 'CC-BY-4.0' }), 403);
    expect(sentence).toContain('“Original” is under CC-BY-NC-4.0');
    expect(sentence).toContain('CC-BY-NC-SA-4.0');
    const design = await revised(tarn, remix.slug, { licence: 'CC-BY-NC-SA-4.0' });
    expect(design.parent).toMatchObject({ slug: original.slug, revision: 1 });
  });
});

describe('is refused', () => {
  it('to another member and to a moderator', async () => {
    const { slug } = await sharedDesign(wren);
    for (const person of [tarn, moss]) {
      expect(await refused(() => shareRevision(person, slug), 403)).toMatch(/Only the member who shared/);
      // Whatever they sent: it is not theirs to revise.
      await refused(() => shareRevision(person, slug, { changeNote: '' }), 403);
    }
  });

  it('where there is no such design', async () => {
    await refused(() => shareRevision(wren, 'no-such-thing'), 404);
  });

  it('once the design is withdrawn', async () => {
    const { slug } = await sharedDesign(wren, { title: 'Gone' });
    await wren.call('delete', `/api/designs/${slug}`).expect(204);
    expect(await refused(() => shareRevision(wren, slug), 403)).toContain('“Gone” was withdrawn');
  });

  it('without a change note, with unknown fields, or with a drawing of no size', async () => {
    const { slug } = await sharedDesign(wren);
    expect(await refused(() => shareRevision(wren, slug, { changeNote: ' ' }), 422)).toContain('changeNote');
    expect(await refused(() => shareRevision(wren, slug, { title: 'New' }), 422)).toContain('title');
    const svg =
      '<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 9 9"><rect width="9" height="9"/></svg>';
    expect(await refused(() => shareRevision(wren, slug, {}, { svg }), 422)).toContain('how large');
  });
});

describe('at once or again', () => {
  it('revisions at once get different numbers', async () => {
    const { slug } = await sharedDesign(wren);
    const answers = await Promise.all(
      [111, 112, 113, 114].map((widthMm) => revised(wren, slug, {}, plateSvg(widthMm))),
    );
    expect(answers.map(({ revision }) => revision.number).sort()).toEqual([2, 3, 4, 5]);
  });

  it('the same request again makes nothing twice, even when sent at once', async () => {
    const { slug } = await sharedDesign(wren);
    const before = await storedThings(club);
    const send = () => shareRevision(wren, slug, {}, { key: `again-${slug}` });
    const answers = await Promise.all([send(), send(), send()]);
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
    expect((await send().expect(201)).body).toEqual(answers[0]?.body);
    const after = await storedThings(club);
    expect(after).toMatchObject({ designs: before.designs, revisions: before.revisions + 1 });
    await shareRevision(wren, slug, { changeNote: 'other' }, { key: `again-${slug}` }).expect(422);
  });
});
