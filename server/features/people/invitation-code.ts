import { createHash, createHmac } from 'node:crypto';

/**
 * The code in an invitation's link: nobody guesses it, and it can be made again from the id, so that no copy of
 * the database holds it.
 */
export function invitationCode(secret: string, invitationId: string): string {
  return createHmac('sha256', secret).update(`invitation:${invitationId}`).digest('base64url');
}

export function hashInvitationCode(code: string): string {
  return createHash('sha256').update(code).digest('hex');
}
