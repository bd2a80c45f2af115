import type { Point } from '#shared/drawing/types.ts';

const turn = (a: Point, b: Point, c: Point): number => (b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x);

/** One chain of the hull, from the first to the last of points sorted along x. */
const chain = (sorted: readonly Point[]): Point[] => {
  const kept: Point[] = [];
  for (const point of sorted) {
    for (;;) {
      const before = kept.at(-2);
      const last = kept.at(-1);
      if (before === undefined || last === undefined || turn(before, last, point) > 0) break;
      kept.pop();
    }
    kept.push(point);
  }
  return kept;
};

/**
 * The corners of the smallest convex outline around points, in mm (monotone chain, Andrew 1979).
 * The corners run from +x towards +y and none lies on a straight edge. Points on one line give its
 * two ends, a single point itself, no points nothing.
 */
export const convexHull = (points: readonly Point[]): Point[] => {
  const sorted = [...points]
    .sort((a, b) => a.x - b.x || a.y - b.y)
    .filter((point, at, all) => {
      const before = all[at - 1];
      return before === undefined || before.x !== point.x || before.y !== point.y;
    });
  if (sorted.length < 3) return sorted;
  return [...chain(sorted).slice(0, -1), ...chain(sorted.toReversed()).slice(0, -1)];
};
