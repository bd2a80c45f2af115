import type { ArcSegment, CubicSegment, Outline, QuadraticSegment, Segment } from './types.ts';

// Gauss–Kronrod rule with 7 and 15 points (Kronrod 1965; abscissae and weights as in QUADPACK, qk15).
const NODES = [
  0.9914553711208126, 0.9491079123427585, 0.8648644233597691, 0.7415311855993945, 0.5860872354676911,
  0.4058451513773972, 0.20778495500789848,
];
const KRONROD_WEIGHTS = [
  0.022935322010529224, 0.06309209262997856, 0.10479001032225019, 0.14065325971552592, 0.1690047266392679,
  0.19035057806478542, 0.20443294007529889,
];
const KRONROD_MIDDLE = 0.20948214108472782;
const GAUSS_WEIGHTS = [0, 0.1294849661688697, 0, 0.27970539148927664, 0, 0.3818300505051189, 0];
const GAUSS_MIDDLE = 0.4179591836734694;
const MAX_HALVINGS = 24;
/** Difference of the two rules that is let pass; the better rule's own error is far below it. */
const TOLERANCE = 2e-7;

/**
 * Speed of a curve along its parameter: one record for all curves, so that the hot loop calls no
 * closures. A Bézier curve has the velocity x0 + x1·t + x2·t², and so for y. An arc's squared speed
 * |V·cos t − U·sin t|² is x0 + x1·cos(2t + x2): its mean, its swing and the angle of its swing.
 */
interface Speed {
  isArc: boolean;
  x0: number;
  x1: number;
  x2: number;
  y0: number;
  y1: number;
  y2: number;
}

function speedAt(speed: Speed, t: number): number {
  if (speed.isArc) return Math.sqrt(Math.max(0, speed.x0 + speed.x1 * Math.cos(2 * t + speed.x2)));
  const vx = speed.x0 + t * (speed.x1 + t * speed.x2);
  const vy = speed.y0 + t * (speed.y1 + t * speed.y2);
  return Math.sqrt(vx * vx + vy * vy);
}

function integrate(speed: Speed, from: number, to: number, allowed: number, halvings: number): number {
  const half = (to - from) / 2;
  const middle = (from + to) / 2;
  const centre = speedAt(speed, middle);
  let kronrod = KRONROD_MIDDLE * centre;
  let gauss = GAUSS_MIDDLE * centre;
  for (let i = 0; i < 7; i++) {
    const offset = half * (NODES[i] ?? 0);
    const pair = speedAt(speed, middle - offset) + speedAt(speed, middle + offset);
    kronrod += (KRONROD_WEIGHTS[i] ?? 0) * pair;
    gauss += (GAUSS_WEIGHTS[i] ?? 0) * pair;
  }
  const difference = Math.abs(kronrod - gauss) * half;
  if (halvings === 0 || !(difference > allowed)) return kronrod * half;
  return (
    integrate(speed, from, middle, allowed, halvings - 1) +
    integrate(speed, middle, to, allowed, halvings - 1)
  );
}

/** A part of a curve at either end that lies outside the outermost node, 0.0043, and a little more. */
const END_PART = 0.005;

/**
 * A curve that turns back on itself right at an end does so outside all nodes of both rules, which then
 * agree on a wrong length: such an end is taken by itself.
 */
function bezierLength(speed: Speed, allowed: number): number {
  const from = turnsBack(speed, 0, END_PART) ? END_PART : 0;
  const to = turnsBack(speed, 1, 1 - END_PART) ? 1 - END_PART : 1;
  let length = integrate(speed, from, to, allowed, MAX_HALVINGS);
  if (from > 0) length += integrate(speed, 0, from, allowed, MAX_HALVINGS);
  if (to < 1) length += integrate(speed, to, 1, allowed, MAX_HALVINGS);
  return length;
}

function turnsBack({ x0, x1, x2, y0, y1, y2 }: Speed, s: number, t: number): boolean {
  const across = (x0 + s * (x1 + s * x2)) * (x0 + t * (x1 + t * x2));
  return across + (y0 + s * (y1 + s * y2)) * (y0 + t * (y1 + t * y2)) < 0;
}

/** Length of one segment in mm, within 1e-6 relative; lines and circular arcs are exact. */
export function segmentLength(segment: Segment): number {
  switch (segment.kind) {
    case 'line':
      return distance(segment.from.x, segment.from.y, segment.to.x, segment.to.y);
    case 'quadratic':
      return quadraticLength(segment);
    case 'cubic':
      return cubicLength(segment);
    case 'arc':
      return arcLength(segment);
  }
}

/** Length of outlines in mm: the sum over their segments. */
export function outlinesLength(outlines: readonly Outline[]): number {
  let lengthMm = 0;
  for (const outline of outlines) for (const segment of outline.segments) lengthMm += segmentLength(segment);
  return lengthMm;
}

function distance(x0: number, y0: number, x1: number, y1: number): number {
  const dx = x1 - x0;
  const dy = y1 - y0;
  return Math.sqrt(dx * dx + dy * dy);
}

function quadraticLength({ from, control, to }: QuadraticSegment): number {
  const x0 = 2 * (control.x - from.x);
  const y0 = 2 * (control.y - from.y);
  const speed: Speed = {
    isArc: false,
    x0,
    x1: 2 * (to.x - control.x) - x0,
    x2: 0,
    y0,
    y1: 2 * (to.y - control.y) - y0,
    y2: 0,
  };
  const polygon = distance(from.x, from.y, control.x, control.y) + distance(control.x, control.y, to.x, to.y);
  return bezierLength(speed, polygon * TOLERANCE);
}

function cubicLength({ from, control1, control2, to }: CubicSegment): number {
  const ax = control1.x - from.x;
  const ay = control1.y - from.y;
  const bx = control2.x - control1.x;
  const by = control2.y - control1.y;
  const cx = to.x - control2.x;
  const cy = to.y - control2.y;
  const speed: Speed = {
    isArc: false,
    x0: 3 * ax,
    x1: 6 * (bx - ax),
    x2: 3 * (ax - 2 * bx + cx),
    y0: 3 * ay,
    y1: 6 * (by - ay),
    y2: 3 * (ay - 2 * by + cy),
  };
  const polygon = Math.sqrt(ax * ax + ay * ay) + Math.sqrt(bx * bx + by * by) + Math.sqrt(cx * cx + cy * cy);
  return bezierLength(speed, polygon * TOLERANCE);
}

function arcLength({ axisU, axisV, startAngleRad, sweepAngleRad }: ArcSegment): number {
  const u = axisU.x * axisU.x + axisU.y * axisU.y;
  const v = axisV.x * axisV.x + axisV.y * axisV.y;
  const across = axisU.x * axisV.x + axisU.y * axisV.y;
  const sweep = Math.abs(sweepAngleRad);
  const isCircular = Math.abs(u - v) <= 1e-12 * u && Math.abs(across) <= 1e-12 * u;
  if (isCircular) return Math.sqrt(u) * sweep;
  const speed: Speed = {
    isArc: true,
    x0: (u + v) / 2,
    x1: Math.hypot((v - u) / 2, across),
    x2: Math.atan2(across, (v - u) / 2),
    y0: 0,
    y1: 0,
    y2: 0,
  };
  const start = Math.min(startAngleRad, startAngleRad + sweepAngleRad);
  return integrate(speed, start, start + sweep, Math.sqrt(u + v) * sweep * TOLERANCE, MAX_HALVINGS);
}
