import { z } from 'zod';
import { findingLevel } from './vocabulary.ts';

/** What a rule says of settings or a plan, with its figures and where its limit comes from. */
export const finding = z.object({
  ruleId: z.string(),
  title: z.string(),
  level: findingLevel,
  sentence: z.string(),
  /** What to change. */
  advice: z.string(),
  figures: z.array(z.object({ name: z.string(), value: z.number(), unit: z.string() })),
  /** A publication, or 'common practice, no published source'. */
  source: z.string(),
});
export type Finding = z.infer<typeof finding>;
