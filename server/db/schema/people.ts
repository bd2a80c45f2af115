import { boolean, index, integer, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import type { Role } from '#shared/api/vocabulary.ts';
import { idColumn, instant } from './columns.ts';

// user, session, account and verification are better-auth's tables, written by hand; a test compares them
// with what the library expects.

export const user = pgTable('user', {
  id: idColumn(),
  name: text('name').notNull(),
  email: text('email').notNull().unique(),
  emailVerified: boolean('email_verified').notNull().default(false),
  image: text('image'),
  createdAt: instant('created_at').notNull(),
  updatedAt: instant('updated_at').notNull(),
  role: text('role').$type<Role>().notNull().default('member'),
  suspendedAt: instant('suspended_at'),
  version: integer('version').notNull().default(1),
});

export const session = pgTable(
  'session',
  {
    id: idColumn(),
    expiresAt: instant('expires_at').notNull(),
    token: text('token').notNull().unique(),
    createdAt: instant('created_at').notNull(),
    updatedAt: instant('updated_at').notNull(),
    ipAddress: text('ip_address'),
    userAgent: text('user_agent'),
    userId: uuid('user_id')
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
  },
  (table) => [index('session_user').on(table.userId)],
);

export const account = pgTable(
  'account',
  {
    id: idColumn(),
    accountId: text('account_id').notNull(),
    providerId: text('provider_id').notNull(),
    userId: uuid('user_id')
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    accessToken: text('access_token'),
    refreshToken: text('refresh_token'),
    idToken: text('id_token'),
    accessTokenExpiresAt: instant('access_token_expires_at'),
    refreshTokenExpiresAt: instant('refresh_token_expires_at'),
    scope: text('scope'),
    password: text('password'),
    createdAt: instant('created_at').notNull(),
    updatedAt: instant('updated_at').notNull(),
  },
  (table) => [index('account_user').on(table.userId)],
);

export const verification = pgTable('verification', {
  id: idColumn(),
  identifier: text('identifier').notNull(),
  value: text('value').notNull(),
  expiresAt: instant('expires_at').notNull(),
  createdAt: instant('created_at').notNull(),
  updatedAt: instant('updated_at').notNull(),
});

/** An invitation is found by the hash of its code, so that a copy of the database opens no door. */
export const invitation = pgTable('invitation', {
  id: idColumn(),
  codeHash: text('code_hash').notNull().unique(),
  role: text('role').$type<Role>().notNull(),
  note: text('note').notNull().default(''),
  /** Null for the link that makes the first administrator. */
  createdBy: uuid('created_by').references(() => user.id),
  createdAt: instant('created_at').notNull(),
  expiresAt: instant('expires_at').notNull(),
  usedAt: instant('used_at'),
  usedBy: uuid('used_by').references(() => user.id),
});
