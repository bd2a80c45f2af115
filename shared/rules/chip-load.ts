import type { MaterialFamily } from '../api/vocabulary.ts';
import { chipLoadMm } from '../cutting/chip-load.ts';
import { effectiveFeedMmPerMin } from '../cutting/effective-feed.ts';
import { familyOf } from '../cutting/material-family.ts';
import { chipLoadRange } from '../cutting/practice-ranges.ts';
import { formatFeed } from '../units/feed.ts';
import { trimmed } from '../units/figures.ts';
import { formatRpm } from '../units/spindle-speed.ts';
import { materialWords } from './material-words.ts';
import { commonPractice, findingOf, isPast, type Rule } from './rule.ts';

/** P: beyond twice the top, or below a third of the bottom, settings are stopped rather than cautioned. */
const STOPPED_ABOVE = 2;
const STOPPED_BELOW = 1 / 3;

/**
 * Where a chip too thin ruins bit or part at once, it may be stopped; elsewhere it is at most a caution, since light
 * machines, engraving and finishing passes feed slowly and come out well. P.
 */
const rubbingIsStopped: ReadonlySet<MaterialFamily> = new Set(['acrylic', 'soft-plastic', 'aluminium']);

/** Fine enough that a figure just past its limit does not read as the limit. */
const figure = (mm: number) => trimmed(mm, 4);

const whatRubbingDoes: Readonly<Record<MaterialFamily, string>> = {
  softwood: 'the bit rubs, heats and burns the wood, and a hot chip sets fire to the dust',
  hardwood: 'the bit rubs, heats and burns the wood, and a hot chip sets fire to the dust',
  plywood: 'the bit rubs, heats and burns the wood, and a hot chip sets fire to the dust',
  mdf: 'the bit rubs and heats, and fine dust smoulders: a fire in the dust bin starts so',
  acrylic: 'the bit rubs, and the acrylic melts and welds itself to it',
  'soft-plastic': 'the bit rubs, and the plastic melts and wraps itself round it',
  aluminium: 'the bit rubs, heats, and aluminium welds itself to its edges until it breaks',
};

/** A chip too thin is rubbed off instead of cut; one too thick breaks the bit or tears the part loose. */
export const chipLoad: Rule = {
  id: 'chip-load',
  title: 'Chip load outside its range',
  source: commonPractice,
  check: ({ bit, materialId, settings, overridePercent }) => {
    const family = familyOf(materialId);
    if (family === null) return [];
    const feedMmPerMin = effectiveFeedMmPerMin(settings, overridePercent);
    const mm = chipLoadMm(bit, { ...settings, feedMmPerMin });
    const { leastMm, mostMm } = chipLoadRange(family, bit);
    const isLow = isPast(leastMm, mm);
    if (!isLow && !isPast(mm, mostMm)) return [];
    const isFar = isLow
      ? rubbingIsStopped.has(family) && isPast(leastMm * STOPPED_BELOW, mm)
      : isPast(mm, mostMm * STOPPED_ABOVE);
    const isOverridden = feedMmPerMin !== settings.feedMmPerMin;
    const override = isOverridden ? ` with an override of ${overridePercent} %` : '';
    const included = isOverridden ? ', override included' : '';
    const usual = `${figure(leastMm)} to ${figure(mostMm)} usual for this bit in ${materialWords[family]}`;
    const set = `${formatFeed(settings.feedMmPerMin, 'mm')}${override} at ${formatRpm(settings.spindleRpm)} with ${bit.flutes} ${bit.flutes === 1 ? 'flute' : 'flutes'}`;
    const feedAtLimit = formatFeed((isLow ? leastMm : mostMm) * settings.spindleRpm * bit.flutes, 'mm');
    return [
      findingOf(chipLoad, {
        level: isFar ? 'do-not-cut' : 'caution',
        sentence: `${set} is a chip load of ${figure(mm)} mm a tooth, ${isLow ? 'below' : 'above'} the ${usual}: ${
          isLow ? whatRubbingDoes[family] : 'the bit is overloaded, may break, and can tear the part loose'
        }.`,
        advice: isLow
          ? `Feed at ${feedAtLimit} or more${included}, or turn the spindle down.`
          : `Feed at ${feedAtLimit} or less${included}, or turn the spindle up within the mark on the bit.`,
        figures: [
          { name: 'chip load', value: mm, unit: 'mm' },
          { name: 'least usual', value: leastMm, unit: 'mm' },
          { name: 'most usual', value: mostMm, unit: 'mm' },
        ],
      }),
    ];
  },
};
