import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { CutRecord } from '#shared/api/cuts.ts';
import type { Design, DesignList, Standing } from '#shared/api/designs.ts';
import type { Flag } from '#shared/api/flags.ts';
import { cutOf, plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { decideOn } from './support/decide.ts';
import { decided } from './support/raise-flag.ts';
import { recorded } from './support/record-cut.ts';
import { sharedDesign } from './support/share-design.ts';

// What records add up to, by the words of product.md ("Standing: how it is computed").

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

/** Each test has a geometry of its own: evidence is shared by geometry. */
let widthMm = 200;
const newDesign = (title: string): Promise<Design> => {
  widthMm += 1;
  return sharedDesign(wren, { title }, plateSvg(widthMm));
};

type Told = Pick<Standing, 'material' | 'word' | 'votesFor' | 'votesAgainst'>;

/** The standing on the page, which the card in the loft and its facets must share. */
async function standing(slug: string): Promise<Told[]> {
  const page = (await wren.call('get', `/api/designs/${slug}`).expect(200)).body as Design;
  const loft = (await wren.call('get', '/api/designs').expect(200)).body as DesignList;
  const card = loft.items.find((item) => item.slug === slug);
  expect(card?.standing).toEqual(page.standing);
  return page.standing.map(({ material, word, votesFor, votesAgainst }) => ({
    material,
    word,
    votesFor,
    votesAgainst,
  }));
}

async function isFoundAs(word: string, slug: string): Promise<boolean> {
  const found = (await wren.call('get', `/api/designs?standing=${word}`).expect(200)).body as DesignList;
  const facet = found.facets.standing.find(({ value }) => value === word)?.count ?? 0;
  expect(facet).toBeGreaterThanOrEqual(found.items.length);
  return found.items.some((item) => item.slug === slug);
}

const mdf = (word: string, votesFor: number, votesAgainst: number) => [
  { material: 'mdf', word, votesFor, votesAgainst },
];

async function correct(person: Person, { id, machine, version }: CutRecord, change: object): Promise<void> {
  await person
    .call('patch', `/api/cuts/${id}`)
    .send({ ...cutOf(machine.id), version, ...change })
    .expect(200);
}

/** Decides the flag that the program raised for the hazards of a record. */
async function settle({ id }: CutRecord, reason: string): Promise<void> {
  const { items } = (await moss.call('get', '/api/flags?state=open').expect(200)).body as { items: Flag[] };
  const raised = items.find(({ recordId, raisedBy }) => recordId === id && raisedBy === undefined);
  if (raised === undefined) throw new Error('no open flag for the hazards');
  await decided(moss, raised, 'dismiss', reason);
}

describe('standing', () => {
  it('grows with members, not with records', async () => {
    const { slug } = await newDesign('Grows');
    expect(await isFoundAs('uncut', slug)).toBe(true);
    await recorded(club, wren, slug);
    await recorded(club, wren, slug);
    expect(await standing(slug)).toEqual(mdf('cut-once', 1, 0));
    expect(await isFoundAs('uncut', slug)).toBe(false);
    await recorded(club, tarn, slug, { outcome: 'usable' });
    expect(await standing(slug)).toEqual(mdf('proven', 2, 0));
    expect(await isFoundAs('proven', slug)).toBe(true);
  });

  it('leaves out a failure by the operator’s own slips alone, and counts one with another cause', async () => {
    const { slug } = await newDesign('Slips');
    await recorded(club, wren, slug);
    await recorded(club, tarn, slug, { outcome: 'failed', wentWrong: ['not-zeroed', 'clamp-forgotten'] });
    expect(await standing(slug)).toEqual(mdf('cut-once', 1, 0));
    await recorded(club, fern, slug, { outcome: 'failed', wentWrong: ['not-zeroed', 'tear-out'] });
    expect(await standing(slug)).toEqual(mdf('disputed', 1, 1));
  });

  it('is disputed by a hazard until a moderator decides on that record, whatever is cut later', async () => {
    const { slug } = await newDesign('Hazard');
    await recorded(club, wren, slug);
    const other = await recorded(club, tarn, slug);
    const hazard = await recorded(club, fern, slug, { outcome: 'usable', wentWrong: ['part-came-loose'] });
    expect(hazard.hazardsSettled).toBe(false);
    expect(await standing(slug)).toEqual(mdf('disputed', 3, 0));
    await recorded(club, fern, slug);
    expect(await standing(slug)).toEqual(mdf('disputed', 3, 0));
    await decideOn(moss, other, 'caution', 'Leave tabs on the small part.');
    expect(await standing(slug)).toEqual(mdf('disputed', 3, 0));
    await decideOn(moss, hazard, 'caution', 'Slow for this bit.');
    expect(await standing(slug)).toEqual(mdf('disputed', 3, 0));
    await settle(hazard, 'The tape was old.');
    expect(await standing(slug)).toEqual(mdf('proven', 3, 0));
    expect((await wren.call('get', `/api/cuts/${hazard.id}`)).body.hazardsSettled).toBe(true);
  });

  it('is disputed again when a settled record is corrected to report another hazard', async () => {
    const { slug } = await newDesign('Hazard anew');
    await recorded(club, wren, slug);
    const told = await recorded(club, tarn, slug, { wentWrong: ['bit-broke'] });
    await settle(told, 'A worn bit.');
    expect(await standing(slug)).toEqual(mdf('proven', 2, 0));
    await correct(tarn, told, { wentWrong: ['bit-broke', 'fire-or-smoke'] });
    expect(await standing(slug)).toEqual(mdf('disputed', 2, 0));
  });

  it('stays settled when a correction is about something else', async () => {
    const { slug } = await newDesign('Settled and corrected');
    await recorded(club, wren, slug);
    const told = await recorded(club, tarn, slug, { wentWrong: ['bit-broke'] });
    await settle(told, 'A worn bit.');
    await correct(tarn, told, { wentWrong: ['bit-broke'], notes: 'The second bit held.' });
    expect(await standing(slug)).toEqual(mdf('proven', 2, 0));
    expect((await wren.call('get', `/api/cuts/${told.id}`)).body.hazardsSettled).toBe(true);
  });

  it('is disputed until a moderator decides, even when a correction takes the hazard out', async () => {
    const { slug } = await newDesign('Hazard taken out');
    await recorded(club, wren, slug);
    const told = await recorded(club, tarn, slug, { wentWrong: ['fire-or-smoke'] });
    await correct(tarn, told, { wentWrong: [] });
    expect(await standing(slug)).toEqual(mdf('disputed', 2, 0));
    await settle(told, 'It was steam.');
    expect(await standing(slug)).toEqual(mdf('proven', 2, 0));
  });

  it('counts a part that broke in use against, however clean the cut', async () => {
    const { slug } = await newDesign('Broke');
    const made = await recorded(club, wren, slug);
    await recorded(club, tarn, slug);
    await wren.call('post', `/api/cuts/${made.id}/in-service`).send({ result: 'broke' }).expect(201);
    expect(await standing(slug)).toEqual(mdf('disputed', 1, 1));
    expect(await isFoundAs('disputed', slug)).toBe(true);
    await wren.call('post', `/api/cuts/${made.id}/in-service`).send({ result: 'holds' }).expect(201);
    expect(await standing(slug)).toEqual(mdf('proven', 2, 0));
  });

  it('follows a correction', async () => {
    const { slug } = await newDesign('Corrected');
    await recorded(club, wren, slug);
    const made = await recorded(club, tarn, slug, { outcome: 'failed', wentWrong: ['tear-out'] });
    expect(await standing(slug)).toEqual(mdf('disputed', 1, 1));
    await correct(tarn, made, { outcome: 'clean' });
    expect(await standing(slug)).toEqual(mdf('proven', 2, 0));
    expect(await isFoundAs('proven', slug)).toBe(true);
    expect(await isFoundAs('disputed', slug)).toBe(false);
  });

  it('is of each material by itself; hazardous stock is in none', async () => {
    const { slug } = await newDesign('Materials');
    await recorded(club, wren, slug);
    await recorded(club, tarn, slug);
    await recorded(club, tarn, slug, { materialId: 'acrylic', outcome: 'failed', wentWrong: ['melted'] });
    await recorded(club, fern, slug, { materialId: 'pvc' });
    expect(await standing(slug)).toEqual([
      ...mdf('proven', 2, 0),
      { material: 'acrylic', word: 'disputed', votesFor: 0, votesAgainst: 1 },
    ]);
  });

  it('is shared by designs with one geometry, in the loft too', async () => {
    const first = await newDesign('First of a shape');
    const second = await sharedDesign(tarn, { title: 'Second of a shape' }, plateSvg(widthMm));
    await recorded(club, wren, first.slug);
    await recorded(club, fern, first.slug);
    expect(await standing(second.slug)).toEqual(mdf('proven', 2, 0));
    expect(await isFoundAs('proven', second.slug)).toBe(true);
  });
});
