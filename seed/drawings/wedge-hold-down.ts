import { filleted, slot } from './outline.ts';
import { circle, path, type Sheet } from './sheet.ts';

interface WedgeSet {
  readonly key: string;
  /** How much longer than the first block and wedge. */
  readonly longerMm: number;
}

/** A block that is screwed down through its slot, and a wedge at one in eight that is tapped against it. */
function wedgeSet({ key, longerMm }: WedgeSet): Sheet {
  // The slope stays one in eight: a longer piece is higher at its thick end.
  const riseMm = longerMm / 8;
  return {
    key,
    widthMm: 150 + longerMm,
    heightMm: 92 + riseMm * 2,
    borderMm: 5,
    layers: [
      { name: 'pocket 5 deep for the washer', shapes: [path(slot(28, 19, 92 + longerMm, 19, 19))] },
      { name: 'slot 8.5 through', shapes: [path(slot(28, 19, 92 + longerMm, 19, 8.5))] },
      {
        name: 'holes 8.5 through',
        shapes: [circle(126 + longerMm, 17, 8.5), circle(132 + longerMm, 71 + riseMm * 2, 8.5)],
      },
      {
        name: 'outside',
        shapes: [
          path(
            filleted([
              [0, 0, 5],
              [144 + longerMm, 0, 5],
              [144 + longerMm, 32, 3],
              [0, 50 + riseMm, 3],
            ]),
          ),
          path(
            filleted([
              [0, 76 + riseMm * 2, 3],
              [0, 69.5 + riseMm * 2, 3],
              [150 + longerMm, 52 + riseMm, 3],
              [150 + longerMm, 92 + riseMm * 2, 8],
              [128 + longerMm, 92 + riseMm * 2, 8],
              [112 + longerMm, 76 + riseMm * 2, 12],
            ]),
          ),
        ],
      },
    ],
  };
}

export const wedgeHoldDown = wedgeSet({ key: 'wedge-hold-down', longerMm: 0 });
/** A remix for beds with screws further apart. */
export const wedgeHoldDownLong = wedgeSet({ key: 'wedge-hold-down-long', longerMm: 48 });
