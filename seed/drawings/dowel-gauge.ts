import { type Corner, filleted } from './outline.ts';
import { circle, path, type Sheet } from './sheet.ts';

/** Diameter in mm and where its centre stands along the gauge. */
const dowels: readonly (readonly [diameterMm: number, xMm: number])[] = [
  [3, 10],
  [4, 20],
  [5, 31],
  [6, 43],
  [8, 57],
  [10, 73],
  [12, 91],
  [15, 112],
];

/** Notches along the lower edge show whether a dowel is round; each has a flat mouth. */
const notches: Corner[] = [...dowels].reverse().flatMap(([diameterMm, xMm]): Corner[] => {
  const half = diameterMm / 2;
  return [
    [xMm + half, 50, 0.8],
    [xMm + half, 50 - diameterMm, half * 0.999],
    [xMm - half, 50 - diameterMm, half * 0.999],
    [xMm - half, 50, 0.8],
  ];
});

export const dowelGauge: Sheet = {
  key: 'dowel-gauge',
  widthMm: 150,
  heightMm: 50,
  layers: [
    {
      name: 'holes for dowels through',
      shapes: dowels.map(([diameterMm, xMm]) => circle(xMm, 16, diameterMm + 0.1)),
    },
    { name: 'hanging hole 8 through', shapes: [circle(137, 25, 8)] },
    {
      name: 'outside',
      shapes: [path(filleted([[0, 0, 4], [150, 0, 12], [150, 50, 12], ...notches, [0, 50, 3]]))],
    },
  ],
};
