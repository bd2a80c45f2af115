import { z } from 'zod';
import { bitUsed, inServiceResult, settings, wentWrong } from './cuts.ts';
import { finding } from './findings.ts';
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
  /** What moderators say of the design, oldest first. */
  cautions: z.array(z.string()),
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
      /** Feed override that the member ended with; absent: the feed as set. */
      overridePercent: z.number().optional(),
      /** The feed as set times the override: what was really cut with. */
      effectiveFeedMmPerMin: z.number(),
      holdDown,
      outcome,
      runTimeS: z.number(),
      notes: z.string(),
      wentWrong: z.array(wentWrong),
      /** What was said of it in use, newest note. */
      inService: z.object({ result: inServiceResult, notes: z.string() }).optional(),
      /** What the rules say of these settings, gravest first. */
      findings: z.array(finding.pick({ level: true, sentence: true, source: true })),
    })
    .optional(),
  advice: z.array(z.string()),
});
export type PackageSettings = z.infer<typeof packageSettings>;
