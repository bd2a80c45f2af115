import { filleted } from './outline.ts';
import { circle, path, type Sheet } from './sheet.ts';

const holes: readonly (readonly [number, number])[] = [
  [16, 16],
  [16, 92],
  [92, 16],
];

/** The relief hole lets a crisp corner seat. Saved from a page-layout program, hence points. */
export const squareCornerStop: Sheet = {
  key: 'square-corner-stop',
  widthMm: 108,
  heightMm: 108,
  unit: 'pt',
  borderMm: 5,
  layers: [
    { name: 'counterbores 14, 6 deep', shapes: holes.map(([x, y]) => circle(x, y, 14)) },
    { name: 'holes 6.2 through', shapes: holes.map(([x, y]) => circle(x, y, 6.2)) },
    { name: 'corner relief 6.5 through', shapes: [circle(32, 32, 6.5)] },
    {
      name: 'outside',
      shapes: [
        path(
          filleted([
            [0, 0, 8],
            [108, 0, 8],
            [108, 32, 3],
            [32, 32],
            [32, 108, 3],
            [0, 108, 8],
          ]),
        ),
      ],
    },
  ],
};
