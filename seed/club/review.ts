import type { SeedFlag } from './types.ts';

/** What was called to the moderators' attention, oldest first. */
export const flags: readonly SeedFlag[] = [
  {
    design: 'panel-foot',
    by: 'fern',
    raisedAt: '2026-07-18T19:20:00Z',
    reason:
      'The counterbore leaves 3 mm under the screw head. Mine cracked through with a cabinet on it, and it fell on my bench.',
    decision: {
      by: 'moss',
      decidedAt: '2026-07-19T08:05:00Z',
      action: 'withholdRevision',
      reason:
        'Only 3 mm of wood is left under the fastener, and a foot broke in use. Wants a counterbore of at most 9.',
    },
  },
  {
    design: 'cable-comb',
    by: 'sorrel',
    raisedAt: '2026-11-20T17:45:00Z',
    reason:
      'Three of my fingers snapped while I was still sanding. The grain has to run along them, and the sheet does not say so.',
  },
];
