import { betterAuth } from 'better-auth';
import { drizzleAdapter } from 'better-auth/adapters/drizzle';
import { APIError } from 'better-auth/api';
import { eq } from 'drizzle-orm';
import type { IdSource } from './clock.ts';
import type { Database } from './db/client.ts';
import * as schema from './db/schema/index.ts';

export const suspendedSentence =
  'Your membership is suspended. Ask an administrator of the club; your designs and records are kept.';

/** E-mail and password sign-in. Accounts are made from invitations only (features/people). */
export function createAuth(options: {
  db: Database;
  secret: string;
  origins: readonly [string, ...string[]];
  ids: IdSource;
}) {
  const { db, origins } = options;
  return betterAuth({
    baseURL: origins[0],
    basePath: '/api/auth',
    secret: options.secret,
    trustedOrigins: [...origins],
    database: drizzleAdapter(db, { provider: 'pg', schema, transaction: true }),
    emailAndPassword: { enabled: true, disableSignUp: true, minPasswordLength: 12, maxPasswordLength: 128 },
    user: {
      additionalFields: {
        role: { type: 'string', required: true, input: false, defaultValue: 'member' },
        suspendedAt: { type: 'date', required: false, input: false },
        version: { type: 'number', required: true, input: false, defaultValue: 1 },
      },
    },
    session: { expiresIn: 60 * 60 * 24 * 30, updateAge: 60 * 60 * 24, cookieCache: { enabled: false } },
    // Our own limits stand in front (http/rate-limits.ts); the origin is checked by both.
    rateLimit: { enabled: false },
    advanced: {
      useSecureCookies: origins[0].startsWith('https:'),
      disableOriginCheck: false,
      cookiePrefix: 'tallyloft',
      database: { generateId: () => options.ids.next() },
    },
    databaseHooks: {
      session: {
        create: {
          before: async (session) => {
            const member = await db.query.user.findFirst({ where: eq(schema.user.id, session.userId) });
            if (member?.suspendedAt != null) throw new APIError('FORBIDDEN', { message: suspendedSentence });
          },
        },
      },
    },
    logger: { disabled: true },
    telemetry: { enabled: false },
  });
}

export type Auth = ReturnType<typeof createAuth>;
