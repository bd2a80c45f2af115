import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { bitOf, machineOf } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';

let club: TestClub;
let wren: Person;
let tarn: Person;
beforeAll(async () => {
  club = await testClub();
  wren = await club.person('Wren');
  tarn = await club.person('Tarn');
});
afterAll(() => club.close());

const stockOf = (change: object = {}) => ({
  name: 'Offcut',
  materialId: 'plywood',
  lengthMm: 400,
  widthMm: 200,
  thicknessMm: 11.8,
  ...change,
});

const shelves = [
  { path: '/api/machines', made: machineOf(), changed: machineOf({ bedXMm: 410.5 }) },
  { path: '/api/bits', made: bitOf({ maxRpm: 24_000 }), changed: bitOf() },
  { path: '/api/stock', made: stockOf(), changed: stockOf({ thicknessMm: 12.1 }) },
] as const;

const totalOf = async (path: string, person = wren) =>
  (await person.call('get', path).expect(200)).body.total as number;

describe.each(shelves)('$path', ({ path, made, changed }) => {
  const add = (body: object = made, key?: string) => {
    const request = wren.call('post', path);
    return (key === undefined ? request : request.set('Idempotency-Key', key)).send(body);
  };

  it('keeps what was added, changes it as a whole, and lets it go', async () => {
    const added = (await add().expect(201)).body;
    expect(added).toEqual({ ...made, id: added.id, version: 1, createdAt: added.createdAt });
    const list = (await wren.call('get', path).expect(200)).body;
    expect(list.items).toContainEqual(added);
    const answer = await wren.call('patch', `${path}/${added.id}`).send({ ...changed, version: 1 });
    // A field that the change leaves out is gone: exactly what was sent is kept.
    expect(answer.body).toEqual({ ...changed, id: added.id, version: 2, createdAt: added.createdAt });
    await wren.call('delete', `${path}/${added.id}`).expect(204);
    await wren.call('delete', `${path}/${added.id}`).expect(404);
    expect((await wren.call('get', path)).body.items).not.toContainEqual(answer.body);
  });

  it('is its owner’s alone', async () => {
    const { id } = (await add().expect(201)).body;
    const seen = (await tarn.call('get', path).expect(200)).body;
    expect(seen.items.map((item: { id: string }) => item.id)).not.toContain(id);
    await tarn
      .call('patch', `${path}/${id}`)
      .send({ ...changed, version: 1 })
      .expect(404);
    await tarn.call('delete', `${path}/${id}`).expect(404);
    expect((await wren.call('get', path)).body.items).toContainEqual(
      expect.objectContaining({ id, ...made }),
    );
  });

  it.each(['x', 'ffffffff-ffff-7fff-bfff-ffffffffffff', "'; drop table machine; --"])(
    'has nothing at the id %s',
    async (id) => {
      const at = `${path}/${encodeURIComponent(id)}`;
      await wren
        .call('patch', at)
        .send({ ...changed, version: 1 })
        .expect(404);
      await wren.call('delete', at).expect(404);
    },
  );

  it('refuses a stale change and shows the thing as it is now', async () => {
    const { id } = (await add().expect(201)).body;
    const send = (body: object) => wren.call('patch', `${path}/${id}`).send({ ...body, version: 1 });
    await send({ ...changed, name: 'First come' }).expect(200);
    const answer = await send({ ...changed, name: 'Too late' }).expect(409);
    expect(answer.body.current).toMatchObject({ id, name: 'First come', version: 2 });
    expect((await wren.call('get', path)).body.items).toContainEqual(answer.body.current);
  });

  it('repeats the answer to a repeated key, and refuses the key for another thing', async () => {
    const key = `repeat-${path.slice(5)}`;
    const first = await add(made, key).expect(201);
    const total = await totalOf(path);
    const again = await add(made, key).expect(201);
    expect(again.body).toEqual(first.body);
    const other = await add({ ...made, name: 'Another' }, key).expect(422);
    expect(other.body.type).toBe('idempotency.reused');
    expect(await totalOf(path)).toBe(total);
    await wren.call('post', path).set('Idempotency-Key', 'has spaces').send(made).expect(400);
  });

  it('makes one thing of the same key sent twice at once', async () => {
    const total = await totalOf(path);
    const key = `twice-${path.slice(5)}`;
    const answers = await Promise.all([add(made, key), add(made, key), add(made, key)]);
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
    expect(await totalOf(path)).toBe(total + 1);
  });

  it('keeps one member’s keys apart from another’s', async () => {
    const key = `mine-${path.slice(5)}`;
    const first = await add(made, key).expect(201);
    const others = await tarn.call('post', path).set('Idempotency-Key', key).send(made).expect(201);
    expect(others.body.id).not.toBe(first.body.id);
  });

  it('refuses a field it does not know, and an owner chosen by the sender', async () => {
    const answer = await add({ ...made, colour: 'blue', ownerId: tarn.id }).expect(422);
    expect(answer.body.errors.map(({ path }: { path: string }) => path).sort()).toEqual([
      'colour',
      'ownerId',
    ]);
  });
});

