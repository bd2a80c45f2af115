import { hashPassword } from 'better-auth/crypto';
import { and, desc, eq, exists, gt, isNull, or } from 'drizzle-orm';
import { appendAudit } from '#server/audit/append.ts';
import type { Transaction } from '#server/db/client.ts';
import { isUniqueViolation } from '#server/db/errors.ts';
import { account, club, invitation, outbox, user } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { Invitation, InvitationAcceptance, InvitationMade } from '#shared/api/people.ts';
import type { Role } from '#shared/api/vocabulary.ts';
import { hashInvitationCode, invitationCode, invitationLink } from './invitation-code.ts';

const dayMs = 24 * 60 * 60 * 1000;

export function presentInvitation(row: typeof invitation.$inferSelect): Invitation {
  return {
    id: row.id,
    role: row.role,
    note: row.note,
    createdAt: row.createdAt.toISOString(),
    expiresAt: row.expiresAt.toISOString(),
    ...(row.usedAt === null ? {} : { usedAt: row.usedAt.toISOString() }),
  };
}

export async function listInvitations(deps: Deps) {
  const rows = await deps.database.db
    .select()
    .from(invitation)
    .orderBy(desc(invitation.createdAt))
    .limit(200);
  return { items: rows.map(presentInvitation), total: rows.length, nextCursor: null };
}

/** Makes a single-use link. `createdBy` is null for the one that makes the first administrator. */
export async function makeInvitation(
  deps: Deps,
  tx: Transaction,
  given: {
    role: Role;
    note: string;
    validDays: number;
    createdBy: string | null;
    /** Where the link is sent; the one who makes it hands it over where there is none. */
    email?: string | undefined;
  },
): Promise<Invitation> {
  const id = deps.ids.next();
  const now = deps.clock.now();
  const row = {
    id,
    codeHash: hashInvitationCode(invitationCode(deps.secret, id)),
    role: given.role,
    note: given.note,
    createdBy: given.createdBy,
    createdAt: now,
    expiresAt: new Date(now.getTime() + given.validDays * dayMs),
    usedAt: null,
    usedBy: null,
  };
  await tx.insert(invitation).values(row);
  await appendAudit(tx, {
    at: now,
    actorId: given.createdBy,
    action: 'invitation.made',
    subject: `invitation:${row.id}`,
    detail: { role: given.role },
  });
  if (given.email !== undefined) {
    // The id and not the link: a copy of the database opens no door.
    await tx.insert(outbox).values({
      id: deps.ids.next(),
      kind: 'invitation',
      payload: { invitationId: id, to: given.email },
      createdAt: now,
    });
  }
  return presentInvitation(row);
}

/** The invitation with its link, for the one who made it: kept nowhere. */
export const withLink = (deps: Deps, made: Invitation): InvitationMade => ({
  ...made,
  link: invitationLink(deps, made.id),
});

const notGood = () =>
  new ProblemError(
    404,
    'invitation.not-good',
    'This invitation link is not good any more: it was used, has run out, or was mistyped. Ask the administrator of your club for a new one.',
  );

const openInvitation = (deps: Deps, code: string) =>
  and(
    eq(invitation.codeHash, hashInvitationCode(code)),
    isNull(invitation.usedAt),
    gt(invitation.expiresAt, deps.clock.now()),
    // A link ends with the power of the one who made it.
    or(
      isNull(invitation.createdBy),
      exists(
        deps.database.db
          .select({ id: user.id })
          .from(user)
          .where(
            and(eq(user.id, invitation.createdBy), eq(user.role, 'administrator'), isNull(user.suspendedAt)),
          ),
      ),
    ),
  );

export async function lookUpInvitation(deps: Deps, code: string) {
  const [found] = await deps.database.db.select().from(invitation).where(openInvitation(deps, code));
  if (found === undefined) throw notGood();
  const [row] = await deps.database.db.select({ name: club.name }).from(club);
  return { role: found.role, expiresAt: found.expiresAt.toISOString(), club: row?.name ?? 'the club' };
}

/** Uses the link up and makes the member, in one transaction: a code never makes two. */
export async function acceptInvitation(deps: Deps, code: string, given: InvitationAcceptance) {
  await lookUpInvitation(deps, code);
  // Slow on purpose, so before the transaction: PGlite has one connection.
  const password = await hashPassword(given.password);
  const email = given.email.toLowerCase();
  try {
    return await deps.database.db.transaction(async (tx) => {
      const now = deps.clock.now();
      const [used] = await tx
        .update(invitation)
        .set({ usedAt: now })
        .where(openInvitation(deps, code))
        .returning();
      if (used === undefined) throw notGood();
      const id = await createMember(deps, tx, {
        name: given.name,
        email,
        passwordHash: password,
        role: used.role,
      });
      await tx.update(invitation).set({ usedBy: id }).where(eq(invitation.id, used.id));
      await appendAudit(tx, {
        at: now,
        actorId: id,
        action: 'member.joined',
        subject: `member:${id}`,
        detail: { role: used.role, invitation: used.id },
      });
      return { id, email };
    });
  } catch (error) {
    if (isUniqueViolation(error)) {
      throw new ProblemError(
        409,
        'member.exists',
        'Somebody has joined with this e-mail already. Sign in instead, or use another address.',
      );
    }
    throw error;
  }
}

export async function createMember(
  deps: Deps,
  tx: Transaction,
  given: { name: string; email: string; passwordHash: string; role: Role },
): Promise<string> {
  const id = deps.ids.next();
  const now = deps.clock.now();
  await tx.insert(user).values({
    id,
    name: given.name,
    email: given.email,
    emailVerified: true,
    role: given.role,
    createdAt: now,
    updatedAt: now,
  });
  await tx.insert(account).values({
    id: deps.ids.next(),
    userId: id,
    accountId: id,
    providerId: 'credential',
    password: given.passwordHash,
    createdAt: now,
    updatedAt: now,
  });
  return id;
}
