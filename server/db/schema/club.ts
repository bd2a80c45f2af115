import { bigserial, index, integer, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { idColumn, instant } from './columns.ts';
import { user } from './people.ts';

/** One row: what the club calls itself and how it numbers its drawings. */
export const club = pgTable('club', {
  id: integer('id').primaryKey().default(1),
  name: text('name').notNull(),
  drawingPrefix: text('drawing_prefix').notNull(),
});

/** Mail waiting to go out, written in the transaction that caused it. */
export const outbox = pgTable(
  'outbox',
  {
    id: idColumn(),
    kind: text('kind').notNull(),
    payload: jsonb('payload').$type<Record<string, string>>().notNull(),
    createdAt: instant('created_at').notNull(),
    sentAt: instant('sent_at'),
    attempts: integer('attempts').notNull().default(0),
  },
  (table) => [index('outbox_unsent').on(table.sentAt)],
);

/** Append-only (a trigger refuses the rest); each entry carries the hash of the one before. */
export const auditEntry = pgTable('audit_entry', {
  number: bigserial('number', { mode: 'number' }).primaryKey(),
  at: instant('at').notNull(),
  actorId: uuid('actor_id'),
  action: text('action').notNull(),
  subject: text('subject').notNull(),
  detail: jsonb('detail').$type<Record<string, unknown>>().notNull(),
  previousHash: text('previous_hash').notNull(),
  hash: text('hash').notNull(),
});

/** The answer given to a creating request, so that its repetition gets the same one. */
export const idempotencyKey = pgTable(
  'idempotency_key',
  {
    memberId: uuid('member_id')
      .notNull()
      .references(() => user.id),
    key: text('key').notNull(),
    requestHash: text('request_hash').notNull(),
    status: integer('status').notNull(),
    answer: jsonb('answer').$type<unknown>().notNull(),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [primaryKey({ columns: [table.memberId, table.key] })],
);
