import { filleted, slot } from './outline.ts';
import { path, type Sheet } from './sheet.ts';

const outside = filleted([
  [0, 0, 6],
  [110, 0, 6],
  [110, 65, 6],
  [0, 65, 6],
]);

/** Two 3.0 slots take the folded ends of the paper; the pocket lightens it and gives a grip. */
export const sandingBlock: Sheet = {
  key: 'sanding-block',
  widthMm: 110,
  heightMm: 65,
  relativePaths: true,
  borderMm: 2,
  layers: [
    {
      name: 'pocket 9 deep',
      shapes: [path(slot(39, 20.5, 71, 20.5, 19)), path(slot(39, 44.5, 71, 44.5, 19))],
    },
    {
      name: 'slots 3.0 through',
      shapes: [path(slot(12, 8, 12, 57, 3)), path(slot(98, 8, 98, 57, 3))],
    },
    { name: 'outside', shapes: [path(outside)] },
  ],
};
