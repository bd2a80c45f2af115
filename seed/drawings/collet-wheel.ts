import { scalloped } from './outline.ts';
import { circle, path, type Sheet, type SheetShape, upTo } from './sheet.ts';

const holes: SheetShape[] = upTo(8).map((index) => ({
  kind: 'use',
  id: 'collet-hole',
  xMm: 31,
  yMm: 0,
  turnedDeg: index * 45,
}));

/** A wheel for eight collets, turned on a peg: drawn round its own centre, then moved. */
export const colletWheel: Sheet = {
  key: 'collet-wheel',
  widthMm: 90,
  heightMm: 90,
  borderMm: 5,
  reused: [{ id: 'collet-hole', shape: circle(0, 0, 12) }],
  layers: [
    { name: 'holes 12.0 through', movedMm: [45, 45], shapes: holes },
    { name: 'peg hole 8.0 through', shapes: [circle(45, 45, 8)] },
    { name: 'first place mark 3.0 deep', shapes: [circle(45 + 19, 45, 4)] },
    {
      name: 'outside',
      movedMm: [45, 45],
      shapes: [path(scalloped({ xMm: 0, yMm: 0, radiusMm: 45 }, 8, { radiusMm: 9, awayMm: 50 }))],
    },
  ],
};
