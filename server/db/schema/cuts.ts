import { doublePrecision, index, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import type { Machine } from '#shared/api/bench.ts';
import type { BitUsed, Settings } from '#shared/api/cuts.ts';
import type { HoldDown, MaterialFamily, Outcome } from '#shared/api/vocabulary.ts';
import { idColumn, instant } from './columns.ts';
import { revision } from './designs.ts';
import { user } from './people.ts';

/** One member's account of one cut. Machine and bit are copied in: the bench may change later. */
export const cut = pgTable(
  'cut',
  {
    id: idColumn(),
    revisionId: uuid('revision_id')
      .notNull()
      .references(() => revision.id),
    memberId: uuid('member_id')
      .notNull()
      .references(() => user.id),
    machineId: uuid('machine_id').notNull(),
    machine: jsonb('machine').$type<Omit<Machine, 'version' | 'createdAt'>>().notNull(),
    bit: jsonb('bit').$type<BitUsed>().notNull(),
    materialId: text('material_id').$type<MaterialFamily>().notNull(),
    stockThicknessMm: doublePrecision('stock_thickness_mm').notNull(),
    settings: jsonb('settings').$type<Settings>().notNull(),
    holdDown: text('hold_down').$type<HoldDown>().notNull(),
    outcome: text('outcome').$type<Outcome>().notNull(),
    runTimeS: doublePrecision('run_time_s').notNull(),
    notes: text('notes').notNull(),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [index('cut_revision').on(table.revisionId), index('cut_member').on(table.memberId)],
);
