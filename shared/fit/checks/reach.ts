import { asSentence, type Check, type FitContext, notKnown } from '../check.ts';
import { cutDepthMm, thicknessMm } from '../depth.ts';
import type { FitBit } from '../fit-input.ts';
import { FIT_TOLERANCE_MM } from '../practice.ts';
import { figure } from '../wording.ts';
import { stickOutMm } from './opening.ts';

/** Does the tip of the bit come down to the bottom of the cut? Heights are above the bed. */
export const checkReach = (context: FitContext, bit: FitBit | undefined): Check => {
  const { machine, practice, wording } = context;
  const depthMm = cutDepthMm(context);
  const stockMm = thicknessMm(context);
  if (depthMm === undefined || stockMm === undefined) {
    return notKnown('reach', 'mm', 'the thickness of the stock is not known');
  }
  const lowestTipMm =
    machine.openingMm - machine.zTravelMm - stickOutMm(depthMm, bit, practice.beyondFlutesMm.value);
  const bottomMm = practice.spoilboardMm.value + stockMm - depthMm;
  const shortMm = lowestTipMm - bottomMm;
  const reaches = shortMm <= FIT_TOLERANCE_MM;
  const clause = reaches
    ? 'the bit comes down to the bottom of the cut'
    : `the bit stops ${wording.length(shortMm)} short of the bottom of the cut: lay that much more under the stock`;
  return {
    id: 'reach',
    result: reaches ? 'fits' : 'fitsIf',
    have: figure(lowestTipMm),
    need: figure(bottomMm),
    unit: 'mm',
    sentence: asSentence(`${clause} (spoilboard and stick-out by common practice)`),
    clause,
  };
};
