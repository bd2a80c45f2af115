import { asc, desc, gt, lt } from 'drizzle-orm';
import { decisionsAreAsLogged } from '#server/audit/decisions-as-logged.ts';
import { firstBrokenEntry } from '#server/audit/verify.ts';
import type { Queries } from '#server/db/client.ts';
import { auditEntry } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { badCursor } from '#server/http/bad-cursor.ts';
import type { AuditList } from '#shared/api/flags.ts';

const pageSize = 100;
/** Small enough that no query holds up others: PGlite has one connection. */
const batchSize = 500;

/** One page of the audit log, newest first, and whether the whole chain and the decisions it tells of are as written. */
export async function auditLog(deps: Deps, cursor: string | undefined): Promise<AuditList> {
  const { db } = deps.database;
  const before = cursor === undefined ? undefined : numberOf(cursor);
  const rows = await db
    .select()
    .from(auditEntry)
    .where(before === undefined ? undefined : lt(auditEntry.number, before))
    .orderBy(desc(auditEntry.number))
    .limit(pageSize + 1);
  const page = rows.slice(0, pageSize);
  const last = page.at(-1);
  return {
    items: page.map(({ previousHash: _previous, at, ...entry }) => ({ ...entry, at: at.toISOString() })),
    total: await db.$count(auditEntry),
    nextCursor: rows.length > pageSize && last !== undefined ? cursorOf(last.number) : null,
    chainIsWhole: (await firstBrokenEntry(entriesInBatches(db))) === null && (await decisionsAreAsLogged(db)),
  };
}

const cursorOf = (number: number) => Buffer.from(`audit ${number}`).toString('base64url');

function numberOf(cursor: string): number {
  const text = Buffer.from(cursor, 'base64url').toString();
  const [, number] = /^audit (\d{1,15})$/.exec(text) ?? [];
  if (number === undefined) throw badCursor();
  return Number(number);
}

async function* entriesInBatches(db: Queries) {
  let after = 0;
  while (true) {
    const batch = await db
      .select()
      .from(auditEntry)
      .where(gt(auditEntry.number, after))
      .orderBy(asc(auditEntry.number))
      .limit(batchSize);
    const last = batch.at(-1);
    if (last === undefined) return;
    yield batch;
    after = last.number;
  }
}
