import type { SignedIn } from '#server/http/session.ts';
import { hasRole } from '#server/http/session.ts';

/** Who may edit the words of a design, or withdraw it. */
export function mayEditDesign(member: SignedIn, design: { ownerId: string }): boolean {
  return design.ownerId === member.id || hasRole(member, 'moderator');
}
