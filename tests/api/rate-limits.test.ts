import { desc } from 'drizzle-orm';
import supertest from 'supertest';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { createApp } from '#server/app.ts';
import { session } from '#server/db/schema/index.ts';
import { origin, password, type TestClub, testClub } from '../support/test-club.ts';

// The limits of architecture.md: sign-in 30 a minute per address and 10 in 15 minutes per account, inspect 120 a minute.

let club: TestClub;
let app: TestClub['app'];
beforeAll(async () => {
  club = await testClub();
  await club.person('Wren');
});
// An application counts for itself, so each test starts from nought.
beforeEach(() => {
  app = createApp(club.deps);
});
afterAll(() => club.close());

const signIn = (email: string, given: string, forwardedFor = '198.51.100.1') =>
  supertest(app)
    .post('/api/auth/sign-in/email')
    .set('Origin', origin)
    .set('X-Forwarded-For', forwardedFor)
    .send({ email, password: given });

/** Not an address, so that it is refused before a password is hashed. */
const nobody = (place: number) => `nobody-${place}`;

const expectTooOften = (answer: supertest.Response, mostS: number) => {
  expect(answer.status).toBe(429);
  expect(answer.headers['content-type']).toContain('application/problem+json');
  expect(answer.body).toMatchObject({ status: 429, type: 'rate.limited' });
  const waitS = Number(answer.headers['retry-after']);
  expect(waitS).toBeGreaterThan(0);
  expect(waitS).toBeLessThanOrEqual(mostS);
  expect(answer.body.detail).toContain(`${waitS} seconds`);
};

describe('sign-in', () => {
  it('is refused the 31st time in a minute from one address, even with the right password', async () => {
    for (let place = 1; place <= 30; place += 1)
      expect((await signIn(nobody(place), 'wrong')).status, `number ${place}`).toBe(401);
    const answer = await signIn('wren@club.example', password);
    expectTooOften(answer, 60);
    expect(answer.headers['set-cookie']).toBeUndefined();
  });

  it('does not believe X-Forwarded-For without a proxy: another address in it helps nobody', async () => {
    for (let place = 1; place <= 30; place += 1) {
      const answer = await signIn(nobody(place), 'wrong', `203.0.113.${place}`);
      expect(answer.status, `number ${place}`).toBe(401);
    }
    expectTooOften(await signIn(nobody(31), 'wrong', '203.0.113.31'), 60);
  });

  it('counts by the address that a trusted proxy names', async () => {
    app = createApp({ ...club.deps, trustProxyHops: 1 });
    for (let place = 1; place <= 31; place += 1) {
      const answer = await signIn(nobody(place), 'wrong', `203.0.113.${place}`);
      expect(answer.status, `number ${place}`).toBe(401);
    }
  });

  it('is refused the 11th time for one account from ever other addresses, and other accounts go on', async () => {
    app = createApp({ ...club.deps, trustProxyHops: 1 });
    for (let place = 1; place <= 10; place += 1) {
      const email = place % 2 === 0 ? 'wren@club.example' : ' Wren@Club.example ';
      expect((await signIn(email, 'wrong', `203.0.113.${place}`)).status, `number ${place}`).toBe(401);
    }
    expectTooOften(await signIn('wren@club.example', password, '203.0.113.11'), 900);
    expect((await signIn('tarn@club.example', 'wrong', '203.0.113.11')).status).toBe(401);
  });
});

describe('the address kept with a session', () => {
  it('is not the one that the client names, unless a trusted proxy says so', async () => {
    const kept = async () =>
      (await club.deps.database.db.select().from(session).orderBy(desc(session.createdAt)).limit(1))[0]
        ?.ipAddress;
    expect((await signIn('wren@club.example', password, '203.0.113.99')).status).toBe(200);
    expect(await kept()).not.toBe('203.0.113.99');
    app = createApp({ ...club.deps, trustProxyHops: 1 });
    expect((await signIn('wren@club.example', password, '203.0.113.98')).status).toBe(200);
    expect(await kept()).toBe('203.0.113.98');
  });
});

describe('reading drawings', () => {
  it('is refused the 121st time in a minute', async () => {
    for (let place = 1; place <= 120; place += 1) {
      const answer = await supertest(app).post('/api/drawings/inspect').set('Origin', origin);
      expect(answer.status, `number ${place}`).toBe(401);
    }
    expectTooOften(await supertest(app).post('/api/drawings/inspect').set('Origin', origin), 60);
  });
});

describe('looking up invitations', () => {
  it('is refused the 31st time in a minute, so that codes cannot be guessed', async () => {
    for (let place = 1; place <= 30; place += 1)
      expect((await supertest(app).get(`/api/invitations/guess-${place}`)).status).toBe(404);
    expectTooOften(await supertest(app).get('/api/invitations/guess-31'), 60);
  });
});
