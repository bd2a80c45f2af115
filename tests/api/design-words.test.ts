import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Design } from '#shared/api/designs.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
let moss: Person;
let design: Design;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
  moss = await club.person('Moss', 'moderator');
});
beforeEach(async () => {
  design = await sharedDesign(wren, { title: 'Dowel gauge' });
});
afterAll(() => club.close());

const at = () => `/api/designs/${design.slug}`;
const edit = (body: object, by = wren) => by.call('patch', at()).send({ version: design.version, ...body });
const read = async () => (await tarn.call('get', at()).expect(200)).body as Design;

describe('the words of a design', () => {
  it('are changed by the owner; address, number and revision stay', async () => {
    const words = { title: 'Peg gauge', summary: 'For 6 and 8 mm.', kind: 'gauges', tags: ['peg'] };
    const { body } = await edit(words).expect(200);
    expect(body).toEqual({ ...design, ...words, version: design.version + 1 });
    expect(await read()).toEqual(body);
    const found = await tarn.call('get', '/api/designs?q=peg').expect(200);
    expect(found.body.items.map(({ slug }: Design) => slug)).toContain(design.slug);
  });

  it('that are left out stay as they are', async () => {
    const { body } = await edit({ tags: [] }).expect(200);
    expect(body).toEqual({ ...design, tags: [], version: design.version + 1 });
  });

  it('are changed by a moderator, and by no other member', async () => {
    const answer = await edit({ title: 'Mine now' }, tarn).expect(403);
    expect(answer.body.type).toBe('design.not-yours');
    expect(await read()).toEqual(design);
    const { body } = await edit({ title: 'In plain words' }, moss).expect(200);
    expect(body).toMatchObject({ title: 'In plain words', owner: design.owner });
  });

  it('changed at a stale version are a conflict that shows the design as it is', async () => {
    await edit({ title: 'First come' }).expect(200);
    const answer = await edit({ title: 'Too late' }, moss).expect(409);
    expect(answer.body).toMatchObject({ type: 'design.changed', current: { title: 'First come' } });
    expect(answer.body.current).toEqual(await read());
  });

  it('changed twice at once are changed once', async () => {
    const answers = await Promise.all([edit({ title: 'One' }), edit({ title: 'Two' }, moss)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect((await read()).version).toBe(design.version + 1);
  });

  it('are checked, and nothing but words can be sent', async () => {
    const body = { title: '', kind: 'weapons', licence: 'CC0-1.0', owner: tarn.id, version: 0 };
    const answer = await edit(body).expect(422);
    const paths = answer.body.errors.map(({ path }: { path: string }) => path).sort();
    expect(paths).toEqual(['kind', 'licence', 'owner', 'title', 'version']);
    expect(await read()).toEqual(design);
  });
});

describe('a withdrawn design', () => {
  const listed = async () => {
    const { body } = await tarn.call('get', '/api/designs?q=dowel').expect(200);
    return body.items.some(({ slug }: Design) => slug === design.slug) as boolean;
  };

  it.each([
    ['its owner', () => wren],
    ['a moderator', () => moss],
  ])('is withdrawn by %s, leaves the loft, and can still be read', async (_who, who) => {
    expect(await listed()).toBe(true);
    await who().call('delete', at()).expect(204);
    expect(await listed()).toBe(false);
    const now = await read();
    expect(now.withdrawnAt).toMatch(/Z$/);
    expect(now).toMatchObject({ title: design.title, revision: design.revision });
    await tarn.call('get', `${at()}/revisions/1/geometry`).expect(200);
  });

  it('is not withdrawn by another member', async () => {
    await tarn.call('delete', at()).expect(403);
    expect(await listed()).toBe(true);
    expect(await read()).toEqual(design);
  });

  it('keeps its first date when it is withdrawn again', async () => {
    await wren.call('delete', at()).expect(204);
    const first = await read();
    await moss.call('delete', at()).expect(204);
    expect(await read()).toEqual(first);
  });
});
