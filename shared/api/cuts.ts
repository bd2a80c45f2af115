import { z } from 'zod';
import { above0, id, optionalWords, wholeNumber } from './primitives.ts';
import { bitKind, holdDown, materialFamily, outcome } from './vocabulary.ts';

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

const cutFields = {
  machineId: id,
  bit: bitUsed,
  materialId: materialFamily,
  stockThicknessMm: above0(300, 'Measured stock thickness', 'mm'),
  settings,
  holdDown,
  outcome,
  runTimeS: above0(172_800, 'Run time', 's'),
  notes: optionalWords(2000, 'Notes').optional(),
};

/** The cut that a member shares together with a drawing. */
export const firstCut = z
  .strictObject(cutFields)
  .refine((cut) => cut.settings.stepoverMm <= cut.bit.diameterMm, {
    path: ['settings', 'stepoverMm'],
    message: 'Stepover must not be more than the bit diameter: it would leave ridges uncut',
  });