describe('wrong fields', () => {
  it.each([
    [
      '/api/machines',
      machineOf({ name: '', maxFeedMmPerMin: -1, zTravelMm: 0, colletsMm: [] }),
      ['colletsMm', 'maxFeedMmPerMin', 'name', 'zTravelMm'],
    ],
    [
      '/api/machines',
      machineOf({ spindle: { kind: 'range', minRpm: 24_000, maxRpm: 10_000 } }),
      ['spindle.minRpm'],
    ],
    ['/api/machines', machineOf({ spindle: { kind: 'dial', positionsRpm: [] } }), ['spindle.positionsRpm']],
    [
      '/api/machines',
      machineOf({ marginMm: { left: 150, right: 150, front: 90, back: 89 }, clampStripMm: 1 }),
      ['marginMm.front', 'marginMm.left'],
    ],
    [
      '/api/machines',
      { ...machineOf(), marginMm: { left: 4 } },
      ['marginMm.back', 'marginMm.front', 'marginMm.right'],
    ],
    ['/api/bits', bitOf({ kind: 'v-bit' }), ['angleDeg']],
    [
      '/api/bits',
      { ...bitOf({ diameterMm: 0, flutes: 1.5, maxRpm: -5 }), kind: 'laser' },
      ['diameterMm', 'flutes', 'kind', 'maxRpm'],
    ],
    ['/api/bits', { ...bitOf(), diameterMm: '3.175' }, ['diameterMm']],
    ['/api/stock', stockOf({ thicknessMm: 0, materialId: 'granite' }), ['materialId', 'thicknessMm']],
  ])('of %s are named all at once: %o', async (path, body, paths) => {
    const total = await totalOf(path);
    const answer = await wren.call('post', path).send(body).expect(422);
    const named = answer.body.errors as { path: string; message: string }[];
    expect([...new Set(named.map((error) => error.path))].sort()).toEqual(paths);
    for (const error of named) {
      expect(error.message).toMatch(/\w/);
      expect(answer.body.detail).toContain(error.path);
    }
    expect(await totalOf(path)).toBe(total);
  });

  it('are refused in a change as well', async () => {
    const machine = await club.machine(wren);
    const answer = await wren
      .call('patch', `/api/machines/${machine.id}`)
      .send({ ...machineOf({ maxFeedMmPerMin: -1 }) })
      .expect(422);
    const paths = answer.body.errors.map(({ path }: { path: string }) => path).sort();
    expect(paths).toEqual(['maxFeedMmPerMin', 'version']);
  });
});

describe('a body', () => {
  it.each([
    ['broken JSON', 'application/json', '{"name":', 400],
    ['no JSON', 'text/plain', 'name', 415],
    ['300 kB of JSON', 'application/json', JSON.stringify({ name: 'x'.repeat(300_000) }), 413],
    ['a list', 'application/json', '[]', 422],
  ])('of %s is a problem', async (_what, type, body, status) => {
    const answer = await wren.call('post', '/api/machines').set('Content-Type', type).send(body);
    expect(answer.status).toBe(status);
    expect(answer.body.status).toBe(status);
  });
});
