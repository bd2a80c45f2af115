import { filleted } from './outline.ts';
import { circle, path, rect, type Sheet } from './sheet.ts';

const corners: readonly (readonly [number, number])[] = [
  [12, 12],
  [148, 12],
  [12, 148],
  [148, 148],
];

/** One half of a sliding gate for a 100 mm hose: the blade runs in the pocket and out at the top. */
export const hoseGate: Sheet = {
  key: 'hose-gate',
  widthMm: 160,
  heightMm: 160,
  borderMm: 5,
  paintByClass: true,
  layers: [
    {
      name: 'pocket 3.2 deep for the blade',
      shapes: [
        path(
          filleted([
            [22, 0],
            [138, 0],
            [138, 140, 20],
            [22, 140, 20],
          ]),
        ),
      ],
    },
    { name: 'bore 101 through', shapes: [circle(80, 82, 101)] },
    { name: 'holes 5.2 through', shapes: corners.map(([x, y]) => circle(x, y, 5.2)) },
    { name: 'outside', shapes: [rect(0, 0, 160, 160, 10)] },
  ],
};
