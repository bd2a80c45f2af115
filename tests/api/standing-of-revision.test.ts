import { afterAll, beforeAll, expect, it } from 'vitest';
import type { Design, DesignList } from '#shared/api/designs.ts';
import { cutOf, detailsOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { share, sharedDesign } from './support/share-design.ts';

// product.md, Standing: a design's standing is its newest available revision's.

let club: TestClub;
let wren: Person;
let moss: Person;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  moss = await club.person('Moss', 'moderator');
});
afterAll(() => club.close());

it('stands by the newest revision that is not withheld, on the sheet and in the loft', async () => {
  const machine = await club.machine(wren);
  const first = await sharedDesign(wren, { cut: cutOf(machine.id) });
  await wren
    .call('post', `/api/designs/${first.slug}/revisions`)
    .field('details', JSON.stringify({ changeNote: 'ten longer' }))
    .attach('file', Buffer.from(plateSvg(130)), { filename: 'plate.svg', contentType: 'image/svg+xml' })
    .expect(201);
  const page = async () => (await wren.call('get', `/api/designs/${first.slug}`).expect(200)).body as Design;
  const card = async () =>
    ((await wren.call('get', '/api/designs').expect(200)).body as DesignList).items.find(
      ({ slug }) => slug === first.slug,
    );
  expect((await page()).revision.number).toBe(2);
  expect((await page()).standing).toEqual([]);

  const flag = { designSlug: first.slug, revision: 2, reason: 'Too thin at the far end.' };
  const decision = { action: 'withholdRevision', reason: 'Too thin at the far end.' };
  await moss
    .call('post', '/api/flags')
    .send({ ...flag, decision })
    .expect(201);

  expect((await page()).revision.number).toBe(1);
  expect((await page()).withheld).toBeUndefined();
  expect((await page()).standing).toMatchObject([{ material: 'mdf', word: 'cut-once' }]);
  expect((await page()).revisions.map(({ number, withheld }) => [number, withheld?.reason])).toEqual([
    [2, 'Too thin at the far end.'],
    [1, undefined],
  ]);
  expect(await card()).toMatchObject({ revision: { number: 1 }, standing: [{ word: 'cut-once' }] });
  await wren.call('get', `/api/designs/${first.slug}/revisions/1/drawing.svg`).expect(200);
  await wren.call('get', `/api/designs/${first.slug}/revisions/2/drawing.svg`).expect(403);
});

it('does not let a withheld drawing come back as a revision or under another name', async () => {
  const svg = plateSvg(141, 77);
  const tarn = await club.person('Tarn');
  const design = await sharedDesign(wren, {}, svg);
  const decision = { action: 'withholdRevision', reason: 'The neck breaks.' };
  await moss
    .call('post', '/api/flags')
    .send({ designSlug: design.slug, reason: 'The neck breaks.', decision })
    .expect(201);
  const again = await wren
    .call('post', `/api/designs/${design.slug}/revisions`)
    .field('details', JSON.stringify({ changeNote: 'no change at all' }))
    .attach('file', Buffer.from(svg), { filename: 'plate.svg', contentType: 'image/svg+xml' })
    .expect(403);
  expect(again.body).toMatchObject({ type: 'drawing.withheld' });
  expect(again.body.detail).toContain('The neck breaks.');
  await share(tarn, detailsOf({ title: 'Something else' }), { svg }).expect(403);
});
