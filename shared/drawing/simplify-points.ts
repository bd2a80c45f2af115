import type { Point } from './types.ts';

/**
 * Leaves out points nearer than `toleranceMm` to the chord that replaces them (Douglas and Peucker
 * 1973). A closed ring is cut at its first point and the point furthest from it.
 */
export function simplifyPoints(points: readonly Point[], closed: boolean, toleranceMm: number): Point[] {
  const first = points[0];
  if (!first || points.length < 3) return [...points];
  const chain = closed ? [...points, first] : points;
  const keep = new Uint8Array(chain.length);
  keep[0] = 1;
  keep[chain.length - 1] = 1;
  const spans: [number, number][] = [];
  if (closed) {
    const furthest = furthestFrom(chain, 0, chain.length - 1).index;
    keep[furthest] = 1;
    spans.push([0, furthest], [furthest, chain.length - 1]);
  } else spans.push([0, chain.length - 1]);
  for (let span = spans.pop(); span; span = spans.pop()) {
    const [from, to] = span;
    if (to - from < 2) continue;
    const { index, distance } = furthestFrom(chain, from, to);
    if (distance <= toleranceMm) continue;
    keep[index] = 1;
    spans.push([from, index], [index, to]);
  }
  const kept = chain.filter((_, index) => keep[index] === 1);
  if (closed) kept.pop();
  return kept;
}

/** The point between two others that lies furthest from the chord between them. */
function furthestFrom(
  chain: readonly Point[],
  from: number,
  to: number,
): { index: number; distance: number } {
  const a = chain[from] ?? { x: 0, y: 0 };
  const b = chain[to] ?? a;
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  const squared = dx * dx + dy * dy;
  let index = from + 1;
  let largest = -1;
  for (let i = from + 1; i < to; i++) {
    const point = chain[i] ?? a;
    const px = point.x - a.x;
    const py = point.y - a.y;
    const along = squared === 0 ? 0 : Math.min(1, Math.max(0, (px * dx + py * dy) / squared));
    const ex = px - along * dx;
    const ey = py - along * dy;
    const distance = ex * ex + ey * ey;
    if (distance > largest) {
      largest = distance;
      index = i;
    }
  }
  return { index, distance: Math.sqrt(Math.max(0, largest)) };
}
