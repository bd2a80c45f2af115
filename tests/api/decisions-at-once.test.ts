import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openDatabase } from '#server/db/client.ts';
import { ensureClub } from '#server/db/ensure-club.ts';
import { migrate } from '#server/db/migrate.ts';
import { decision, flag, notice, outbox } from '#server/db/schema/index.ts';
import { openOutbox } from '#server/mail/send-outbox.ts';
import { plateSvg } from '../support/samples.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { type PrivatePostgres, postgresPrograms, privatePostgres } from './support/private-postgres.ts';
import { decide, decided, flagged } from './support/raise-flag.ts';
import { sharedDesign } from './support/share-design.ts';

// PGlite has one connection and lets one transaction in at a time: here they really run at once.

const programs = postgresPrograms();

if (programs === null) {
  describe('without a PostgreSQL server', () => {
    it('these tests have nothing to run on: install postgresql to run them', () => {
      expect(postgresPrograms()).toBeNull();
      process.stderr.write('tests/api/decisions-at-once.test.ts: no initdb here, not run\n');
    });
  });
} else {
  describe('on PostgreSQL', () => {
    let server: PrivatePostgres;
    let club: TestClub;
    let wren: Person;
    let tarn: Person;
    let moderators: Person[];
    beforeAll(async () => {
      server = await privatePostgres(programs);
      const database = await openDatabase({ databaseUrl: server.newDatabase('review') });
      await migrate(database);
      await ensureClub(database.db);
      club = await testClub(database);
      wren = await club.person('Wren');
      tarn = await club.person('Tarn');
      moderators = [];
      for (const name of ['Moss', 'Heron', 'Sedge', 'Plover'])
        moderators.push(await club.person(name, 'moderator'));
    });
    afterAll(async () => {
      await club?.close();
      await server?.stop();
    });

    it('one of four moderators decides, with one notice and one mail each, and the others hear of it', async () => {
      for (let round = 0; round < 5; round += 1) {
        const design = await sharedDesign(wren, { title: `Round ${round}` }, plateSvg(100 + round));
        const raised = await flagged(tarn, design.slug);
        const answers = await Promise.all(
          moderators.map((moderator, place) => decide(moderator, raised, 'caution', `Reason ${place}.`)),
        );
        expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409]);
        const won = answers.findIndex(({ status }) => status === 200);
        const name = ['Moss', 'Heron', 'Sedge', 'Plover'][won];
        for (const { status, body } of answers) {
          if (status === 200) continue;
          expect(body.detail).toBe(`${name} decided this a moment ago: caution, “Reason ${won}.”.`);
          expect(body.current).toEqual(answers[won]?.body);
        }
        const { db } = club.deps.database;
        expect(await db.$count(decision, eq(decision.flagId, raised.id))).toBe(1);
        const told = await db.select().from(notice).where(eq(notice.designId, design.id));
        expect(told.filter(({ kind }) => kind === 'flag-decided')).toHaveLength(2);
        expect(await db.$count(outbox)).toBe(2 * (round + 1));
      }
    });

    it('a member’s flag that is sent five times at once is raised once', async () => {
      const design = await sharedDesign(wren, { title: 'Five times' }, plateSvg(150));
      const answers = await Promise.all(
        Array.from({ length: 5 }, () =>
          tarn.call('post', '/api/flags').send({ designSlug: design.slug, reason: 'Off.' }),
        ),
      );
      expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409, 409, 409]);
      expect(await club.deps.database.db.$count(flag, eq(flag.designId, design.id))).toBe(1);
    });

    it('the desk, the audit log and the takings work as on PGlite', async () => {
      const [moss, heron] = moderators;
      if (moss === undefined || heron === undefined) throw new Error('no moderators');
      const design = await sharedDesign(wren, { title: 'As on PGlite' }, plateSvg(160));
      const withheld = await decided(moss, await flagged(tarn, design.slug), 'withholdRevision');
      const take = () => tarn.call('get', `/api/designs/${design.slug}/revisions/1/drawing.svg`);
      await take().expect(403);
      await decided(heron, withheld, 'restore');
      await take().expect(200);
      const desk = await moss.call('get', '/api/flags').expect(200);
      expect(desk.body.items[0]).toMatchObject({ state: 'open', reason: 'Off.' });
      const log = await moss.call('get', '/api/audit').expect(200);
      expect(log.body.chainIsWhole).toBe(true);
    });

    it('a mail is sent once by three workers', async () => {
      const sent: string[] = [];
      const transport = { send: async ({ id }: { id: string }) => void sent.push(id), close: () => {} };
      const waiting = await club.deps.database.db.$count(outbox);
      await Promise.all([1, 2, 3].map(() => openOutbox(club.deps, transport).sendDue()));
      expect(waiting).toBeGreaterThan(10);
      expect(new Set(sent).size).toBe(waiting);
      expect(sent).toHaveLength(waiting);
    });
  });
}
