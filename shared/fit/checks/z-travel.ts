import type { FitResult } from '#shared/api/vocabulary.ts';
import { asSentence, type Check, type FitContext, notKnown } from '../check.ts';
import { cutDepthMm } from '../depth.ts';
import { FIT_TOLERANCE_MM } from '../practice.ts';
import { figure } from '../wording.ts';

/** Can the bit go from above the clamps to the bottom of the cut within the Z travel? */
export const checkZTravel = (context: FitContext): Check => {
  const { machine, practice, wording } = context;
  const depthMm = cutDepthMm(context);
  if (depthMm === undefined) return notKnown('z-travel', 'mm', 'the depth of the cut is not known');
  const clearMm = practice.clearanceMm.value;
  const needMm = depthMm + clearMm + practice.clampTopMm.value;
  const leftForClampsMm = machine.zTravelMm - depthMm - clearMm;
  const deep = `a cut ${wording.length(depthMm)} deep`;
  let result: FitResult = 'fits';
  let clause = `your Z travel of ${wording.length(machine.zTravelMm)} covers ${deep} and ${wording.length(needMm - depthMm)} above the stock to clear clamps`;
  if (leftForClampsMm < -FIT_TOLERANCE_MM) {
    result = 'doesNotFit';
    clause = `your Z travel of ${wording.length(machine.zTravelMm)} is too short for ${deep} and ${wording.length(clearMm)} of clearance above the stock`;
  } else if (needMm > machine.zTravelMm + FIT_TOLERANCE_MM) {
    result = 'fitsIf';
    clause = `for ${deep} your Z travel clears nothing that stands more than ${wording.length(Math.max(0, leftForClampsMm))} above the stock: hold it from the side or with low clamps`;
  }
  return {
    id: 'z-travel',
    result,
    have: figure(machine.zTravelMm),
    need: figure(needMm),
    unit: 'mm',
    sentence: asSentence(`${clause} (clamp height and clearance by common practice)`),
    clause,
  };
};
