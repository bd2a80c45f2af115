import { filleted, slot } from './outline.ts';
import { circle, path, type Sheet } from './sheet.ts';

/** A block that is screwed down through its slot, and a wedge at one in eight that is tapped against it. */
export const wedgeHoldDown: Sheet = {
  key: 'wedge-hold-down',
  widthMm: 150,
  heightMm: 92,
  borderMm: 5,
  layers: [
    { name: 'pocket 5 deep for the washer', shapes: [path(slot(28, 19, 92, 19, 19))] },
    { name: 'slot 8.5 through', shapes: [path(slot(28, 19, 92, 19, 8.5))] },
    { name: 'holes 8.5 through', shapes: [circle(126, 17, 8.5), circle(132, 71, 8.5)] },
    {
      name: 'outside',
      shapes: [
        path(
          filleted([
            [0, 0, 5],
            [144, 0, 5],
            [144, 32, 3],
            [0, 50, 3],
          ]),
        ),
        path(
          filleted([
            [0, 76, 3],
            [0, 69.5, 3],
            [150, 52, 3],
            [150, 92, 8],
            [128, 92, 8],
            [112, 76, 12],
          ]),
        ),
      ],
    },
  ],
};
