import { createHash, randomBytes } from 'node:crypto';

/** A code that nobody guesses; only its hash is kept. */
export function newInvitationCode(): { code: string; codeHash: string } {
  const code = randomBytes(24).toString('base64url');
  return { code, codeHash: hashInvitationCode(code) };
}

export function hashInvitationCode(code: string): string {
  return createHash('sha256').update(code).digest('hex');
}
