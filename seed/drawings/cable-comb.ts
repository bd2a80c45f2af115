import { arcTo, close, lineTo, move, type Step } from './outline.ts';
import { circle, path, type Sheet, upTo } from './sheet.ts';

const slotMm = 8;
const fingerMm = 2.5;
const slots = 19;
const firstSlotMm = (220 - slots * slotMm - (slots - 1) * fingerMm) / 2;

/** Nineteen slots with round bottoms; what is left between two of them is a 2.5 mm finger. */
const teeth: Step[] = upTo(slots)
  .reverse()
  .flatMap((index) => {
    const leftMm = firstSlotMm + index * (slotMm + fingerMm);
    return [
      lineTo(leftMm + slotMm, 40),
      lineTo(leftMm + slotMm, 18),
      arcTo(slotMm / 2, false, leftMm, 18),
      lineTo(leftMm, 40),
    ];
  });

export const cableComb: Sheet = {
  key: 'cable-comb',
  widthMm: 220,
  heightMm: 40,
  borderMm: 4,
  layers: [
    { name: 'holes 4.5 through', shapes: [circle(5.8, 7, 4.5), circle(110, 7, 4.5), circle(214.2, 7, 4.5)] },
    {
      name: 'outside',
      shapes: [
        path([
          move(4, 0),
          lineTo(216, 0),
          arcTo(4, true, 220, 4),
          lineTo(220, 36),
          arcTo(4, true, 216, 40),
          ...teeth,
          lineTo(4, 40),
          arcTo(4, true, 0, 36),
          lineTo(0, 4),
          arcTo(4, true, 4, 0),
          close,
        ]),
      ],
    },
  ],
};
