import { numeralOne, numeralSeven, numeralTwo } from './numerals.ts';
import { arcTo, close, lineTo, move, type Step } from './outline.ts';
import { circle, path, type Sheet } from './sheet.ts';

/** A plaque with hollow corners, inset from the 260 × 140 board. */
function plaque(insetMm: number, hollowMm: number): Step[] {
  const left = insetMm;
  const top = insetMm;
  const right = 260 - insetMm;
  const bottom = 140 - insetMm;
  return [
    move(left + hollowMm, top),
    lineTo(right - hollowMm, top),
    arcTo(hollowMm, false, right, top + hollowMm),
    lineTo(right, bottom - hollowMm),
    arcTo(hollowMm, false, right - hollowMm, bottom),
    lineTo(left + hollowMm, bottom),
    arcTo(hollowMm, false, left, bottom - hollowMm),
    lineTo(left, top + hollowMm),
    arcTo(hollowMm, false, left + hollowMm, top),
    close,
  ];
}

/** Numerals cut right through an oak board; no numeral with an island, so nothing needs a bridge. */
export const houseNumber: Sheet = {
  key: 'house-number',
  widthMm: 260,
  heightMm: 140,
  borderMm: 10,
  layers: [
    { name: 'border on the line 1.5 deep', shapes: [path(plaque(7, 16))] },
    { name: 'screw holes 4.5 through', shapes: [circle(20, 70, 4.5), circle(240, 70, 4.5)] },
    {
      name: 'inside numerals through',
      shapes: [path(numeralTwo(38, 28)), path(numeralOne(112, 28)), path(numeralSeven(172, 28))],
    },
    { name: 'outside', shapes: [path(plaque(0, 16))] },
  ],
};
