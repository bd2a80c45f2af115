import type { Settings } from '#shared/api/cuts.ts';
import type { FitResult } from '#shared/api/vocabulary.ts';
import { asSentence, type Check, type FitContext } from '../check.ts';
import type { FitBit } from '../fit-input.ts';
import type { SpindleChoice } from '../spindle-choice.ts';
import { figure } from '../wording.ts';

/** Can the Z axis plunge as fast, keeping the mm a revolution, and can the bit's end plunge at all? */
export const checkPlunge = (
  { machine, practice, wording }: FitContext,
  settings: Settings,
  bit: FitBit | undefined,
  choice: SpindleChoice | null,
): Check => {
  const needMmPerMin = settings.plungeMmPerMin * ((choice?.rpm ?? settings.spindleRpm) / settings.spindleRpm);
  const limit = machine.maxPlungeMmPerMin;
  const shared = `the shared ${wording.feed(settings.plungeMmPerMin)}`;
  let result: FitResult = 'fits';
  let clause = `your machine plunges at ${shared}`;
  if (bit?.canPlunge === false) {
    result = 'fitsIf';
    clause = 'the end of your bit does not cut: ramp it in, never plunge';
  } else if (needMmPerMin > limit * (1 + 1e-9)) {
    result = 'fitsIf';
    clause = `plunge at no more than your machine's ${wording.feed(limit)}, where the cut used ${wording.feed(settings.plungeMmPerMin)}`;
  } else if (
    Math.abs(needMmPerMin - settings.plungeMmPerMin) >
    practice.sameSpeedShare.value * settings.plungeMmPerMin
  ) {
    result = 'fitsIf';
    clause = `plunge at ${wording.feed(needMmPerMin)} in place of ${shared}, for another spindle speed`;
  }
  return {
    id: 'plunge',
    result,
    have: figure(limit),
    need: figure(needMmPerMin),
    unit: 'mm/min',
    sentence: asSentence(clause),
    clause,
  };
};
