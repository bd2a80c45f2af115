import type { BitUsed } from '#shared/api/cuts.ts';
import { matchResult } from '../bit-match.ts';
import { asSentence, type Check, type FitContext, notKnown } from '../check.ts';
import type { ChosenBit } from '../choose-bit.ts';
import { figure } from '../wording.ts';

const sameSize = (used: BitUsed, chosen: ChosenBit, shown: string): string =>
  chosen.match === 'same'
    ? `you have the ${shown} ${used.kind} bit (${chosen.bit.name})`
    : `your ${shown} bit is ${chosen.bit.kind} where the cut was made with ${used.kind}: chips and edges will differ`;

const otherSize = ({ wording }: FitContext, used: BitUsed, chosen: ChosenBit | undefined): string => {
  const lacking = `you have no ${wording.diameter(used.diameterMm)} ${used.kind === 'v-bit' || used.kind === 'ball-nose' ? `${used.kind} ` : ''}bit`;
  if (chosen === undefined) return `${lacking}, nor another that cuts alike`;
  const owned = wording.diameter(chosen.bit.diameterMm);
  if (chosen.match === 'smaller') return `${lacking}: the largest you own that enters every slot is ${owned}`;
  if (chosen.match === 'much-smaller') {
    return `${lacking}: the nearest you own is ${owned}, too small to carry the settings over`;
  }
  return `${lacking}: the nearest you own is ${owned}, which may not enter every slot and corner`;
};

/** Is the bit of the shared cut, or one that can stand in for it, in the drawer? */
export const checkBit = (context: FitContext, used: BitUsed, chosen: ChosenBit | undefined): Check => {
  if (context.bits.length === 0) {
    const why = 'your bit drawer is empty: add your bits to see whether you have the right one';
    return { ...notKnown('bit', 'mm', why, why), need: figure(used.diameterMm) };
  }
  const clause =
    chosen?.match === 'same' || chosen?.match === 'other-kind'
      ? sameSize(used, chosen, context.wording.diameter(used.diameterMm))
      : otherSize(context, used, chosen);
  return {
    id: 'bit',
    result: chosen === undefined ? 'doesNotFit' : matchResult(chosen.match),
    have: chosen === undefined ? null : figure(chosen.bit.diameterMm),
    need: figure(used.diameterMm),
    unit: 'mm',
    sentence: asSentence(clause),
    clause,
  };
};
