import type { Point } from '#shared/drawing/types.ts';

export interface Extents {
  readonly widthMm: number;
  readonly heightMm: number;
}

/** How far points reach along the direction of `angleRad`, in mm; 0 when there are none. */
const reachAlong = (points: readonly Point[], angleRad: number): number => {
  const alongX = Math.cos(angleRad);
  const alongY = Math.sin(angleRad);
  let least = Number.POSITIVE_INFINITY;
  let most = Number.NEGATIVE_INFINITY;
  for (const { x, y } of points) {
    const along = x * alongX + y * alongY;
    if (along < least) least = along;
    if (along > most) most = along;
  }
  return points.length === 0 ? 0 : most - least;
};

/**
 * Width and height, in mm, of the box around an outline turned by `angleRad`: anticlockwise as it is
 * seen on a page whose y runs down. Only the corners of the hull matter.
 */
export const turnedExtents = (hull: readonly Point[], angleRad: number): Extents => ({
  widthMm: reachAlong(hull, angleRad),
  heightMm: reachAlong(hull, angleRad + Math.PI / 2),
});

/** Width and height as drawn, in mm, without turning: exact, no cosine is taken. */
export const extentsAsDrawn = (points: readonly Point[]): Extents => {
  let minX = Number.POSITIVE_INFINITY;
  let minY = Number.POSITIVE_INFINITY;
  let maxX = Number.NEGATIVE_INFINITY;
  let maxY = Number.NEGATIVE_INFINITY;
  for (const { x, y } of points) {
    if (x < minX) minX = x;
    if (x > maxX) maxX = x;
    if (y < minY) minY = y;
    if (y > maxY) maxY = y;
  }
  return points.length === 0 ? { widthMm: 0, heightMm: 0 } : { widthMm: maxX - minX, heightMm: maxY - minY };
};
