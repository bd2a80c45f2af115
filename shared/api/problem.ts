import { z } from 'zod';

/** RFC 9457 problem document: every error of the API has this shape. */
export const problem = z.object({
  /** Stable dotted code. */
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  requestId: z.string(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  /** The object as it is now, with a 409. */
  current: z.unknown().optional(),
});
export type Problem = z.infer<typeof problem>;
