import type { BitUsed, Settings } from '#shared/api/cuts.ts';
import { formatRpm } from '#shared/units/spindle-speed.ts';
import { asSentence, type Check, type FitContext } from '../check.ts';
import type { FitBit } from '../fit-input.ts';
import { type SpindleChoice, slowestRpm } from '../spindle-choice.ts';
import { figure, listed } from '../wording.ts';

/**
 * The feed, in mm/min, that takes the same chip a tooth at another speed or with fewer flutes, and a
 * thinner one in proportion with a smaller bit: chip load = feed / (spindle speed × flutes). More
 * flutes do not raise it: whether the machine has the power for that is the retune's question.
 */
export const feedForSameChip = (
  settings: Settings,
  used: BitUsed | undefined,
  bit: FitBit | undefined,
  rpm: number,
): number => {
  const flutesShare = used === undefined || bit === undefined ? 1 : Math.min(1, bit.flutes / used.flutes);
  const sizeShare =
    used === undefined || bit === undefined ? 1 : Math.min(1, bit.diameterMm / used.diameterMm);
  return settings.feedMmPerMin * (rpm / settings.spindleRpm) * flutesShare * sizeShare;
};

/** Can the machine feed fast enough, and what feed keeps the chip when speed, flutes or bit differ? */
export const checkFeed = (
  context: FitContext,
  settings: Settings,
  bit: FitBit | undefined,
  choice: SpindleChoice | null,
): Check => {
  const { machine, practice, wording, bit: used } = context;
  const rpm = choice?.rpm ?? settings.spindleRpm;
  const needMmPerMin = feedForSameChip(settings, used, bit, rpm);
  const limit = machine.maxFeedMmPerMin;
  const share = practice.sameSpeedShare.value;
  const differs = (a: number, b: number): boolean => Math.abs(a - b) > share * b;
  const shared = `the shared ${wording.feed(settings.feedMmPerMin)}`;
  let result: Check['result'] = 'fits';
  let clause = `your machine feeds at ${shared}`;
  if (needMmPerMin > limit * (1 + 1e-9)) {
    result = 'fitsIf';
    const slowerRpm = (rpm * limit) / needMmPerMin;
    clause =
      slowerRpm >= slowestRpm(machine.spindle)
        ? `your machine feeds at most ${wording.feed(limit)}: with the spindle at about ${formatRpm(slowerRpm)} that takes the same chip as ${shared}`
        : `your machine feeds at most ${wording.feed(limit)}, which takes a thinner chip than ${shared} did: look out for rubbing and heat`;
  } else if (differs(needMmPerMin, settings.feedMmPerMin)) {
    result = 'fitsIf';
    const reasons = [
      ...(differs(rpm, settings.spindleRpm) ? ['spindle speed'] : []),
      ...(used !== undefined && bit !== undefined && bit.flutes < used.flutes ? ['number of flutes'] : []),
      ...(used !== undefined && bit !== undefined && differs(bit.diameterMm, used.diameterMm)
        ? ['bit diameter']
        : []),
    ];
    clause = `feed at ${wording.feed(needMmPerMin)} in place of ${shared}, for another ${listed(reasons)}`;
  } else if (used !== undefined && bit !== undefined && bit.flutes > used.flutes) {
    result = 'fitsIf';
    clause = `at ${shared} the ${bit.flutes} flutes of your bit take a thinner chip than the ${used.flutes} of the cut: look out for rubbing and heat`;
  }
  return {
    id: 'feed',
    result,
    have: figure(limit),
    need: figure(needMmPerMin),
    unit: 'mm/min',
    sentence: asSentence(clause),
    clause,
  };
};
