import type { BitUsed } from '#shared/api/cuts.ts';
import { type BitMatch, bitMatches, matchBit, matchResult } from './bit-match.ts';
import { type FitContext, severity } from './check.ts';
import { checkCuttingLength } from './checks/cutting-length.ts';
import { checkShank } from './checks/shank.ts';
import type { FitBit } from './fit-input.ts';

export interface ChosenBit {
  readonly bit: FitBit;
  readonly match: BitMatch;
  /** False when it only is the nearest there is, and the cut should not be tried with it. */
  readonly usable: boolean;
}

/** What makes one owned bit a worse choice than another, weightiest first. */
const drawbacks = (context: FitContext, used: BitUsed, { bit, match }: ChosenBit): readonly number[] => [
  // The worst of the three answers that hang on the bit: a nearer bit that is too short helps nobody.
  Math.max(
    severity(matchResult(match)),
    severity(checkCuttingLength(context, bit).result),
    severity(checkShank(context, bit).result),
  ),
  bitMatches.indexOf(match),
  Math.abs(bit.diameterMm - used.diameterMm),
  Math.abs(bit.flutes - used.flutes),
  // Of two that are long enough, the shorter one bends less.
  bit.cuttingLengthMm,
];

const compare = (a: readonly number[], b: readonly number[]): number => {
  for (const [at, left] of a.entries()) {
    const difference = left - (b[at] ?? 0);
    if (Math.abs(difference) > 1e-9) return difference;
  }
  return 0;
};

/** The bit of the drawer to make the cut with, or the nearest to it; undefined when none is like it. */
export const chooseBit = (context: FitContext, used: BitUsed): ChosenBit | undefined =>
  context.bits
    .map((bit): ChosenBit => {
      const match = matchBit(used, bit, context.practice.leastBitShare.value);
      return { bit, match, usable: matchResult(match) !== 'doesNotFit' };
    })
    .filter(({ match }) => match !== 'unlike')
    .map((choice) => ({ choice, against: drawbacks(context, used, choice) }))
    .sort((a, b) => compare(a.against, b.against))[0]?.choice;
