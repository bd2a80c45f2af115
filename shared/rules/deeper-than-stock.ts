import { fitPractice } from '../fit/practice.ts';
import { formatLength } from '../units/length.ts';
import { commonPractice, findingOf, isPast, type Rule } from './rule.ts';

const length = (mm: number) => formatLength(mm, 'mm', { digits: 2, trim: true });

/** One pass deeper than the stock and its overcut goes into the spoilboard, and past that into the bed. */
export const deeperThanStock: Rule = {
  id: 'deeper-than-stock',
  title: 'Deeper than the stock',
  source: commonPractice,
  check: ({ settings: { depthOfCutMm }, stockThicknessMm }) => {
    const overcutMm = fitPractice.overcutMm.value;
    const limitMm = stockThicknessMm + overcutMm;
    if (!isPast(depthOfCutMm, limitMm)) return [];
    const bedMm = stockThicknessMm + fitPractice.spoilboardMm.value;
    const reachesBed = isPast(depthOfCutMm, bedMm);
    const into = reachesBed
      ? `through a spoilboard of ${length(fitPractice.spoilboardMm.value)} into the bed`
      : 'into the spoilboard';
    return [
      findingOf(deeperThanStock, {
        level: reachesBed ? 'do-not-cut' : 'caution',
        sentence: `One pass of ${length(depthOfCutMm)} in stock of ${length(stockThicknessMm)} goes ${into}: ${length(overcutMm)} below the stock is enough to cut through.`,
        advice: `Set a depth of cut of at most ${length(limitMm)}, and check that the stock was measured in the right unit.`,
        figures: [
          { name: 'depth of cut', value: depthOfCutMm, unit: 'mm' },
          { name: 'stock thickness', value: stockThicknessMm, unit: 'mm' },
          { name: 'overcut', value: overcutMm, unit: 'mm' },
        ],
      }),
    ];
  },
};
