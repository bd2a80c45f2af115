import { sql } from 'drizzle-orm';
import { PgTable } from 'drizzle-orm/pg-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type OpenDatabase, openDatabase } from '#server/db/client.ts';
import { ensureClub } from '#server/db/ensure-club.ts';
import { DatabaseTooNew, migrate } from '#server/db/migrate.ts';
import { rowsOf } from '#server/db/rows.ts';
import * as schema from '#server/db/schema/index.ts';
import type { Design } from '#shared/api/designs.ts';
import type { InvitationMade } from '#shared/api/people.ts';
import { bitOf, cutOf, detailsOf, plateSvg } from '../support/samples.ts';
import { type Person, password, type TestClub, testClub } from '../support/test-club.ts';
import { type PrivatePostgres, postgresPrograms, privatePostgres } from './support/private-postgres.ts';
import { share, sharedDesign } from './support/share-design.ts';
import { storedThings, takeCount } from './support/stored-things.ts';

// What PGlite's one connection cannot show: requests that really run at once, and the other driver.

const programs = postgresPrograms();
const tableCount = Object.values(schema).filter((value) => value instanceof PgTable).length;

if (programs === null) {
  describe('without a PostgreSQL server', () => {
    it('these tests have nothing to run on: install postgresql to run them', () => {
      expect(postgresPrograms()).toBeNull();
      process.stderr.write('tests/api/postgres.test.ts: no /usr/lib/postgresql/*/bin/initdb here, not run\n');
    });
  });
} else {
  describe('on PostgreSQL', () => {
    let server: PrivatePostgres;
    let club: TestClub;
    let wren: Person;
    let ada: Person;
    beforeAll(async () => {
      server = await privatePostgres(programs);
      const database = await openDatabase({ databaseUrl: server.newDatabase('club') });
      await migrate(database);
      await ensureClub(database.db);
      club = await testClub(database);
      wren = await club.person('Wren');
      ada = await club.person('Ada', 'administrator');
    });
    afterAll(async () => {
      await club?.close();
      await server?.stop();
    });

    const withDatabases = async (
      name: string,
      count: number,
      work: (all: OpenDatabase[]) => Promise<void>,
    ) => {
      const databaseUrl = server.newDatabase(name);
      const all = await Promise.all(Array.from({ length: count }, () => openDatabase({ databaseUrl })));
      await work(all);
      await Promise.all(all.map((database) => database.close()));
    };
    const tables = async ({ db }: OpenDatabase) =>
      rowsOf(await db.execute(sql`select tablename from pg_tables where schemaname = 'public'`));

    it('migrates once when three processes start at the same time, and again without harm', async () => {
      await withDatabases('at_once', 3, async (all) => {
        await Promise.all(all.map((database) => migrate(database)));
        const [first] = all;
        if (first === undefined) throw new Error('no database');
        expect(await tables(first)).toHaveLength(tableCount);
        await migrate(first);
        expect(await tables(first)).toHaveLength(tableCount);
      });
    });

    it('refuses a database that a newer program wrote', async () => {
      await withDatabases('newer', 1, async ([database]) => {
        if (database === undefined) throw new Error('no database');
        await migrate(database);
        await database.db.execute(
          sql`insert into drizzle.__drizzle_migrations (hash, created_at) values ('later', 9999999999999)`,
        );
        await expect(migrate(database)).rejects.toThrow(DatabaseTooNew);
      });
    });

    it('shares, finds, fits and takes', async () => {
      const machine = await club.machine(wren);
      await wren.call('post', '/api/bits').send(bitOf()).expect(201);
      const design = await sharedDesign(wren, { cut: cutOf(machine.id) });
      const list = await wren.call('get', `/api/designs?q=corner&fits=true&machineId=${machine.id}`);
      expect(list.body.items.map(({ slug }: Design) => slug)).toEqual([design.slug]);
      const at = `/api/designs/${design.slug}/revisions/1`;
      await wren.call('get', `${at}/fit?machineId=${machine.id}`).expect(200);
      await wren.call('get', `${at}/package.zip`).expect(200);
      expect(await takeCount(club)).toBe(1);
      const health = await wren.call('get', '/api/health').expect(200);
      expect(health.body.database).toBe('postgres');
    });

    it('gives shares at once numbers and addresses of their own, also where titles end in numbers', async () => {
      await sharedDesign(wren, { title: 'Rush' });
      const titles = ['Rush', 'Rush 2', 'Rush', 'Rush 2', 'Rush 3', 'Rush', 'Rush 2', 'Rush'];
      const designs = await Promise.all(
        titles.map((title, place) => sharedDesign(wren, { title }, plateSvg(40 + place))),
      );
      expect(new Set(designs.map(({ slug }) => slug)).size).toBe(titles.length);
      expect(new Set(designs.map(({ drawingNumber }) => drawingNumber)).size).toBe(titles.length);
    });

    it('makes one design of the same request sent four times at once', async () => {
      const before = await storedThings(club);
      const details = detailsOf({ title: 'Sent at once' });
      const answers = await Promise.all([1, 2, 3, 4].map(() => share(wren, details, { key: 'at-once' })));
      expect(answers.map(({ status }) => status)).toEqual([201, 201, 201, 201]);
      for (const { body } of answers) expect(body).toEqual(answers[0]?.body);
      expect((await storedThings(club)).designs).toBe(before.designs + 1);
    });

    it('makes one member of an invitation accepted four times at once', async () => {
      const made = await ada.call('post', '/api/invitations').send({ role: 'member' }).expect(201);
      const code = (made.body as InvitationMade).link.split('/').pop();
      const answers = await Promise.all(
        [1, 2, 3, 4].map((place) =>
          club.stranger
            .call('post', `/api/invitations/${code}/acceptance`)
            .send({ name: 'Fern', email: `fern-${place}@club.example`, password }),
        ),
      );
      expect(answers.map(({ status }) => status).sort()).toEqual([201, 404, 404, 404]);
    });

    it('keeps one administrator when two take each other’s role away at once', async () => {
      const bay = await club.person('Bay', 'administrator');
      const answers = await Promise.all([
        ada.call('patch', `/api/members/${bay.id}`).send({ role: 'member', version: 1 }),
        bay.call('patch', `/api/members/${ada.id}`).send({ role: 'member', version: 1 }),
      ]);
      expect(answers.filter(({ status }) => status === 200).length).toBeLessThanOrEqual(1);
      const left = await club.deps.database.db.execute(
        sql`select id from "user" where role = 'administrator' and suspended_at is null`,
      );
      expect(rowsOf(left).length).toBeGreaterThan(0);
    });

    it('keeps the audit log a chain while many write', async () => {
      await Promise.all(
        Array.from({ length: 8 }, (_, place) => sharedDesign(wren, { title: 'Chain' }, plateSvg(60 + place))),
      );
      const entries = await club.deps.database.db
        .select()
        .from(schema.auditEntry)
        .orderBy(schema.auditEntry.number);
      const hashes = ['0'.repeat(64), ...entries.map(({ hash }) => hash)];
      expect(entries.map(({ previousHash }) => previousHash)).toEqual(hashes.slice(0, -1));
    });

    it('refuses a change to a revision in the database itself', async () => {
      const refused = await club.deps.database.db
        .execute(sql`update revision set licence = 'CC0-1.0'`)
        .catch((error: { cause?: { code?: string } }) => error.cause);
      expect(refused).toMatchObject({ code: '23001' });
    });
  });
}
