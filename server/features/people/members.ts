import { and, asc, eq, isNull } from 'drizzle-orm';
import { appendAudit } from '#server/audit/append.ts';
import type { Transaction } from '#server/db/client.ts';
import { isUuid } from '#server/db/is-uuid.ts';
import { session, user } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { Member, MemberChange } from '#shared/api/people.ts';

type Row = typeof user.$inferSelect;

export function presentMember(row: Row): Member {
  return {
    id: row.id,
    name: row.name,
    email: row.email,
    role: row.role,
    createdAt: row.createdAt.toISOString(),
    version: row.version,
    ...(row.suspendedAt === null ? {} : { suspendedAt: row.suspendedAt.toISOString() }),
  };
}

export async function listMembers(deps: Deps) {
  const rows = await deps.database.db.select().from(user).orderBy(asc(user.name), asc(user.id));
  return { items: rows.map(presentMember), total: rows.length, nextCursor: null };
}

/** Changes a role, suspends or readmits. A suspended member's sessions end in the same transaction. */
export async function changeMember(
  deps: Deps,
  actorId: string,
  id: string,
  change: MemberChange,
): Promise<Member> {
  return deps.database.db.transaction(async (tx) => {
    const [before] = isUuid(id) ? await tx.select().from(user).where(eq(user.id, id)) : [];
    if (before === undefined) throw new ProblemError(404, 'member.not-found', 'There is no such member.');
    await keepOneAdministrator(tx, before, change);
    const now = deps.clock.now();
    const suspendedAt =
      change.suspended === undefined
        ? before.suspendedAt
        : change.suspended
          ? (before.suspendedAt ?? now)
          : null;
    const [row] = await tx
      .update(user)
      .set({ role: change.role ?? before.role, suspendedAt, version: change.version + 1, updatedAt: now })
      .where(and(eq(user.id, id), eq(user.version, change.version)))
      .returning();
    if (row === undefined) {
      throw new ProblemError(
        409,
        'member.changed',
        'This member was changed in the meantime. Look at the list again.',
        { current: presentMember(before) },
      );
    }
    if (suspendedAt !== null) await tx.delete(session).where(eq(session.userId, id));
    const detail = {
      role: { before: before.role, after: row.role },
      suspended: { before: before.suspendedAt !== null, after: suspendedAt !== null },
    };
    await appendAudit(tx, { at: now, actorId, action: 'member.changed', subject: `member:${id}`, detail });
    return presentMember(row);
  });
}

/** A club without an administrator could never get one again. */
async function keepOneAdministrator(tx: Transaction, member: Row, change: MemberChange): Promise<void> {
  const leaves = (change.role !== undefined && change.role !== 'administrator') || change.suspended === true;
  if (member.role !== 'administrator' || !leaves) return;
  // Held until the end: two who take each other's role away at once must not both see the other one left.
  const administrators = await tx
    .select({ id: user.id })
    .from(user)
    .where(and(eq(user.role, 'administrator'), isNull(user.suspendedAt)))
    .orderBy(asc(user.id))
    .for('update');
  if (administrators.every(({ id }) => id === member.id)) {
    throw new ProblemError(
      409,
      'member.last-administrator',
      'This is the only administrator of the club. Make somebody else administrator first.',
    );
  }
}
