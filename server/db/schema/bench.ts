import { boolean, doublePrecision, index, integer, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import type { Machine, Spindle } from '#shared/api/bench.ts';
import type { BitKind, MachineClass, MaterialFamily } from '#shared/api/vocabulary.ts';
import { idColumn, instant } from './columns.ts';
import { user } from './people.ts';

const owner = () =>
  uuid('owner_id')
    .notNull()
    .references(() => user.id);

export const machine = pgTable(
  'machine',
  {
    id: idColumn(),
    ownerId: owner(),
    version: integer('version').notNull().default(1),
    createdAt: instant('created_at').notNull(),
    name: text('name').notNull(),
    class: text('class').$type<MachineClass>().notNull(),
    bedXMm: doublePrecision('bed_x_mm').notNull(),
    bedYMm: doublePrecision('bed_y_mm').notNull(),
    marginMm: jsonb('margin_mm').$type<Machine['marginMm']>().notNull(),
    clampStripMm: doublePrecision('clamp_strip_mm').notNull(),
    zTravelMm: doublePrecision('z_travel_mm').notNull(),
    openingMm: doublePrecision('opening_mm').notNull(),
    maxFeedMmPerMin: doublePrecision('max_feed_mm_per_min').notNull(),
    maxPlungeMmPerMin: doublePrecision('max_plunge_mm_per_min').notNull(),
    rapidMmPerMin: doublePrecision('rapid_mm_per_min').notNull(),
    accelerationMmPerS2: doublePrecision('acceleration_mm_per_s2'),
    spindle: jsonb('spindle').$type<Spindle>().notNull(),
    spindlePowerW: doublePrecision('spindle_power_w').notNull(),
    colletsMm: doublePrecision('collets_mm').array().notNull(),
  },
  (table) => [index('machine_owner').on(table.ownerId)],
);

export const bit = pgTable(
  'bit',
  {
    id: idColumn(),
    ownerId: owner(),
    version: integer('version').notNull().default(1),
    createdAt: instant('created_at').notNull(),
    name: text('name').notNull(),
    kind: text('kind').$type<BitKind>().notNull(),
    diameterMm: doublePrecision('diameter_mm').notNull(),
    shankMm: doublePrecision('shank_mm').notNull(),
    flutes: integer('flutes').notNull(),
    cuttingLengthMm: doublePrecision('cutting_length_mm').notNull(),
    canPlunge: boolean('can_plunge').notNull(),
    maxRpm: doublePrecision('max_rpm'),
    angleDeg: doublePrecision('angle_deg'),
  },
  (table) => [index('bit_owner').on(table.ownerId)],
);

export const stock = pgTable(
  'stock',
  {
    id: idColumn(),
    ownerId: owner(),
    version: integer('version').notNull().default(1),
    createdAt: instant('created_at').notNull(),
    name: text('name').notNull(),
    materialId: text('material_id').$type<MaterialFamily>().notNull(),
    lengthMm: doublePrecision('length_mm').notNull(),
    widthMm: doublePrecision('width_mm').notNull(),
    thicknessMm: doublePrecision('thickness_mm').notNull(),
  },
  (table) => [index('stock_owner').on(table.ownerId)],
);
