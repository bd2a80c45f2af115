import { filleted } from './outline.ts';
import { path, rect, type Sheet } from './sheet.ts';

/** A box cut from one block, and its lid beside it; the rebate round the rim takes the lid's tongue. */
export const pencilBox: Sheet = {
  key: 'pencil-box',
  widthMm: 230,
  heightMm: 156,
  borderMm: 6,
  paintByClass: true,
  layers: [
    { name: 'pocket 3 deep rebate', shapes: [rect(5, 5, 220, 64, 6)] },
    {
      name: 'pocket 22 deep',
      shapes: [rect(9, 9, 150, 26, 4), rect(9, 39, 150, 26, 4), rect(165, 9, 56, 56, 4)],
    },
    {
      name: 'pocket 3 deep round the lid',
      shapes: [
        path([
          ...filleted([
            [0, 82, 8],
            [230, 82, 8],
            [230, 156, 8],
            [0, 156, 8],
          ]),
          ...filleted([
            [5.2, 87.2, 5.8],
            [224.8, 87.2, 5.8],
            [224.8, 150.8, 5.8],
            [5.2, 150.8, 5.8],
          ]),
        ]),
      ],
    },
    { name: 'pocket 2 deep thumb rest', shapes: [rect(95, 109, 40, 20, 10)] },
    { name: 'outside', shapes: [rect(0, 0, 230, 74, 8), rect(0, 82, 230, 74, 8)] },
  ],
};
