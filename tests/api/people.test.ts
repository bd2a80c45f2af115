import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { systemClock } from '#server/clock.ts';
import { rowsOf } from '#server/db/rows.ts';
import { firstAdministratorLink } from '#server/features/people/first-administrator.ts';
import type { InvitationMade, Member } from '#shared/api/people.ts';
import { type Person, password, signIn, type TestClub, testClub } from '../support/test-club.ts';

const codeOf = (link: string | null | undefined) => link?.split('/').pop() ?? 'no-link';
const joining = (email: string, more: object = {}) => ({ name: 'Fern', email, password, ...more });

describe('the first administrator', () => {
  let club: TestClub;
  beforeAll(async () => {
    club = await testClub();
  });
  afterAll(() => club.close());

  it('comes by a link that a later start replaces, that works once, and that ends with the first member', async () => {
    const { stranger, deps } = club;
    const earlier = codeOf(await firstAdministratorLink(deps));
    const code = codeOf(await firstAdministratorLink(deps));
    expect(code).not.toBe(earlier);
    await stranger.call('get', `/api/invitations/${earlier}`).expect(404);
    const accept = (email: string) =>
      stranger.call('post', `/api/invitations/${code}/acceptance`).send(joining(email));
    await accept('first@club.example').expect(201);
    await accept('second@club.example').expect(404);
    expect(await firstAdministratorLink(deps)).toBeNull();
    const cookie = await signIn(club.app, 'first@club.example');
    const me = await stranger.call('get', '/api/me').set('Cookie', cookie).expect(200);
    expect(me.body).toMatchObject({ email: 'first@club.example', role: 'administrator' });
  });
});

