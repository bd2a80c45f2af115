import { circle, rect, type Sheet, upTo } from './sheet.ts';

const row = (yMm: number) => [
  ...upTo(5).map((index) => circle(18 + index * 17, yMm, 6.5)),
  ...upTo(4).map((index) => circle(106 + index * 16, yMm, 3.3)),
];

/** Eighteen bits in two rows, a dish for collet nuts and two trays for keys and spanners. */
export const shankDrawer: Sheet = {
  key: 'shank-drawer',
  widthMm: 240,
  heightMm: 110,
  borderMm: 5,
  layers: [
    {
      name: 'pocket 9 deep',
      shapes: [rect(14, 60, 170, 38, 4), rect(194, 60, 32, 38, 4), circle(206, 30, 34)],
    },
    { name: 'holes for shanks 12 deep', shapes: [...row(22), ...row(42)] },
    { name: 'outside', shapes: [rect(0, 0, 240, 110, 6)] },
  ],
};
