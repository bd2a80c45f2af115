import { boolean, index, integer, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import type { Finding } from '#shared/api/findings.ts';
import type { DecisionAction, FindingLevel } from '#shared/api/vocabulary.ts';
import { idColumn, instant } from './columns.ts';
import { cut } from './cuts.ts';
import { design, revision } from './designs.ts';
import { user } from './people.ts';

/** A call for a decision: by a member, a moderator, or (raisedBy null) a rule. */
export const flag = pgTable(
  'flag',
  {
    id: idColumn(),
    version: integer('version').notNull().default(1),
    designId: uuid('design_id')
      .notNull()
      .references(() => design.id),
    revisionId: uuid('revision_id')
      .notNull()
      .references(() => revision.id),
    cutId: uuid('cut_id').references(() => cut.id),
    level: text('level').$type<FindingLevel>().notNull(),
    reason: text('reason').notNull(),
    raisedBy: uuid('raised_by').references(() => user.id),
    finding: jsonb('finding').$type<Finding>(),
    createdAt: instant('created_at').notNull(),
    isOpen: boolean('is_open').notNull().default(true),
  },
  (table) => [index('flag_open').on(table.isOpen, table.createdAt), index('flag_design').on(table.designId)],
);

/** What moderators decided, one row a decision; what is withheld now follows from them, newest last. */
export const decision = pgTable(
  'decision',
  {
    id: idColumn(),
    flagId: uuid('flag_id')
      .notNull()
      .references(() => flag.id),
    action: text('action').$type<DecisionAction>().notNull(),
    reason: text('reason').notNull(),
    decidedBy: uuid('decided_by')
      .notNull()
      .references(() => user.id),
    decidedAt: instant('decided_at').notNull(),
  },
  (table) => [index('decision_flag').on(table.flagId)],
);

/** Something a member should know. */
export const notice = pgTable(
  'notice',
  {
    id: idColumn(),
    memberId: uuid('member_id')
      .notNull()
      .references(() => user.id),
    kind: text('kind').notNull(),
    sentence: text('sentence').notNull(),
    designId: uuid('design_id').references(() => design.id),
    createdAt: instant('created_at').notNull(),
    readAt: instant('read_at'),
  },
  (table) => [index('notice_member').on(table.memberId, table.createdAt)],
);
