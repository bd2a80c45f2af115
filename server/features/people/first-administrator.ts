import { and, isNull } from 'drizzle-orm';
import { invitation, user } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { makeInvitation, withLink } from './invitations.ts';

/** On a club without members: the one-time link that makes the first administrator; an older one stops working. */
export async function firstAdministratorLink(deps: Deps): Promise<string | null> {
  return deps.database.db.transaction(async (tx) => {
    if ((await tx.$count(user)) > 0) return null;
    await tx.delete(invitation).where(and(isNull(invitation.createdBy), isNull(invitation.usedAt)));
    const made = await makeInvitation(deps, tx, {
      role: 'administrator',
      note: 'first administrator',
      validDays: 7,
      createdBy: null,
    });
    return withLink(deps, made).link;
  });
}
