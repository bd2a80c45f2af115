import { filleted } from './outline.ts';
import { circle, path, type Sheet } from './sheet.ts';

const screws: readonly (readonly [number, number])[] = [
  [32, 50],
  [148, 50],
];

/** Holds an 18 mm panel upright. The counterbores go 15 deep and leave a 3 mm shoulder. */
export const panelFoot: Sheet = {
  key: 'panel-foot',
  widthMm: 180,
  heightMm: 70,
  relativePaths: true,
  layers: [
    { name: 'counterbores 15 deep', shapes: screws.map(([x, y]) => circle(x, y, 16)) },
    { name: 'screw holes 6.5 through', shapes: screws.map(([x, y]) => circle(x, y, 6.5)) },
    {
      name: 'outside',
      shapes: [
        path(
          filleted([
            [64, 0, 8],
            [80.9, 0, 1],
            [80.9, 34, 3.2],
            [99.1, 34, 3.2],
            [99.1, 0, 1],
            [116, 0, 8],
            [128, 34, 14],
            [180, 38, 10],
            [180, 70, 4],
            [142, 70, 4],
            [136, 64, 6],
            [44, 64, 6],
            [38, 70, 4],
            [0, 70, 4],
            [0, 38, 10],
            [52, 34, 14],
          ]),
        ),
      ],
    },
  ],
};
