import type { SignedIn } from '#server/http/session.ts';
import { hasRole } from '#server/http/session.ts';

/** Who may edit the words of a design, or withdraw it. */
export function mayEditDesign(member: SignedIn, design: { ownerId: string }): boolean {
  return design.ownerId === member.id || hasRole(member, 'moderator');
}

/** Who may issue a new revision: the owner alone, since it carries their name. A moderator may not. */
export const mayIssueRevision = (member: { id: string }, design: { ownerId: string }): boolean =>
  design.ownerId === member.id;
