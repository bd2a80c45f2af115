import { type Corner, filleted, scalloped, scallopHalfAngleRad } from './outline.ts';
import { circle, path, type Sheet, upTo } from './sheet.ts';

const rimMm = 27;
const scallop = { radiusMm: 11, awayMm: 33 };
/** Lobes lie left and right; up and down the outermost points are the corners beside a scallop. */
const heightMm =
  2 * rimMm * Math.sin(Math.PI / 2 - scallopHalfAngleRad(rimMm, scallop.radiusMm, scallop.awayMm));
const middle = { xMm: rimMm, yMm: heightMm / 2, radiusMm: rimMm };

/** A nut 13 across flats, with 0.2 clearance; the corners of its pocket are drilled 3.0 so that it seats. */
const nutCorners = upTo(6).map((index): Corner => {
  const angle = (index * Math.PI) / 3;
  const outMm = 13.2 / Math.sqrt(3);
  return [middle.xMm + outMm * Math.cos(angle), middle.yMm + outMm * Math.sin(angle)];
});

/** Six lobes, exported in pixels at 96 an inch: the scale has to be stated when it is shared. */
export const spoilboardKnob: Sheet = {
  key: 'spoilboard-knob',
  widthMm: 2 * rimMm,
  heightMm,
  unit: 'px',
  borderMm: 5,
  layers: [
    { name: 'pocket 7 deep for an M8 nut', shapes: [path(filleted(nutCorners))] },
    { name: 'corner relief 3.0, 7 deep', shapes: nutCorners.map(([x, y]) => circle(x, y, 3)) },
    { name: 'hole 8.2 through', shapes: [circle(middle.xMm, middle.yMm, 8.2)] },
    { name: 'outside', shapes: [path(scalloped(middle, 6, scallop))] },
  ],
};
