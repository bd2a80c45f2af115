import type { Bit, Machine } from '#shared/api/bench.ts';
import type { DesignListItem } from '#shared/api/designs.ts';
import type { FitResult } from '#shared/api/vocabulary.ts';
import { matchBit, matchResult } from '#shared/fit/bit-match.ts';
import { fitsBed } from '#shared/fit/fits-bed.ts';
import { fitPractice } from '#shared/fit/practice.ts';
import { formatLength } from '#shared/units/length.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { bitSizeWords } from './chips.ts';

export interface CardFit {
  readonly result: FitResult;
  readonly sentence: string;
  readonly turnDeg: number | null;
}

const turnWords = (turnDeg: number): string => {
  if (turnDeg === 0) return 'Fits as drawn';
  if (turnDeg === 90) return 'Fits turned 90°';
  return `Fits only turned ${Math.round(Math.abs(turnDeg))}°`;
};

/** What the drawer lacks for the recorded cut, or null. An empty drawer is not held against a design. */
const lacking = (
  cut: NonNullable<DesignListItem['cut']>,
  bits: readonly Bit[],
  system: UnitSystem,
): string | null => {
  if (bits.length === 0) return null;
  const used = { diameterMm: cut.bitMm, kind: cut.bitKind, flutes: 1 };
  const helps = bits.some(
    (bit) => matchResult(matchBit(used, bit, fitPractice.leastBitShare.value)) !== 'doesNotFit',
  );
  return helps ? null : `needs a ${bitSizeWords(cut.bitMm, system)} bit`;
};

/** The short answer on a card: the bed, and whether a bit for it is in the drawer. */
export const cardFit = (
  item: DesignListItem,
  machine: Machine,
  bits: readonly Bit[],
  system: UnitSystem,
): CardFit => {
  const { turnDeg, overMm } = fitsBed(item.hullMm, item.cut?.bitMm, machine);
  if (turnDeg === null) {
    // Rounded up: a part that is 0.02 mm too large is not 0.0 mm too large.
    const over = formatLength(Math.ceil(overMm * 10 - 1e-9) / 10, system, { trim: true, fractions: false });
    return { result: 'doesNotFit', sentence: `At least ${over} too large for this bed`, turnDeg };
  }
  const lack = item.cut === undefined ? null : lacking(item.cut, bits, system);
  const lies = turnWords(turnDeg);
  return lack === null
    ? { result: 'fits', sentence: lies, turnDeg }
    : { result: 'fitsIf', sentence: `${lies}; ${lack}`, turnDeg };
};
