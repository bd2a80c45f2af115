import type { Design } from '#shared/api/designs.ts';
import type { Flag } from '#shared/api/flags.ts';

type About = Pick<Flag, 'revision' | 'recordId'>;

/** Whether the design, or the revision or record that a flag speaks of, is withheld. */
export const isWithheldNow = (design: Design, { revision, recordId }: About): boolean =>
  design.withheld !== undefined ||
  design.revisions.some(({ number, withheld }) => number === revision && withheld !== undefined) ||
  design.cuts.some(({ id, settingsWithheld }) => id === recordId && settingsWithheld !== undefined);
