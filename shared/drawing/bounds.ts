import type { ArcSegment, Bounds, CubicSegment, Outline, QuadraticSegment, Segment } from './types.ts';

/** Grows to hold every point added to it; `isFinite` is false once a number was not finite. */
export class BoundsBox {
  minX = Number.POSITIVE_INFINITY;
  minY = Number.POSITIVE_INFINITY;
  maxX = Number.NEGATIVE_INFINITY;
  maxY = Number.NEGATIVE_INFINITY;
  /** Stays 0 while every number is finite: 0 · ∞ and 0 · NaN are NaN. */
  #poison = 0;

  add(x: number, y: number): void {
    if (x < this.minX) this.minX = x;
    if (x > this.maxX) this.maxX = x;
    if (y < this.minY) this.minY = y;
    if (y > this.maxY) this.maxY = y;
    this.#poison += 0 * x + 0 * y;
  }

  addX(x: number): void {
    if (x < this.minX) this.minX = x;
    if (x > this.maxX) this.maxX = x;
  }

  addY(y: number): void {
    if (y < this.minY) this.minY = y;
    if (y > this.maxY) this.maxY = y;
  }

  /** Notes that a number took part in the geometry without being on the curve. */
  check(x: number, y: number): void {
    this.#poison += 0 * x + 0 * y;
  }

  addBounds(bounds: Bounds): void {
    this.add(bounds.minX, bounds.minY);
    this.add(bounds.maxX, bounds.maxY);
  }

  get isFinite(): boolean {
    return this.#poison === 0 && this.minX <= this.maxX;
  }

  toBounds(): Bounds {
    return { minX: this.minX, minY: this.minY, maxX: this.maxX, maxY: this.maxY };
  }
}

/** Exact bounds of outlines in mm, from the analytic extrema of each segment; strokes do not count. */
export function outlinesBounds(outlines: readonly Outline[]): BoundsBox {
  const box = new BoundsBox();
  for (const outline of outlines) {
    const first = outline.segments[0];
    if (first) box.add(first.from.x, first.from.y);
    for (const segment of outline.segments) addSegmentAfterStart(segment, box);
  }
  return box;
}

/** Exact bounds of one segment in mm. */
export function segmentBounds(segment: Segment): Bounds {
  const box = new BoundsBox();
  box.add(segment.from.x, segment.from.y);
  addSegmentAfterStart(segment, box);
  return box.toBounds();
}

/** Adds a segment whose start point is in the box already. */
function addSegmentAfterStart(segment: Segment, box: BoundsBox): void {
  box.add(segment.to.x, segment.to.y);
  if (segment.kind === 'cubic') addCubic(segment, box);
  else if (segment.kind === 'quadratic') addQuadratic(segment, box);
  else if (segment.kind === 'arc') addArc(segment, box);
}

function addQuadratic({ from, control, to }: QuadraticSegment, box: BoundsBox): void {
  box.check(control.x, control.y);
  if (control.x < box.minX || control.x > box.maxX) {
    box.addX(quadraticExtremum(from.x, control.x, to.x));
  }
  if (control.y < box.minY || control.y > box.maxY) {
    box.addY(quadraticExtremum(from.y, control.y, to.y));
  }
}

/** The turning value of one coordinate, or its start where it does not turn. */
function quadraticExtremum(p0: number, p1: number, p2: number): number {
  const t = (p0 - p1) / (p0 - 2 * p1 + p2);
  if (!(t > 0 && t < 1)) return p0;
  const s = 1 - t;
  return s * s * p0 + 2 * s * t * p1 + t * t * p2;
}

function addCubic({ from, control1, control2, to }: CubicSegment, box: BoundsBox): void {
  box.check(control1.x + control2.x, control1.y + control2.y);
  // The curve stays within its control points: no extremum to look for when the box holds them.
  if (control1.x < box.minX || control1.x > box.maxX || control2.x < box.minX || control2.x > box.maxX) {
    for (const t of cubicTurns(from.x, control1.x, control2.x, to.x)) {
      box.addX(cubicAt(from.x, control1.x, control2.x, to.x, t));
    }
  }
  if (control1.y < box.minY || control1.y > box.maxY || control2.y < box.minY || control2.y > box.maxY) {
    for (const t of cubicTurns(from.y, control1.y, control2.y, to.y)) {
      box.addY(cubicAt(from.y, control1.y, control2.y, to.y, t));
    }
  }
}

function cubicAt(p0: number, p1: number, p2: number, p3: number, t: number): number {
  const s = 1 - t;
  return s * s * s * p0 + 3 * s * s * t * p1 + 3 * s * t * t * p2 + t * t * t * p3;
}

/** Parameters in (0, 1) at which one coordinate of a cubic turns: roots of a·t² + 2·b·t + c. */
function cubicTurns(p0: number, p1: number, p2: number, p3: number): number[] {
  const a = p3 - p0 + 3 * (p1 - p2);
  const b = p0 - 2 * p1 + p2;
  const c = p1 - p0;
  const discriminant = b * b - a * c;
  if (discriminant < 0) return [];
  // The larger root part first, so that nothing cancels; a = 0 gives an infinity, which is left out.
  const q = -(b + (b < 0 ? -1 : 1) * Math.sqrt(discriminant));
  return [q / a, c / q].filter((t) => t > 0 && t < 1);
}

function addArc(arc: ArcSegment, box: BoundsBox): void {
  const { centre, axisU, axisV } = arc;
  box.check(centre.x + axisU.x + axisV.x, centre.y + axisU.y + axisV.y);
  const turnX = Math.atan2(axisV.x, axisU.x);
  const turnY = Math.atan2(axisV.y, axisU.y);
  const reachX = Math.hypot(axisU.x, axisV.x);
  const reachY = Math.hypot(axisU.y, axisV.y);
  if (isOnArc(arc, turnX)) box.addX(centre.x + reachX);
  if (isOnArc(arc, turnX + Math.PI)) box.addX(centre.x - reachX);
  if (isOnArc(arc, turnY)) box.addY(centre.y + reachY);
  if (isOnArc(arc, turnY + Math.PI)) box.addY(centre.y - reachY);
}

function isOnArc(arc: ArcSegment, angleRad: number): boolean {
  const full = 2 * Math.PI;
  const along = arc.sweepAngleRad < 0 ? arc.startAngleRad - angleRad : angleRad - arc.startAngleRad;
  const ahead = along - full * Math.floor(along / full);
  return ahead <= Math.abs(arc.sweepAngleRad);
}
