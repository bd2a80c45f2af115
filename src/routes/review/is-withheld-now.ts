import type { Design } from '#shared/api/designs.ts';
import type { Flag } from '#shared/api/flags.ts';

type About = Pick<Flag, 'revision' | 'recordId' | 'finding'>;

/** Whether the design, or the revision or record that a flag speaks of, was withheld by a moderator. */
export const isWithheldNow = (design: Design, { revision, recordId, finding }: About): boolean =>
  design.withheld !== undefined ||
  design.revisions.some(({ number, withheld }) => number === revision && withheld !== undefined) ||
  // Settings that only wait for a decision on a finding are let go by dismissing it.
  (finding === undefined &&
    design.cuts.some(({ id, settingsWithheld }) => id === recordId && settingsWithheld !== undefined));
