import { z } from 'zod';
import { bitUsed, settings } from './cuts.ts';
import { holdDown, licence, material, outcome } from './vocabulary.ts';

/** `settings.json` in a package: whose record the numbers are from, and that they are starting points. */
export const packageSettings = z.object({
  $schema: z.string(),
  design: z.object({
    title: z.string(),
    drawingNumber: z.string(),
    revision: z.number().int(),
    geometryHash: z.string(),
    licence,
  }),
  drawing: z.object({ widthMm: z.number(), heightMm: z.number(), origin: z.literal('front-left') }),
  /** Absent while nobody has recorded a cut. */
  record: z
    .object({
      memberName: z.string(),
      machineName: z.string(),
      cutOn: z.string(),
      bit: bitUsed,
      materialId: material,
      stockThicknessMm: z.number(),
      settings,
      holdDown,
      outcome,
      runTimeS: z.number(),
      notes: z.string(),
    })
    .optional(),
  advice: z.array(z.string()),
});
export type PackageSettings = z.infer<typeof packageSettings>;
