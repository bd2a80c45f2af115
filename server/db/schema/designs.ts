import {
  type AnyPgColumn,
  bigint,
  index,
  integer,
  jsonb,
  pgSequence,
  pgTable,
  text,
  unique,
  uuid,
} from 'drizzle-orm/pg-core';
import type { DrawingSummary, Geometry } from '#shared/api/drawings.ts';
import type { Kind, Licence } from '#shared/api/vocabulary.ts';
import { idColumn, instant } from './columns.ts';
import { user } from './people.ts';

/** What the object store holds: a row is written only after the object is there. */
export const storedObject = pgTable('stored_object', {
  key: text('key').primaryKey(),
  sha256: text('sha256').notNull(),
  sizeBytes: bigint('size_bytes', { mode: 'number' }).notNull(),
  contentType: text('content_type').notNull(),
  createdAt: instant('created_at').notNull(),
});

/** Keys that are about to be written: what no row came to point at is swept after a day. */
export const pendingObject = pgTable('pending_object', {
  key: text('key').primaryKey(),
  createdAt: instant('created_at').notNull(),
});

export const drawingNumberSequence = pgSequence('drawing_number_seq', { startWith: 1 });

export const design = pgTable(
  'design',
  {
    id: idColumn(),
    slug: text('slug').notNull().unique(),
    drawingNumber: text('drawing_number').notNull().unique(),
    ownerId: uuid('owner_id')
      .notNull()
      .references(() => user.id),
    version: integer('version').notNull().default(1),
    title: text('title').notNull(),
    summary: text('summary').notNull(),
    kind: text('kind').$type<Kind>().notNull(),
    tags: text('tags').array().notNull(),
    createdAt: instant('created_at').notNull(),
    updatedAt: instant('updated_at').notNull(),
    withdrawnAt: instant('withdrawn_at'),
    /** The revision that this design is a remix of. */
    parentRevisionId: uuid('parent_revision_id').references((): AnyPgColumn => revision.id),
  },
  (table) => [index('design_owner').on(table.ownerId), index('design_parent').on(table.parentRevisionId)],
);

/** Never changed once written (a trigger refuses it): what was cut stays what was drawn. */
export const revision = pgTable(
  'revision',
  {
    id: idColumn(),
    designId: uuid('design_id')
      .notNull()
      .references(() => design.id),
    number: integer('number').notNull(),
    geometryHash: text('geometry_hash').notNull(),
    licence: text('licence').$type<Licence>().notNull(),
    changeNote: text('change_note').notNull(),
    drawing: jsonb('drawing').$type<DrawingSummary>().notNull(),
    hullMm: jsonb('hull_mm').$type<Geometry['hullMm']>().notNull(),
    /** Simplified path data for cards, at most 4 kB. */
    outline: text('outline').notNull(),
    originalKey: text('original_key')
      .notNull()
      .references(() => storedObject.key),
    drawingKey: text('drawing_key')
      .notNull()
      .references(() => storedObject.key),
    createdBy: uuid('created_by')
      .notNull()
      .references(() => user.id),
    createdAt: instant('created_at').notNull(),
  },
  (table) => [
    unique('revision_number').on(table.designId, table.number),
    index('revision_geometry_hash').on(table.geometryHash),
  ],
);

/** The outlines for the screen; apart from `revision`, because they can be megabytes. */
export const revisionGeometry = pgTable('revision_geometry', {
  revisionId: uuid('revision_id')
    .primaryKey()
    .references(() => revision.id),
  geometry: jsonb('geometry').$type<Geometry>().notNull(),
});

/** A member took a drawing or package: a recall reaches them by this row. */
export const take = pgTable(
  'take',
  {
    id: idColumn(),
    revisionId: uuid('revision_id')
      .notNull()
      .references(() => revision.id),
    memberId: uuid('member_id')
      .notNull()
      .references(() => user.id),
    what: text('what').$type<'drawing' | 'package' | 'sheet'>().notNull(),
    machineId: uuid('machine_id'),
    cutId: uuid('cut_id'),
    takenAt: instant('taken_at').notNull(),
  },
  (table) => [index('take_revision').on(table.revisionId), index('take_member').on(table.memberId)],
);
