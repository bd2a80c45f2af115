import { flattenOutline } from '#shared/drawing/flatten.ts';
import type { Bounds, Drawing, DrawingShape, Point } from '#shared/drawing/types.ts';
import { convexHull } from '#shared/geometry/convex-hull.ts';

/** Furthest that a curve may bulge over its chord: as fine as the fit's own tolerance. */
const chordErrorMm = 0.01;
/** The same as a part of the longer side, so that a huge circle is not cut into a million chords. */
const chordErrorOfSide = 2e-5;
/** List items carry the hull, so its numbers are short: a ten-thousandth of a millimetre. */
const stepsPerMm = 1e4;

/** The corners of the convex outline around a drawing, in page millimetres; as wide and high as its bounds. */
export function drawingHull({ shapes, boundsMm, widthMm, heightMm }: Drawing): Point[] {
  const errorMm = Math.max(chordErrorMm, Math.max(widthMm, heightMm) * chordErrorOfSide);
  let hull: Point[] = [];
  // The largest first: most others then lie inside and need no chords.
  for (const shape of [...shapes].sort((a, b) => boxSize(b.boundsMm) - boxSize(a.boundsMm))) {
    if (corners(shape.boundsMm).every((corner) => isInside(hull, corner))) continue;
    hull = convexHull([...hull, ...points(shape, errorMm)]);
  }
  const rounded = hull.map(({ x, y }) => ({ x: round(x), y: round(y) }));
  return convexHull(widened(rounded, boundsMm));
}

const points = (shape: DrawingShape, errorMm: number): Point[] =>
  shape.outlines.flatMap((outline) => convexHull(flattenOutline(outline, errorMm)));

const boxSize = ({ minX, minY, maxX, maxY }: Bounds): number => maxX - minX + maxY - minY;

const corners = ({ minX, minY, maxX, maxY }: Bounds): Point[] => [
  { x: minX, y: minY },
  { x: maxX, y: minY },
  { x: maxX, y: maxY },
  { x: minX, y: maxY },
];

const round = (mm: number): number => Math.round(mm * stepsPerMm) / stepsPerMm;

/** Corners of a hull run from +x towards +y: inside is on the same side of every edge. */
function isInside(hull: readonly Point[], { x, y }: Point): boolean {
  if (hull.length < 3) return false;
  let from = hull.at(-1) as Point;
  for (const to of hull) {
    if ((to.x - from.x) * (y - from.y) - (to.y - from.y) * (x - from.x) < 0) return false;
    from = to;
  }
  return true;
}

/** Chords and rounding take a hair off the outermost corners; the bounds are exact and give it back. */
function widened(hull: readonly Point[], { minX, minY, maxX, maxY }: Bounds): Point[] {
  const xs = hull.map(({ x }) => x);
  const ys = hull.map(({ y }) => y);
  const [west, east] = [Math.min(...xs), Math.max(...xs)];
  const [north, south] = [Math.min(...ys), Math.max(...ys)];
  return hull.map(({ x, y }) => ({
    x: x === west ? minX : x === east ? maxX : x,
    y: y === north ? minY : y === south ? maxY : y,
  }));
}
