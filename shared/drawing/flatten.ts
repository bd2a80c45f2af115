import { arcPoint, ellipseAxes } from './arc-point.ts';
import type { Outline, Point, Segment } from './types.ts';

/** No segment becomes more chords than this, however small the error asked for. */
const MAX_CHORDS = 10_000;

/**
 * An outline as chords, nowhere further from the curve than `chordErrorMm`. The points run from the
 * start of the outline; a closed outline does not repeat its first point at the end.
 */
export function flattenOutline(outline: Outline, chordErrorMm: number): Point[] {
  const points: Point[] = [];
  const first = outline.segments[0];
  if (!first) return points;
  points.push(first.from);
  for (const segment of outline.segments) pushChords(segment, chordErrorMm, points);
  const last = points.at(-1);
  const isRepeated =
    last !== undefined && Math.abs(last.x - first.from.x) + Math.abs(last.y - first.from.y) < 2e-6;
  if (outline.closed && points.length > 1 && isRepeated) points.pop();
  return points;
}

/**
 * Chords that a segment needs. A circle takes ⌈2π / (2·acos(1 − e/r))⌉; an ellipse as many as its
 * longer axis would; a Bézier curve √(largest second derivative / 8e), the bound on a chord's error.
 */
export function chordCount(segment: Segment, chordErrorMm: number): number {
  switch (segment.kind) {
    case 'line':
      return 1;
    case 'arc': {
      const share = Math.min(chordErrorMm / ellipseAxes(segment).majorMm, 1);
      return limited(Math.abs(segment.sweepAngleRad) / (2 * Math.acos(1 - share)));
    }
    case 'quadratic':
      return limited(Math.sqrt((2 * bend(segment.from, segment.control, segment.to)) / (8 * chordErrorMm)));
    case 'cubic': {
      const { from, control1, control2, to } = segment;
      const largest = Math.max(bend(from, control1, control2), bend(control1, control2, to));
      return limited(Math.sqrt((6 * largest) / (8 * chordErrorMm)));
    }
  }
}

function limited(count: number): number {
  // A hair is taken off, so that an exact whole number is not rounded up by its last bit.
  return Math.min(MAX_CHORDS, Math.max(1, Math.ceil(count - 1e-9)));
}

function bend(a: Point, b: Point, c: Point): number {
  return Math.hypot(a.x - 2 * b.x + c.x, a.y - 2 * b.y + c.y);
}

function pushChords(segment: Segment, chordErrorMm: number, points: Point[]): void {
  const count = chordCount(segment, chordErrorMm);
  for (let i = 1; i < count; i++) points.push(segmentPoint(segment, i / count));
  points.push(segment.to);
}

/** The point of a segment at `t` from 0 to 1, in mm. */
export function segmentPoint(segment: Segment, t: number): Point {
  const s = 1 - t;
  const { from, to } = segment;
  switch (segment.kind) {
    case 'line':
      return { x: s * from.x + t * to.x, y: s * from.y + t * to.y };
    case 'quadratic': {
      const { control } = segment;
      return {
        x: s * s * from.x + 2 * s * t * control.x + t * t * to.x,
        y: s * s * from.y + 2 * s * t * control.y + t * t * to.y,
      };
    }
    case 'cubic': {
      const { control1, control2 } = segment;
      const b0 = s * s * s;
      const b1 = 3 * s * s * t;
      const b2 = 3 * s * t * t;
      const b3 = t * t * t;
      return {
        x: b0 * from.x + b1 * control1.x + b2 * control2.x + b3 * to.x,
        y: b0 * from.y + b1 * control1.y + b2 * control2.y + b3 * to.y,
      };
    }
    case 'arc':
      return arcPoint(segment, segment.startAngleRad + t * segment.sweepAngleRad);
  }
}
