import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createApp } from '#server/app.ts';
import { createAuth } from '#server/auth.ts';
import { uuidV7 } from '#server/clock.ts';
import { bitOf } from '../support/samples.ts';
import { origin, password, signIn, type TestClub, testClub } from '../support/test-club.ts';

let club: TestClub;
let cookie: string;
beforeAll(async () => {
  club = await testClub();
  const wren = await club.person('Wren');
  cookie = await signIn(club.app, wren.email);
});
afterAll(() => club.close());

const addBit = () => supertest(club.app).post('/api/bits').send(bitOf());
const listBits = async () =>
  (await supertest(club.app).get('/api/bits').set('Cookie', cookie).expect(200)).body.total as number;

describe('a change with a cookie', () => {
  it.each([
    ['no origin', undefined],
    ['a foreign origin', 'https://elsewhere.example'],
    ['an opaque origin', 'null'],
    ['the right host on another port', 'http://localhost:4871'],
    ['an origin that begins like ours', `${origin}.elsewhere.example`],
  ])('is refused with %s, and changes nothing', async (_what, from) => {
    const before = await listBits();
    const request = addBit().set('Cookie', cookie);
    const answer = await (from === undefined ? request : request.set('Origin', from));
    expect(answer.status).toBe(403);
    expect(answer.headers['content-type']).toContain('application/problem+json');
    expect(answer.body).toMatchObject({
      type: 'origin.untrusted',
      detail: expect.stringContaining('APP_URL'),
    });
    expect(await listBits()).toBe(before);
  });

  it('is taken from the page of the club', async () => {
    await addBit().set('Cookie', cookie).set('Origin', origin).expect(201);
  });

  it('is checked for every method that changes something', async () => {
    for (const method of ['post', 'patch', 'put', 'delete'] as const) {
      const answer = await supertest(club.app)[method]('/api/machines/x').set('Cookie', cookie);
      expect(answer.status, method).toBe(403);
    }
  });
});

describe('without a cookie', () => {
  it('a change is a stranger’s, whatever its origin', async () => {
    await addBit().expect(401);
    await addBit().set('Origin', 'https://elsewhere.example').expect(401);
  });

  it('a foreign page cannot sign anybody in', async () => {
    const answer = await supertest(club.app)
      .post('/api/auth/sign-in/email')
      .set('Origin', 'https://elsewhere.example')
      .send({ email: 'wren@club.example', password });
    expect(answer.status).toBe(403);
    expect(answer.headers['set-cookie']).toBeUndefined();
  });
});

describe('two names for the same server', () => {
  it('both are trusted when both are configured', async () => {
    const origins: [string, string] = [origin, 'http://127.0.0.1:4870'];
    const secret = 'a secret of the tests, thirty-two characters';
    const auth = createAuth({ db: club.deps.database.db, secret, origins, ids: uuidV7 });
    const app = createApp({ ...club.deps, auth, origins });
    for (const from of origins) {
      const signedIn = await supertest(app)
        .post('/api/auth/sign-in/email')
        .set('Origin', from)
        .send({ email: 'wren@club.example', password })
        .expect(200);
      const own = String(signedIn.headers['set-cookie']).split(';')[0] ?? '';
      await supertest(app).post('/api/bits').set('Origin', from).set('Cookie', own).send(bitOf()).expect(201);
    }
  });
});
