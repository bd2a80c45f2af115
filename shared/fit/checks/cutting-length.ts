import { asSentence, type Check, type FitContext, notKnown } from '../check.ts';
import { cutDepthMm } from '../depth.ts';
import type { FitBit } from '../fit-input.ts';
import { FIT_TOLERANCE_MM } from '../practice.ts';
import { figure } from '../wording.ts';

/** Are the bit's flutes as long as the cut is deep? */
export const checkCuttingLength = (context: FitContext, bit: FitBit): Check => {
  const { wording } = context;
  const depthMm = cutDepthMm(context);
  if (depthMm === undefined) return notKnown('cutting-length', 'mm', 'the depth of the cut is not known');
  const longEnough = bit.cuttingLengthMm >= depthMm - FIT_TOLERANCE_MM;
  const flutes = `the ${wording.length(bit.cuttingLengthMm)} cutting length of your bit`;
  const clause = longEnough
    ? `${flutes} covers the ${wording.length(depthMm)} depth`
    : `${flutes} is short of the ${wording.length(depthMm)} depth`;
  return {
    id: 'cutting-length',
    result: longEnough ? 'fits' : 'doesNotFit',
    have: figure(bit.cuttingLengthMm),
    need: figure(depthMm),
    unit: 'mm',
    sentence: asSentence(clause),
    clause,
  };
};
