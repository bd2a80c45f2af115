import type { FitResult } from '#shared/api/vocabulary.ts';
import { asSentence, type Check, type FitContext, notKnown } from '../check.ts';
import { cutDepthMm, thicknessMm } from '../depth.ts';
import type { FitBit } from '../fit-input.ts';
import { FIT_TOLERANCE_MM } from '../practice.ts';
import { figure } from '../wording.ts';

/** How far the bit stands out of the collet, in mm: its flutes and a little more, or the cut's depth. */
export const stickOutMm = (depthMm: number, bit: FitBit | undefined, beyondFlutesMm: number): number =>
  Math.max(depthMm, bit?.cuttingLengthMm ?? 0) + beyondFlutesMm;

/** Do spoilboard, stock and the bit's stick-out go under the collet with Z at the top? */
export const checkOpening = (context: FitContext, bit: FitBit | undefined): Check => {
  const { machine, practice, wording } = context;
  const depthMm = cutDepthMm(context);
  const stockMm = thicknessMm(context);
  if (depthMm === undefined || stockMm === undefined) {
    return notKnown('opening', 'mm', 'the thickness of the stock is not known');
  }
  const outMm = stickOutMm(depthMm, bit, practice.beyondFlutesMm.value);
  const needMm = practice.spoilboardMm.value + stockMm + outMm;
  const sheetLeftMm = machine.openingMm - stockMm - outMm;
  const parts = `${wording.length(stockMm)} of stock and ${wording.length(outMm)} of bit`;
  let result: FitResult = 'fits';
  let clause = `${parts} over a ${wording.length(practice.spoilboardMm.value)} spoilboard go under your collet`;
  if (sheetLeftMm < practice.leastSheetMm.value - FIT_TOLERANCE_MM) {
    result = 'doesNotFit';
    clause = `${parts} leave no room for a spoilboard in your opening of ${wording.length(machine.openingMm)}`;
  } else if (needMm > machine.openingMm + FIT_TOLERANCE_MM) {
    result = 'fitsIf';
    clause = `the spoilboard must be at most ${wording.length(sheetLeftMm)} thick: ${parts} take the rest of your opening`;
  }
  return {
    id: 'opening',
    result,
    have: figure(machine.openingMm),
    need: figure(needMm),
    unit: 'mm',
    sentence: asSentence(`${clause} (spoilboard and stick-out by common practice)`),
    clause,
  };
};
