import { arcPoint, ellipseAxes } from './arc-point.ts';
import type { ArcSegment, DrawingShape, Outline, Point } from './types.ts';

const QUARTER = Math.PI / 2;
/** A shorter half axis under this is written as straight lines: no reader could find its centre again. */
const FLAT_ELLIPSE_MM = 1e-4;

/** Below this a number would be written with an exponent. */
const LEAST_PLAIN = 1e-6;

/** A number with at most nine decimals, never in exponent form within ±1e6, and never −0. */
export function formatMm(value: number): string {
  const rounded = Math.round(value * 1e9) / 1e9 + 0;
  return rounded !== 0 && Math.abs(rounded) < LEAST_PLAIN
    ? rounded.toFixed(9).replace(/0+$/, '')
    : String(rounded);
}

function pair({ x, y }: Point): string {
  return `${formatMm(x)} ${formatMm(y)}`;
}

/**
 * Path data of one outline in page millimetres, at most nine decimals. Arcs are written in pieces of at
 * most a quarter turn, and so finely, because a rounded end moves the centre of a half circle, or of a long
 * thin ellipse, by many times the rounding.
 */
export function outlineToPathData(outline: Outline): string {
  const first = outline.segments[0];
  if (!first) return '';
  const parts = [`M${pair(first.from)}`];
  const last = outline.segments.at(-1);
  for (const segment of outline.segments) {
    switch (segment.kind) {
      case 'line':
        // The closing line is what Z draws.
        if (outline.closed && segment === last && segment !== first && isSame(segment.to, first.from)) break;
        parts.push(`L${pair(segment.to)}`);
        break;
      case 'quadratic':
        parts.push(`Q${pair(segment.control)} ${pair(segment.to)}`);
        break;
      case 'cubic':
        parts.push(`C${pair(segment.control1)} ${pair(segment.control2)} ${pair(segment.to)}`);
        break;
      case 'arc':
        pushArc(segment, parts);
    }
  }
  if (outline.closed) parts.push('Z');
  return parts.join('');
}

/** Path data of all outlines of a shape. */
export function shapeToPathData(shape: Pick<DrawingShape, 'outlines'>): string {
  return shape.outlines.map(outlineToPathData).join('');
}

function isSame(a: Point, b: Point): boolean {
  return a.x === b.x && a.y === b.y;
}

function pushArc(arc: ArcSegment, parts: string[]): void {
  const { majorMm, minorMm, rotationRad, majorAtRad, isPositive } = ellipseAxes(arc);
  const { startAngleRad, sweepAngleRad } = arc;
  if (minorMm < FLAT_ELLIPSE_MM) {
    for (const angle of turnsWithin(majorAtRad, startAngleRad, sweepAngleRad))
      parts.push(`L${pair(arcPoint(arc, angle))}`);
    parts.push(`L${pair(arc.to)}`);
    return;
  }
  const pieces = Math.max(1, Math.ceil(Math.abs(sweepAngleRad) / QUARTER - 1e-9));
  const rotationDeg = Math.abs(majorMm - minorMm) < 1e-9 * majorMm ? 0 : (rotationRad * 180) / Math.PI;
  const radii = `${formatMm(majorMm)} ${formatMm(minorMm)} ${formatMm(rotationDeg)}`;
  const sweepFlag = sweepAngleRad > 0 === isPositive ? 1 : 0;
  for (let i = 1; i <= pieces; i++) {
    const to = i === pieces ? arc.to : arcPoint(arc, startAngleRad + (sweepAngleRad * i) / pieces);
    parts.push(`A${radii} 0 ${sweepFlag} ${pair(to)}`);
  }
}

/** Angles within the sweep at which a flat ellipse turns back, in the order in which they are met. */
function turnsWithin(majorAtRad: number, startRad: number, sweepRad: number): number[] {
  const angles: number[] = [];
  const direction = Math.sign(sweepRad);
  const ahead = direction * (majorAtRad - startRad);
  const firstAhead = ahead - Math.PI * Math.floor(ahead / Math.PI);
  for (let along = firstAhead; along < Math.abs(sweepRad); along += Math.PI)
    angles.push(startRad + direction * along);
  return angles;
}
