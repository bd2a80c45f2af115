import { type Corner, filleted } from './outline.ts';
import { circle, path, type Sheet, upTo } from './sheet.ts';

const widthsMm = [3, 4, 5, 6, 7, 8, 9];

/** Slots open at the top, each `widthMm` wide, 36 deep, with a small flat bottom as the bit leaves it. */
const slots: Corner[] = widthsMm.flatMap((widthMm, index): Corner[] => {
  const middle = 19 + index * 17.5;
  const half = widthMm / 2;
  return [
    [middle - half, 0],
    [middle - half, 36, 1.2],
    [middle + half, 36, 1.2],
    [middle + half, 0],
  ];
});

export const slotGauge: Sheet = {
  key: 'slot-gauge',
  widthMm: 150,
  heightMm: 60,
  borderMm: 5,
  layers: [
    {
      name: 'counting dots 1.0 deep',
      shapes: widthsMm.flatMap((count, index) =>
        upTo(count).map((dot) =>
          circle(19 + index * 17.5 + ((dot % 3) - 1) * 3.4, 43 + Math.floor(dot / 3) * 3.6, 2),
        ),
      ),
    },
    { name: 'hanging hole 6 through', shapes: [circle(142, 52, 6)] },
    {
      name: 'outside',
      shapes: [path(filleted([[0, 0, 2], ...slots, [150, 0, 2], [150, 60, 6], [0, 60, 6]]))],
    },
  ],
};
