import { fromNodeHeaders } from 'better-auth/node';
import type { Request } from 'express';
import { type Auth, suspendedSentence } from '#server/auth.ts';
import type { Caller } from '#shared/api/endpoint.ts';
import type { Role } from '#shared/api/vocabulary.ts';
import { ProblemError } from './problem.ts';

/** The member who makes a request; role and suspension are read afresh each time. */
export interface SignedIn {
  id: string;
  name: string;
  email: string;
  role: Role;
}

const rank: Record<Role, number> = { member: 0, moderator: 1, administrator: 2 };

export function hasRole(member: { role: Role }, least: Role): boolean {
  return rank[member.role] >= rank[least];
}

/** The member signed in, or a 401 or 403 with the reason. */
export async function requireMember(
  auth: Auth,
  request: Request,
  who: Exclude<Caller, 'all'>,
): Promise<SignedIn> {
  const found = await auth.api.getSession({ headers: fromNodeHeaders(request.headers) });
  if (found === null) throw new ProblemError(401, 'session.missing', 'Sign in to go on.');
  const { id, name, email, role, suspendedAt } = found.user;
  if (suspendedAt != null) throw new ProblemError(403, 'member.suspended', suspendedSentence);
  const member = { id, name, email, role: role as Role };
  if (!hasRole(member, who)) {
    throw new ProblemError(
      403,
      'role.too-low',
      `Only ${who === 'moderator' ? 'a moderator' : 'an administrator'} of the club may do this.`,
    );
  }
  return member;
}
