import { arcTo, close, curveTo, lineTo, move, slot } from './outline.ts';
import { circle, path, type Sheet } from './sheet.ts';

/** The heel drops 8 mm below the sole to push the work; the closed grip leaves a core that comes loose. */
export const pushShoe: Sheet = {
  key: 'push-shoe',
  widthMm: 240,
  heightMm: 110,
  relativePaths: true,
  borderMm: 5,
  layers: [
    { name: 'hanging hole 10 through', shapes: [circle(22, 84, 10)] },
    { name: 'inside grip through', shapes: [path(slot(173, 38, 203, 64, 27))] },
    {
      name: 'outside',
      shapes: [
        path([
          move(8, 102),
          lineTo(214, 102),
          lineTo(218, 102),
          lineTo(218, 108),
          arcTo(2, false, 220, 110),
          lineTo(234, 110),
          arcTo(6, false, 240, 104),
          lineTo(240, 76),
          curveTo(240, 44, 214, 0, 172, 0),
          curveTo(146, 0, 140, 20, 136, 36),
          curveTo(131, 56, 116, 64, 92, 66),
          lineTo(24, 68),
          curveTo(8, 69, 0, 78, 0, 90),
          lineTo(0, 94),
          arcTo(8, false, 8, 102),
          close,
        ]),
      ],
    },
  ],
};
