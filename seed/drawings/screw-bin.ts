import { type FingerEdge, fingerPanel, insideCorners } from './finger-joint.ts';
import { slot } from './outline.ts';
import { circle, path, type Sheet } from './sheet.ts';

const sheetMm = 5.6;
const edge = (startsOut: boolean, parts: number): FingerEdge => ({ startsOut, parts });
/** The open rim of the bin: out all along. */
const plain = edge(true, 1);

const side = (yMm: number) =>
  fingerPanel({
    xMm: 0,
    yMm,
    widthMm: 150,
    heightMm: 50,
    sheetMm,
    top: plain,
    right: edge(true, 5),
    bottom: edge(true, 9),
    left: edge(true, 5),
  });

const end = (xMm: number) =>
  fingerPanel({
    xMm,
    yMm: 0,
    widthMm: 50,
    heightMm: 100,
    sheetMm,
    top: edge(false, 5),
    right: plain,
    bottom: edge(false, 5),
    left: edge(true, 7),
  });

const base = fingerPanel({
  xMm: 0,
  yMm: 0,
  widthMm: 150,
  heightMm: 100,
  sheetMm,
  top: edge(false, 9),
  right: edge(false, 7),
  bottom: edge(false, 9),
  left: edge(false, 7),
});

const panels = [base, side(110), side(170), end(160), end(220)];

/** Five panels of a bin for "6 mm" ply that measured 5.6: fingers are as deep as the sheet really is. */
export const screwBin: Sheet = {
  key: 'screw-bin',
  widthMm: 270,
  heightMm: 220,
  borderMm: 8,
  layers: [
    {
      name: 'corner relief 2.5 through',
      shapes: panels.flatMap((panel) => insideCorners(panel).map(([x, y]) => circle(x, y, 2.5))),
    },
    {
      name: 'finger pull through',
      shapes: [path(slot(187, 38, 187, 62, 16)), path(slot(247, 38, 247, 62, 16))],
    },
    { name: 'outside', shapes: panels.map((points) => ({ kind: 'polygon', points })) },
  ],
};
