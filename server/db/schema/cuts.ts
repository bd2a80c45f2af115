import {
  date,
  doublePrecision,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  uuid,
} from 'drizzle-orm/pg-core';
import type { Machine } from '#shared/api/bench.ts';
import type { BitUsed, MeasuredSize, Settings } from '#shared/api/cuts.ts';
import type { HoldDown, Material, Outcome } from '#shared/api/vocabulary.ts';
import type { WentWrong } from '#shared/evidence/went-wrong.ts';
import { idColumn, instant } from './columns.ts';
import { revision, storedObject } from './designs.ts';
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
    version: integer('version').notNull().default(1),
    machineId: uuid('machine_id').notNull(),
    machine: jsonb('machine').$type<Omit<Machine, 'version' | 'createdAt'>>().notNull(),
    bitId: uuid('bit_id'),
    bit: jsonb('bit').$type<BitUsed>().notNull(),
    /** The greatest speed marked on the bit of the drawer, when one was named. */
    bitMaxRpm: doublePrecision('bit_max_rpm'),
    materialId: text('material_id').$type<Material>().notNull(),
    stockThicknessMm: doublePrecision('stock_thickness_mm').notNull(),
    settings: jsonb('settings').$type<Settings>().notNull(),
    holdDown: text('hold_down').$type<HoldDown>().notNull(),
    outcome: text('outcome').$type<Outcome>().notNull(),
    runTimeS: doublePrecision('run_time_s').notNull(),
    overridePercent: doublePrecision('override_percent'),
    wentWrong: text('went_wrong').array().$type<WentWrong[]>().notNull().default([]),
    measured: jsonb('measured').$type<MeasuredSize[]>().notNull().default([]),
    notes: text('notes').notNull(),
    /** Local date of the cut, as the member's calendar said. */
    cutOn: date('cut_on', { mode: 'string' }).notNull(),
    createdAt: instant('created_at').notNull(),
    correctedAt: instant('corrected_at'),
  },
  (table) => [
    index('cut_revision').on(table.revisionId),
    index('cut_member').on(table.memberId),
    index('cut_created').on(table.createdAt),
  ],
);

/** What a record said before it was corrected: the whole row as it was. */
export const cutEarlier = pgTable(
  'cut_earlier',
  {
    cutId: uuid('cut_id')
      .notNull()
      .references(() => cut.id),
    version: integer('version').notNull(),
    told: jsonb('told').$type<Record<string, unknown>>().notNull(),
    replacedAt: instant('replaced_at').notNull(),
  },
  (table) => [primaryKey({ columns: [table.cutId, table.version] })],
);

/** Weeks later: how the part holds in use. The newest note counts. */
export const inServiceNote = pgTable(
  'in_service_note',
  {
    id: idColumn(),
    cutId: uuid('cut_id')
      .notNull()
      .references(() => cut.id),
    result: text('result').$type<'holds' | 'broke'>().notNull(),
    notes: text('notes').notNull(),
    notedAt: instant('noted_at').notNull(),
  },
  (table) => [index('in_service_cut').on(table.cutId)],
);

export const cutPhoto = pgTable(
  'cut_photo',
  {
    id: idColumn(),
    cutId: uuid('cut_id')
      .notNull()
      .references(() => cut.id),
    objectKey: text('object_key')
      .notNull()
      .references(() => storedObject.key),
    widthPx: integer('width_px').notNull(),
    heightPx: integer('height_px').notNull(),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [index('cut_photo_cut').on(table.cutId)],
);
