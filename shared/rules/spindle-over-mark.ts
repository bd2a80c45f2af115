import { formatRpm } from '../units/spindle-speed.ts';
import { findingOf, isPast, type Rule } from './rule.ts';

/** A bit that turns faster than its maker marked on it can burst. */
export const spindleOverMark: Rule = {
  id: 'spindle-over-mark',
  title: 'Spindle over the mark on the bit',
  // M: that the standard asks for the mark; the limit itself is what stands on the member's own bit.
  source: 'the greatest speed marked on the bit by its maker (EN 847-2 for shank tools)',
  check: ({ bitMaxRpm, settings: { spindleRpm } }) => {
    if (bitMaxRpm === undefined || !isPast(spindleRpm, bitMaxRpm)) return [];
    return [
      findingOf(spindleOverMark, {
        level: 'do-not-cut',
        sentence: `The spindle is set to ${formatRpm(spindleRpm)}, but the bit is marked for at most ${formatRpm(bitMaxRpm)}: beyond its mark a bit can burst.`,
        advice: `Turn the spindle down to ${formatRpm(bitMaxRpm)} or less, and the feed in the same measure.`,
        figures: [
          { name: 'spindle speed', value: spindleRpm, unit: 'rev/min' },
          { name: 'marked on the bit', value: bitMaxRpm, unit: 'rev/min' },
        ],
      }),
    ];
  },
};
