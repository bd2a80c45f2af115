import { familyOf } from '../cutting/material-family.ts';
import { depthOfCutCapMm } from '../cutting/practice-ranges.ts';
import { trimmed } from '../units/figures.ts';
import { formatLength } from '../units/length.ts';
import { materialWords } from './material-words.ts';
import { commonPractice, findingOf, isPast, type Rule } from './rule.ts';

/** Past this many times the cap, P, a pass is stopped rather than cautioned. */
const STOPPED_BEYOND = 2;
const length = (mm: number) => formatLength(mm, 'mm', { digits: 2, trim: true });

/** A pass too deep for its bit bends or breaks it, or stalls the spindle. */
export const depthOfCut: Rule = {
  id: 'depth-of-cut',
  title: 'Depth of cut over its cap',
  source: commonPractice,
  check: ({ bit, materialId, settings: { depthOfCutMm } }) => {
    const family = familyOf(materialId);
    if (family === null) return [];
    const capMm = depthOfCutCapMm(family, bit);
    if (!isPast(depthOfCutMm, capMm)) return [];
    const isFar = isPast(depthOfCutMm, STOPPED_BEYOND * capMm);
    return [
      findingOf(depthOfCut, {
        level: isFar ? 'do-not-cut' : 'caution',
        sentence: `A pass of ${length(depthOfCutMm)} is ${trimmed(depthOfCutMm / capMm, 1)} times the ${length(capMm)} that is usual for a bit of ${formatLength(bit.diameterMm, 'mm', { digits: 3, trim: true })} in ${materialWords[family]}: the bit bends, and may break.`,
        advice: `Set a depth of cut of at most ${length(capMm)} and make more passes.`,
        figures: [
          { name: 'depth of cut', value: depthOfCutMm, unit: 'mm' },
          { name: 'cap', value: capMm, unit: 'mm' },
          { name: 'bit diameter', value: bit.diameterMm, unit: 'mm' },
        ],
      }),
    ];
  },
};
