import { z } from 'zod';
import { id } from './primitives.ts';
import { fitResult } from './vocabulary.ts';

export const fitCheck = z.object({
  /** Stable: 'bed', 'stock', 'z-travel', 'opening', 'bit', 'shank', 'cutting-length', 'spindle', 'feed', 'plunge' … */
  id: z.string(),
  result: fitResult,
  have: z.union([z.number(), z.string()]).nullable(),
  need: z.union([z.number(), z.string()]).nullable(),
  unit: z.string(),
  sentence: z.string(),
});
export type FitCheck = z.infer<typeof fitCheck>;

export const fitReport = z.object({
  verdict: fitResult,
  sentence: z.string(),
  checks: z.array(fitCheck),
  /** How the drawing lies on the bed when it fits: degrees anticlockwise, from −90 to 90. */
  turnDeg: z.number().nullable(),
});
export type FitReport = z.infer<typeof fitReport>;

export const fitQuery = z.strictObject({
  machineId: id,
  /** The record whose settings are judged; absent: the newest clean one, else the newest. */
  recordId: id.optional(),
  /** Units of the sentences; figures are in mm always. */
  units: z.enum(['mm', 'in']).optional(),
  bitIds: z.union([id, z.array(id)]).optional(),
  stockMm: z
    .string()
    .regex(
      /^\d+(\.\d+)?x\d+(\.\d+)?x\d+(\.\d+)?$/,
      'stockMm is length x width x thickness, such as 300x200x18',
    )
    .refine(
      (text) => text.split('x').every((part) => Number(part) > 0 && Number(part) <= 10_000),
      'stockMm needs a length, width and thickness above 0 and at most 10 000 mm',
    )
    .optional(),
});
