import { createHash } from 'node:crypto';
import { desc, sql } from 'drizzle-orm';
import type { Transaction } from '#server/db/client.ts';
import { auditEntry } from '#server/db/schema/index.ts';

export interface AuditFact {
  at: Date;
  actorId: string | null;
  /** Dotted code: 'design.published', 'member.suspended' … */
  action: string;
  /** What it was done to, as 'design:<id>'. Ids only: no names, no addresses. */
  subject: string;
  detail: Record<string, unknown>;
}

/** Any number of ours: two writers of the chain wait for each other. */
const auditLock = 7_140_214;
export const firstPreviousHash = '0'.repeat(64);

/** Keys in a fixed order, so that the same fact always has the same hash. */
function canonical(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonical).join(',')}]`;
  if (value !== null && typeof value === 'object') {
    const entries = Object.entries(value).filter(([, item]) => item !== undefined);
    entries.sort(([a], [b]) => (a < b ? -1 : 1));
    return `{${entries.map(([key, item]) => `${JSON.stringify(key)}:${canonical(item)}`).join(',')}}`;
  }
  return JSON.stringify(value);
}

/** The hash of an entry: over the one before and everything it says. */
export function auditHash(fact: AuditFact, previousHash: string): string {
  const text = canonical({ ...fact, at: fact.at.toISOString(), previousHash });
  return createHash('sha256').update(text).digest('hex');
}

/** Adds an entry in the transaction of its cause: both are there, or neither. */
export async function appendAudit(tx: Transaction, fact: AuditFact): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock(${auditLock})`);
  const [last] = await tx
    .select({ hash: auditEntry.hash })
    .from(auditEntry)
    .orderBy(desc(auditEntry.number))
    .limit(1);
  const previousHash = last?.hash ?? firstPreviousHash;
  await tx.insert(auditEntry).values({ ...fact, previousHash, hash: auditHash(fact, previousHash) });
}
