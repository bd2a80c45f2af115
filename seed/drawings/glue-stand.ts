import { filleted, slot } from './outline.ts';
import { circle, ellipse, path, type Sheet, upTo } from './sheet.ts';

/** Bottles stand on their caps so that the glue is at the nozzle; brushes and spreaders in front. */
export const glueStand: Sheet = {
  key: 'glue-stand',
  widthMm: 180,
  heightMm: 120,
  relativePaths: true,
  layers: [
    { name: 'pocket 28 deep for bottles', shapes: [circle(44, 42, 56), circle(108, 38, 44)] },
    { name: 'pocket 20 deep for the oval bottle', shapes: [ellipse(154, 42, 32, 56)] },
    {
      name: 'holes 9 deep 24',
      shapes: upTo(6).map((index) => circle(22 + index * 16, 96, 9)),
    },
    {
      name: 'slots 4 for spreaders, 20 deep',
      shapes: [path(slot(122, 88, 166, 88, 4)), path(slot(122, 102, 166, 102, 4))],
    },
    {
      name: 'outside',
      shapes: [
        path(
          filleted([
            [0, 0, 12],
            [180, 0, 12],
            [180, 120, 24],
            [0, 120, 24],
          ]),
        ),
      ],
    },
  ],
};
