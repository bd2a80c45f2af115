import { z } from 'zod';
import { wentWrongCodes } from '../evidence/went-wrong.ts';
import { finding } from './findings.ts';
import { above0, id, listOf, optionalWords, timestamp, version, wholeNumber } from './primitives.ts';
import { bitKind, holdDown, material, materialFamily, outcome } from './vocabulary.ts';

/** The numbers a member types into the machine for one bit in one material. */
export const settings = z.strictObject({
  spindleRpm: above0(120_000, 'Spindle speed', 'rev/min'),
  feedMmPerMin: above0(60_000, 'Feed', 'mm/min'),
  plungeMmPerMin: above0(30_000, 'Plunge rate', 'mm/min'),
  depthOfCutMm: above0(100, 'Depth of cut', 'mm'),
  stepoverMm: above0(100, 'Stepover', 'mm'),
});
export type Settings = z.infer<typeof settings>;

/** The bit as it was when the cut was made; it stays true when the drawer changes. */
export const bitUsed = z.strictObject({
  diameterMm: above0(100, 'Bit diameter', 'mm'),
  flutes: wholeNumber(1, 12, 'Flutes'),
  kind: bitKind,
});
export type BitUsed = z.infer<typeof bitUsed>;

export const wentWrong = z.enum(wentWrongCodes);

/** One size as drawn and as it came out. */
export const measuredSize = z.strictObject({
  drawnMm: above0(10_000, 'Drawn size', 'mm'),
  measuredMm: above0(10_000, 'Measured size', 'mm'),
});
export type MeasuredSize = z.infer<typeof measuredSize>;

const cutFields = {
  machineId: id,
  materialId: material,
  stockThicknessMm: above0(300, 'Measured stock thickness', 'mm'),
  settings,
  holdDown,
  outcome,
  runTimeS: above0(172_800, 'Run time', 's'),
  notes: optionalWords(2000, 'Notes').optional(),
};

const tellingFields = {
  /** A bit of my own drawer, or else `bit` describes it. */
  bitId: id.optional(),
  bit: bitUsed.optional(),
  /** Feed override the member ended with; 100 is the feed as set. */
  overridePercent: wholeNumber(10, 300, 'Feed override').optional(),
  wentWrong: z.array(wentWrong).max(14, 'Name each thing once').optional(),
  measured: z.array(measuredSize).max(20, 'Give at most 20 measured sizes').optional(),
  /** Sizes that look like another unit are asked about; true says they are millimetres all the same. */
  sizesAreMm: z.literal(true).optional(),
  /** Local date of the cut; absent: today in the club's time zone. */
  cutOn: z.iso.date('Date must be as 2026-11-30').optional(),
};

/** The cut that a member shares together with a drawing. */
export const firstCut = z
  .strictObject({ ...cutFields, bit: bitUsed })
  .refine((cut) => cut.settings.stepoverMm <= cut.bit.diameterMm, {
    path: ['settings', 'stepoverMm'],
    message: 'Stepover must not be more than the bit diameter: it would leave ridges uncut',
  });
export type FirstCut = z.infer<typeof firstCut>;

const oneBit = <Schema extends z.ZodType<{ bitId?: string | undefined; bit?: unknown }>>(schema: Schema) =>
  schema.refine((cut) => (cut.bitId === undefined) !== (cut.bit === undefined), {
    path: ['bit'],
    message: 'Name a bit of your drawer, or describe one: not both, not neither',
  });

/** A member's account of a cut. */
export const cutCreate = oneBit(
  z.strictObject({ revision: wholeNumber(1, 100_000, 'Revision'), ...cutFields, ...tellingFields }),
);
export type CutCreate = z.infer<typeof cutCreate>;

/** A correction says the whole record again; the earlier one stays readable. */
export const cutCorrection = oneBit(z.strictObject({ ...cutFields, ...tellingFields, version }));
export type CutCorrection = z.infer<typeof cutCorrection>;

export const inServiceResult = z.enum(['holds', 'broke']);
export const inServiceCreate = z.strictObject({
  result: inServiceResult,
  notes: optionalWords(1000, 'Notes').optional(),
});
export type InServiceCreate = z.infer<typeof inServiceCreate>;

const cutTold = {
  machine: z.object({ id, name: z.string(), bedXMm: z.number(), bedYMm: z.number() }),
  bit: bitUsed,
  materialId: material,
  materialFamily: materialFamily.nullable(),
  stockThicknessMm: z.number(),
  settings,
  holdDown,
  outcome,
  runTimeS: z.number(),
  overridePercent: z.number().optional(),
  wentWrong: z.array(wentWrong),
  measured: z.array(measuredSize),
  notes: z.string(),
  cutOn: z.iso.date(),
};

/** One cut record as everybody reads it. */
export const cutRecord = z.object({
  id,
  version,
  design: z.object({ slug: z.string(), title: z.string(), drawingNumber: z.string() }),
  revision: z.number().int(),
  member: z.object({ id, name: z.string() }),
  ...cutTold,
  inService: z.object({ result: inServiceResult, notes: z.string(), notedAt: timestamp }).optional(),
  photos: z.array(z.object({ id, widthPx: z.number().int(), heightPx: z.number().int() })),
  hazardsSettled: z.boolean(),
  /** A moderator withheld these settings: they are not handed out, and this says why. */
  settingsWithheld: z.object({ reason: z.string() }).optional(),
  /** What the rules say of these settings, gravest first; derived on every reading, never stored. */
  findings: z.array(finding),
  createdAt: timestamp,
  correctedAt: timestamp.optional(),
});
export type CutRecord = z.infer<typeof cutRecord>;
export const cutRecordList = listOf(cutRecord);

/** A record with what it said before it was corrected, newest first. */
export const cutRecordWithHistory = cutRecord.extend({
  earlier: z.array(z.object({ version, replacedAt: timestamp, ...cutTold })),
});
export type CutRecordWithHistory = z.infer<typeof cutRecordWithHistory>;

export const cutLogQuery = z.strictObject({
  whose: z.enum(['mine', 'club']).optional(),
  material: material.optional(),
  outcome: outcome.optional(),
  machineId: id.optional(),
  cursor: z.string().max(500).optional(),
});
export type CutLogQuery = z.infer<typeof cutLogQuery>;

export const photo = z.object({ id, widthPx: z.number().int(), heightPx: z.number().int() });
