import { createHash, createHmac } from 'node:crypto';

/**
 * The code in an invitation's link: nobody guesses it, and it can be made again from the id, so that no copy of
 * the database holds it.
 */
export function invitationCode(secret: string, invitationId: string): string {
  return createHmac('sha256', secret).update(`invitation:${invitationId}`).digest('base64url');
}

/** Where the invited person joins; built when it is shown or sent, kept nowhere. */
export const invitationLink = (
  { origins, secret }: { origins: readonly [string, ...string[]]; secret: string },
  invitationId: string,
): string => `${origins[0]}/join/${invitationCode(secret, invitationId)}`;

export function hashInvitationCode(code: string): string {
  return createHash('sha256').update(code).digest('hex');
}