describe('people', () => {
  let club: TestClub;
  let ada: Person;
  beforeAll(async () => {
    club = await testClub();
    ada = await club.person('Ada', 'administrator');
  });

  it('keep no invitation link anywhere: a copy of the database opens no door', async () => {
    const make = () =>
      ada
        .call('post', '/api/invitations')
        .set('Idempotency-Key', 'one-invitation')
        .send({ role: 'member', validDays: 3 })
        .expect(201);
    const made = (await make()).body as InvitationMade;
    expect((await make()).body).toEqual(made);
    const code = codeOf(made.link);
    const tables = await club.deps.database.db.execute<{ text: string }>(
      sql`select (select json_agg(i)::text from invitation i) || (select json_agg(k)::text from idempotency_key k) as text`,
    );
    const text = rowsOf<{ text: string }>(tables)[0]?.text ?? '';
    expect(text).toContain(made.id);
    expect(text).not.toContain(code);
  });

  it('lose their open links with their power to invite', async () => {
    const heron = await club.person('Heron', 'administrator');
    const made = (await heron.call('post', '/api/invitations').send({ role: 'administrator' }).expect(201))
      .body as InvitationMade;
    const look = () => club.stranger.call('get', `/api/invitations/${codeOf(made.link)}`);
    await look().expect(200);
    const { items } = (await ada.call('get', '/api/members').expect(200)).body as { items: Member[] };
    const { version } = items.find(({ id }) => id === heron.id) ?? { version: 0 };
    await ada.call('patch', `/api/members/${heron.id}`).send({ suspended: true, version }).expect(200);
    await look().expect(404);
  });

  beforeEach(() => {
    club.deps.clock = systemClock;
  });
  afterAll(() => club.close());

  const invite = async (body: object = { role: 'member' }) =>
    (await ada.call('post', '/api/invitations').send(body).expect(201)).body as InvitationMade;
  const accept = (code: string, email: string, more: object = {}) =>
    club.stranger.call('post', `/api/invitations/${code}/acceptance`).send(joining(email, more));
  const members = async () => (await ada.call('get', '/api/members').expect(200)).body.items as Member[];
  const change = (id: string, body: object, by = ada) => by.call('patch', `/api/members/${id}`).send(body);

  describe('an invitation', () => {
    it('gives the role it was made for, and is shown as used', async () => {
      const made = await invite({ role: 'moderator', note: 'for the review desk' });
      const code = codeOf(made.link);
      const offer = await club.stranger.call('get', `/api/invitations/${code}`).expect(200);
      expect(offer.body).toMatchObject({ role: 'moderator', expiresAt: made.expiresAt });
      await accept(code, 'fern@club.example').expect(201);
      expect((await members()).find(({ email }) => email === 'fern@club.example')?.role).toBe('moderator');
      const list = await ada.call('get', '/api/invitations').expect(200);
      const shown = list.body.items.find(({ id }: { id: string }) => id === made.id);
      expect(shown.usedAt).toBeDefined();
      expect(JSON.stringify(list.body)).not.toContain(code);
    });

    it('makes one member when it is accepted twice at once', async () => {
      const code = codeOf((await invite()).link);
      const before = (await members()).length;
      const answers = await Promise.all([accept(code, 'one@club.example'), accept(code, 'two@club.example')]);
      const statuses = answers.map(({ status }) => status).sort();
      expect(statuses[0]).toBe(201);
      expect([404, 409]).toContain(statuses[1]);
      expect(await members()).toHaveLength(before + 1);
    });

    it('runs out after its days', async () => {
      const made = await invite({ role: 'member', validDays: 2 });
      const lasts = Date.parse(made.expiresAt) - Date.parse(made.createdAt);
      expect(lasts).toBe(2 * 24 * 3600 * 1000);
      const at = (time: number) => ({ now: () => new Date(time) });
      club.deps.clock = at(Date.parse(made.expiresAt) - 1000);
      await club.stranger.call('get', `/api/invitations/${codeOf(made.link)}`).expect(200);
      club.deps.clock = at(Date.parse(made.expiresAt) + 1000);
      await club.stranger.call('get', `/api/invitations/${codeOf(made.link)}`).expect(404);
      const late = await accept(codeOf(made.link), 'late@club.example').expect(404);
      expect(late.body.detail).toContain('run out');
    });

    it('stays good when the e-mail is a member’s already, whatever its capitals', async () => {
      const code = codeOf((await invite()).link);
      const answer = await accept(code, 'ADA@club.example').expect(409);
      expect(answer.body).toMatchObject({ type: 'member.exists' });
      await accept(code, 'Sorrel@club.example').expect(201);
      await signIn(club.app, 'sorrel@club.example');
    });

    it('names every wrong field at once, and takes no role from the one who joins', async () => {
      const code = codeOf((await invite()).link);
      const answer = await accept(code, 'nowhere', { name: ' ', password: 'short' }).expect(422);
      const paths = answer.body.errors.map(({ path }: { path: string }) => path).sort();
      expect(paths).toEqual(['email', 'name', 'password']);
      const chosen = await accept(code, 'rue@club.example', { role: 'administrator' }).expect(422);
      expect(chosen.body.errors).toMatchObject([{ path: 'role' }]);
      expect((await members()).some(({ email }) => email === 'rue@club.example')).toBe(false);
    });

    it('is the only way in: sign-up is closed', async () => {
      const before = (await members()).length;
      const body = { name: 'Rue', email: 'rue@club.example', password, role: 'administrator' };
      await club.stranger.call('post', '/api/auth/sign-up/email').send(body).expect(404);
      expect(await members()).toHaveLength(before);
    });
  });

  describe('signing in', () => {
    const signingIn = (body: object) => club.stranger.call('post', '/api/auth/sign-in/email').send(body);

    it('sets the cookie and keeps the token out of what a script can read', async () => {
      const answer = await signingIn({ email: ada.email, password }).expect(200);
      const cookie = String(answer.headers['set-cookie']);
      expect(cookie).toMatch(/HttpOnly/i);
      expect(cookie).toMatch(/SameSite=Lax/i);
      expect(cookie).not.toMatch(/Secure/i);
      const token = decodeURIComponent(cookie.split(';')[0]?.split('=')[1] ?? '').split('.')[0] ?? '';
      expect(token.length).toBeGreaterThan(20);
      expect(answer.text).not.toContain(token);
      const session = await club.stranger
        .call('get', '/api/auth/get-session')
        .set('Cookie', cookie.split(';')[0] ?? '');
      expect(session.body.user.email).toBe(ada.email);
      expect(session.text).not.toContain(token);
    });

    it.each([
      ['a wrong password', { email: 'ada@club.example', password: 'not this one, sorry' }, 401],
      ['an unknown e-mail', { email: 'nobody@club.example', password }, 401],
      ['no password', { email: 'ada@club.example' }, 400],
      ['a password that is no text', { email: 'ada@club.example', password: { $ne: '' } }, 400],
    ])('with %s is a problem and no cookie', async (_what, body, status) => {
      const answer = await signingIn(body);
      expect(answer.status).toBe(status);
      expect(answer.headers['content-type']).toContain('application/problem+json');
      expect(answer.headers['set-cookie']).toBeUndefined();
    });

    it('tells a wrong password and an unknown e-mail in the same words', async () => {
      const wrong = await signingIn({ email: ada.email, password: 'not this one, sorry' });
      const unknown = await signingIn({ email: 'nobody@club.example', password });
      expect(wrong.body.detail).toBe(unknown.body.detail);
    });

    it('ends with signing out', async () => {
      const tarn = await club.person('Tarn');
      await tarn.call('post', '/api/auth/sign-out').expect(200);
      await tarn.call('get', '/api/me').expect(401);
    });
  });

  describe('a suspension', () => {
    it('ends an open session at once, bars signing in with its sentence, and can be taken back', async () => {
      const reed = await club.person('Reed');
      await reed.call('get', '/api/me').expect(200);
      const suspended = await change(reed.id, { suspended: true, version: 1 }).expect(200);
      expect(suspended.body.suspendedAt).toBeDefined();
      await reed.call('get', '/api/me').expect(401);
      const answer = await club.stranger
        .call('post', '/api/auth/sign-in/email')
        .send({ email: reed.email, password })
        .expect(403);
      expect(answer.body).toMatchObject({
        type: 'member.suspended',
        detail: expect.stringContaining('suspended'),
      });
      expect(answer.headers['set-cookie']).toBeUndefined();
      const back = await change(reed.id, { suspended: false, version: 2 }).expect(200);
      expect(back.body.suspendedAt).toBeUndefined();
      await signIn(club.app, reed.email);
    });

    it('is not told to one who does not know the password', async () => {
      const sage = await club.person('Sage');
      await change(sage.id, { suspended: true, version: 1 }).expect(200);
      const answer = await club.stranger
        .call('post', '/api/auth/sign-in/email')
        .send({ email: sage.email, password: 'not this one, sorry' });
      expect(answer.status).toBe(401);
      expect(answer.text).not.toContain('suspended');
    });
  });

  describe('a role', () => {
    it('counts from the next request on', async () => {
      const moss = await club.person('Moss');
      await moss.call('get', '/api/members').expect(403);
      await change(moss.id, { role: 'administrator', version: 1 }).expect(200);
      await moss.call('get', '/api/members').expect(200);
      await change(moss.id, { role: 'member', version: 2 }).expect(200);
      await moss.call('get', '/api/members').expect(403);
    });

    it('of the last administrator stays, and they are not suspended', async () => {
      const version = (await members()).find(({ id }) => id === ada.id)?.version ?? 0;
      for (const body of [{ role: 'member' }, { role: 'moderator' }, { suspended: true }]) {
        const answer = await change(ada.id, { ...body, version }).expect(409);
        expect(answer.body.type).toBe('member.last-administrator');
      }
      // A suspended administrator is none that could help.
      const bay = await club.person('Bay', 'administrator');
      await change(bay.id, { suspended: true, version: 1 }).expect(200);
      await change(ada.id, { role: 'member', version }).expect(409);
      await ada.call('get', '/api/members').expect(200);
    });

    it('changed at a stale version is a conflict that shows the member as they are', async () => {
      const clover = await club.person('Clover');
      await change(clover.id, { role: 'moderator', version: 1 }).expect(200);
      const answer = await change(clover.id, { role: 'administrator', version: 1 }).expect(409);
      expect(answer.body).toMatchObject({
        type: 'member.changed',
        current: { id: clover.id, role: 'moderator', version: 2 },
      });
      expect((await members()).find(({ id }) => id === clover.id)?.role).toBe('moderator');
    });

    it('of nobody is 404, and an unknown one is refused', async () => {
      await change('no-id', { role: 'member', version: 1 }).expect(404);
      await change('-'.repeat(36), { role: 'member', version: 1 }).expect(404);
      await change(ada.id.replace(/^..../, '0000'), { role: 'member', version: 1 }).expect(404);
      const answer = await change(ada.id, { role: 'captain', version: 1 }).expect(422);
      expect(answer.body.errors).toMatchObject([{ path: 'role' }]);
    });
  });
});
