import { arcTo, close, lineTo, move, type Step } from './outline.ts';
import { circle, path, type Sheet, upTo } from './sheet.ts';

/** Round corners of 6, 10, 16 and 24, and in the middle of each side the hollow of the same size. */
const outline: Step[] = [
  move(6, 0),
  lineTo(44, 0),
  arcTo(6, false, 56, 0),
  lineTo(90, 0),
  arcTo(10, true, 100, 10),
  lineTo(100, 37),
  arcTo(10, false, 100, 57),
  lineTo(100, 84),
  arcTo(16, true, 84, 100),
  lineTo(71, 100),
  arcTo(16, false, 39, 100),
  lineTo(24, 100),
  arcTo(24, true, 0, 76),
  lineTo(0, 66),
  arcTo(24, false, 0, 18),
  lineTo(0, 6),
  arcTo(6, true, 6, 0),
  close,
];

/** Dots beside each corner count which of the four it is. */
const dots: readonly (readonly [number, number])[] = [
  [12, 9],
  [80, 9],
  [80, 86],
  [22, 86],
];

export const radiusGauge: Sheet = {
  key: 'radius-gauge',
  widthMm: 100,
  heightMm: 100,
  relativePaths: true,
  borderMm: 5,
  layers: [
    {
      name: 'counting dots 1.0 deep',
      shapes: dots.flatMap(([x, y], corner) => upTo(corner + 1).map((dot) => circle(x + dot * 3.6, y, 2))),
    },
    { name: 'finger hole 22 through', shapes: [circle(54, 50, 22)] },
    { name: 'outside', shapes: [path(outline)] },
  ],
};
