import { asSentence, type Check, type FitContext } from '../check.ts';
import type { FitBit } from '../fit-input.ts';
import { figure, listed } from '../wording.ts';

/** Does a collet of the machine hold the bit's shank? A 1/4 in shank in a 6 mm collet is no fit. */
export const checkShank = ({ machine, practice, wording }: FitContext, bit: FitBit): Check => {
  const held = machine.colletsMm.some(
    (colletMm) => Math.abs(colletMm - bit.shankMm) <= practice.colletMm.value + 1e-9,
  );
  const collets = listed(machine.colletsMm.map(wording.diameter));
  const shank = `the ${wording.diameter(bit.shankMm)} shank of your bit`;
  const clause = held
    ? `a collet you have holds ${shank}`
    : `${shank} goes in none of your collets (${collets}), and a near size does not hold it`;
  return {
    id: 'shank',
    result: held ? 'fits' : 'doesNotFit',
    have: listed(machine.colletsMm.map((mm) => String(figure(mm)))),
    need: figure(bit.shankMm),
    unit: 'mm',
    sentence: asSentence(clause),
    clause,
  };
};
