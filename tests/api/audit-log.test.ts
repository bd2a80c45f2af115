import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { appendAudit } from '#server/audit/append.ts';
import type { AuditList } from '#shared/api/flags.ts';
import { type Person, type TestClub, testClub } from '../support/test-club.ts';
import { decided, flagged } from './support/raise-flag.ts';
import { sharedDesign } from './support/share-design.ts';

let club: TestClub;
let moss: Person;
let tarn: Person;
beforeAll(async () => {
  club = await testClub();
  moss = await club.person('Moss', 'moderator');
  tarn = await club.person('Tarn');
});
afterAll(() => club.close());

const log = async (query = '') =>
  (await moss.call('get', `/api/audit${query}`).expect(200)).body as AuditList;

/** Changes the log as only somebody with the database in hand can. */
async function byHand(statement: string): Promise<void> {
  const { db } = club.deps.database;
  await db.execute(sql`drop trigger audit_entry_append_only on audit_entry`);
  await db.execute(sql.raw(statement));
  await db.execute(sql`create trigger audit_entry_append_only before update or delete or truncate on audit_entry
    for each statement execute function refuse_change()`);
}

/** Changes a decision behind the log's back. */
async function decisionByHand(statement: string): Promise<void> {
  const { db } = club.deps.database;
  await db.execute(sql`alter table decision disable trigger decision_append_only`);
  await db.execute(sql.raw(statement));
  await db.execute(sql`alter table decision enable trigger decision_append_only`);
}

describe('the audit log as moderators read it', () => {
  it('is whole while it is empty', async () => {
    expect(await log()).toEqual({ items: [], total: 0, nextCursor: null, chainIsWhole: true });
  });

  it('tells what was done, newest first, and nothing to members', async () => {
    const design = await sharedDesign(tarn);
    const raised = await flagged(tarn, design.slug);
    await decided(moss, raised, 'caution');
    const { items, total, chainIsWhole } = await log();
    expect(items.map(({ actorId, action, subject }) => [actorId, action, subject])).toEqual([
      [moss.id, 'flag.decided', `flag:${raised.id}`],
      [tarn.id, 'flag.raised', `flag:${raised.id}`],
      [tarn.id, 'design.published', `design:${design.id}`],
    ]);
    expect({ total, chainIsWhole }).toEqual({ total: 3, chainIsWhole: true });
    expect(items.every(({ hash }) => /^[0-9a-f]{64}$/.test(hash))).toBe(true);
    await tarn.call('get', '/api/audit').expect(403);
  });

  it('goes on page by page, and says which cursor is none', async () => {
    const { db } = club.deps.database;
    for (let number = 0; number < 2; number += 1) {
      // Many at once, more than one batch of the check.
      await db.transaction(async (tx) => {
        for (let count = 0; count < 300; count += 1) {
          await appendAudit(tx, {
            at: new Date(),
            actorId: moss.id,
            action: 'tried.out',
            subject: `trial:${number}-${count}`,
            detail: { count, ratio: 0.1, nested: { b: 1, a: [1, 2] } },
          });
        }
      });
    }
    const numbers: number[] = [];
    let cursor: string | null = null;
    do {
      const page: AuditList = await log(cursor === null ? '' : `?cursor=${cursor}`);
      expect(page.chainIsWhole).toBe(true);
      numbers.push(...page.items.map(({ number }) => number));
      cursor = page.nextCursor;
    } while (cursor !== null);
    expect(numbers).toEqual(Array.from({ length: 603 }, (_, place) => 603 - place));
    for (const query of ['?cursor=', '?cursor=12', '?before=3']) {
      await moss.call('get', `/api/audit${query}`).expect(400);
    }
  });

  it.each([
    ["update decision set action = 'dismiss'", "update decision set action = 'caution'"],
    ["update decision set reason = reason || '!'", "update decision set reason = rtrim(reason, '!')"],
  ])('says so when a decision is no more what the log tells: %s', async (change, undo) => {
    await decisionByHand(change);
    expect((await log()).chainIsWhole).toBe(false);
    await decisionByHand(undo);
    expect((await log()).chainIsWhole).toBe(true);
  });

  it.each(
    ['decision', 'cut_earlier', 'in_service_note'].flatMap((table) => [
      `update ${table} set ${table === 'cut_earlier' ? 'version = 1' : 'id = id'}`,
      `delete from ${table}`,
      `truncate ${table}`,
    ]),
  )('is not alone: the database refuses %s', async (statement) => {
    await expect(club.deps.database.db.execute(sql.raw(statement))).rejects.toMatchObject({
      cause: { message: expect.stringContaining('its rows never change') },
    });
  });

  it.each([
    ['update', "update audit_entry set action = 'x'"],
    ['delete', 'delete from audit_entry'],
    ['truncate', 'truncate audit_entry'],
  ])('refuses an %s in the database itself', async (_what, statement) => {
    const before = await log();
    await expect(club.deps.database.db.execute(sql.raw(statement))).rejects.toThrow();
    expect(await log()).toEqual(before);
  });

  it('says that the chain is broken after a change by hand, wherever it was, until it is undone', async () => {
    for (const number of [1, 2, 550, 603]) {
      await byHand(`update audit_entry set subject = subject || '!' where number = ${number}`);
      expect((await log()).chainIsWhole, String(number)).toBe(false);
      await byHand(`update audit_entry set subject = rtrim(subject, '!') where number = ${number}`);
      expect((await log()).chainIsWhole, String(number)).toBe(true);
    }
    await byHand('delete from audit_entry where number = 300');
    expect((await log()).chainIsWhole).toBe(false);
  });
});
