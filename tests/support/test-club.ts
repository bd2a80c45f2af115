import { mkdtempSync, openAsBlob, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { hashPassword } from 'better-auth/crypto';
import type { Express } from 'express';
import { pino } from 'pino';
import supertest from 'supertest';
import { expect, inject } from 'vitest';
import { createAnalysis } from '#server/analysis/pool.ts';
import { createApp } from '#server/app.ts';
import { createAuth } from '#server/auth.ts';
import { systemClock, uuidV7 } from '#server/clock.ts';
import { type OpenDatabase, openPglite } from '#server/db/client.ts';
import type { Deps } from '#server/deps.ts';
import { createMember } from '#server/features/people/invitations.ts';
import type { MailMessage } from '#server/mail/message.ts';
import { openOutbox } from '#server/mail/send-outbox.ts';
import { inThreadSearch } from '#server/search/service.ts';
import { openObjectStore } from '#server/storage/open.ts';
import type { Machine } from '#shared/api/bench.ts';
import type { Role } from '#shared/api/vocabulary.ts';
import { timeQueries } from './query-times.ts';
import { machineOf } from './samples.ts';

export const origin = 'http://localhost:4870';
export const password = 'a good long password';

type Method = 'get' | 'post' | 'patch' | 'delete' | 'head';

/** Somebody at a browser: requests carry their cookie and the page's origin. */
export interface Person {
  id: string;
  email: string;
  call(method: Method, path: string): supertest.Test;
}

export interface TestClub {
  app: Express;
  deps: Deps;
  stranger: Person;
  /** Makes a member and signs them in through the API. */
  person(name: string, role?: Role): Promise<Person>;
  /** A machine on somebody's bench, through the API. */
  machine(person: Person, change?: Partial<Machine>): Promise<Machine>;
  /** Sends what waits in the outbox; the mails that went out. */
  deliverMail(): Promise<MailMessage[]>;
  close(): Promise<void>;
}

let passwordHash: Promise<string> | undefined;

/** A copy of the migrated database in memory, whose queries are timed. */
async function databaseInMemory() {
  const client = await PGlite.create({ loadDataDir: await openAsBlob(inject('migratedDatabase')) });
  const times = timeQueries(client);
  return { database: openPglite(client), slow: () => times.slow() };
}

/** A whole club with an object store, worker and application of its own, and a database unless one is given. */
export async function testClub(given?: OpenDatabase): Promise<TestClub> {
  const folder = mkdtempSync(join(tmpdir(), 'tallyloft-club-'));
  const { database, slow } =
    given === undefined ? await databaseInMemory() : { database: given, slow: () => [] };
  const store = await openObjectStore(undefined, folder);
  const analysis = createAnalysis();
  const search = inThreadSearch();
  const origins: [string, ...string[]] = [origin];
  const secret = 'a secret of the tests, thirty-two characters';
  const auth = createAuth({
    db: database.db,
    secret,
    origins,
    ids: uuidV7,
  });
  const deps: Deps = {
    database,
    store,
    search,
    analysis,
    auth,
    secret,
    clubTimeZone: 'UTC',
    clock: systemClock,
    ids: uuidV7,
    log: pino({ level: 'error' }, pino.destination(2)),
    // Tests say when mail goes out: nothing is sent behind their back.
    mail: { nudge: () => undefined },
    trustProxyHops: 0,
    origins,
  };
  const app = createApp(deps);
  const club: TestClub = {
    app,
    deps,
    stranger: caller(app, { id: '', email: '' }, undefined),
    async person(name, role = 'member') {
      passwordHash ??= hashPassword(password);
      const hash = await passwordHash;
      const email = `${name.toLowerCase()}@club.example`;
      const id = await database.db.transaction((tx) =>
        createMember(deps, tx, { name, email, role, passwordHash: hash }),
      );
      return caller(app, { id, email }, await signIn(app, email));
    },
    async machine(person, change = {}) {
      const answer = await person
        .call('post', '/api/machines')
        .send({ ...machineOf(), ...change })
        .expect(201);
      return answer.body as Machine;
    },
    async deliverMail() {
      const sent: MailMessage[] = [];
      const collecting = { send: async (message: MailMessage) => void sent.push(message), close: () => {} };
      await openOutbox(deps, collecting).sendDue();
      return sent;
    },
    async close() {
      await analysis.close();
      await search.close();
      await store.close();
      await database.close();
      rmSync(folder, { recursive: true, force: true });
      expect(slow(), 'queries over 50 ms').toEqual([]);
    },
  };
  return club;
}

export async function signIn(app: Express, email: string, given = password): Promise<string> {
  const answer = await supertest(app)
    .post('/api/auth/sign-in/email')
    .set('Origin', origin)
    .send({ email, password: given })
    .expect(200);
  return String(answer.headers['set-cookie']).split(';')[0] ?? '';
}

function caller(app: Express, who: { id: string; email: string }, cookie: string | undefined): Person {
  return {
    ...who,
    call(method, path) {
      const request = supertest(app)[method](path).set('Origin', origin);
      return cookie === undefined ? request : request.set('Cookie', cookie);
    },
  };
}
