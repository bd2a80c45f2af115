export interface PointMm {
  readonly x: number;
  readonly y: number;
}

export interface BoundsMm {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}

const corners = ({ minX, minY, maxX, maxY }: BoundsMm): readonly PointMm[] => [
  { x: minX, y: minY },
  { x: maxX, y: minY },
  { x: maxX, y: maxY },
  { x: minX, y: maxY },
];

/**
 * Bounds of a drawing turned anticlockwise as seen (y points down), from its convex hull, which has the
 * same bounds as the drawing at every angle.
 */
export const turnedBounds = (hullMm: readonly PointMm[], boundsMm: BoundsMm, turnDeg: number): BoundsMm => {
  if (turnDeg === 0) return boundsMm;
  const angle = (-turnDeg * Math.PI) / 180;
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  const points = hullMm.length > 0 ? hullMm : corners(boundsMm);
  const xs = points.map(({ x, y }) => x * cos - y * sin);
  const ys = points.map(({ x, y }) => x * sin + y * cos);
  return { minX: Math.min(...xs), minY: Math.min(...ys), maxX: Math.max(...xs), maxY: Math.max(...ys) };
};
