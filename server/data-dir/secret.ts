import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** The secret that signs sessions: from the environment, else made once and kept readable by us only. */
export function authSecret(dataDir: string, given: string | undefined): string {
  if (given !== undefined) return given;
  const path = join(dataDir, 'auth-secret');
  if (!existsSync(path)) writeFileSync(path, randomBytes(48).toString('base64url'), { mode: 0o600 });
  return readFileSync(path, 'utf8').trim();
}
