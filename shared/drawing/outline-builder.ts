import { arcFromEndPoints } from './arc.ts';
import { applyToPoint, applyToVector, type Matrix } from './matrix.ts';
import type { Outline, Point, Segment } from './types.ts';

/** Ends nearer than this meet: the outline is closed although the file did not say so. */
export const MEETING_ENDS_MM = 1e-6;

/** Draws with a pen in user units and collects outlines in page millimetres. */
export class OutlineBuilder {
  readonly outlines: Outline[] = [];
  /** The pen, in user units. */
  x = 0;
  y = 0;
  #segments: Segment[] = [];
  #startX = 0;
  #startY = 0;
  #at: Point = { x: 0, y: 0 };
  #start: Point = { x: 0, y: 0 };
  readonly #toMm: Matrix;

  constructor(toMm: Matrix) {
    this.#toMm = toMm;
  }

  moveTo(x: number, y: number): void {
    this.#endOutline(false);
    this.x = x;
    this.y = y;
    this.#startX = x;
    this.#startY = y;
    this.#at = applyToPoint(this.#toMm, x, y);
    this.#start = this.#at;
  }

  lineTo(x: number, y: number): void {
    const to = applyToPoint(this.#toMm, x, y);
    this.#segments.push({ kind: 'line', from: this.#at, to });
    this.#arrive(x, y, to);
  }

  quadraticTo(controlX: number, controlY: number, x: number, y: number): void {
    const control = applyToPoint(this.#toMm, controlX, controlY);
    const to = applyToPoint(this.#toMm, x, y);
    this.#segments.push({ kind: 'quadratic', from: this.#at, control, to });
    this.#arrive(x, y, to);
  }

  cubicTo(
    control1X: number,
    control1Y: number,
    control2X: number,
    control2Y: number,
    x: number,
    y: number,
  ): void {
    const control1 = applyToPoint(this.#toMm, control1X, control1Y);
    const control2 = applyToPoint(this.#toMm, control2X, control2Y);
    const to = applyToPoint(this.#toMm, x, y);
    this.#segments.push({ kind: 'cubic', from: this.#at, control1, control2, to });
    this.#arrive(x, y, to);
  }

  /** An arc as in path data: a line when a radius is 0, nothing when the ends are the same. */
  arcTo(
    rx: number,
    ry: number,
    rotationDeg: number,
    largeArc: boolean,
    positiveSweep: boolean,
    x: number,
    y: number,
  ): void {
    if (x === this.x && y === this.y) return;
    if (rx === 0 || ry === 0) {
      this.lineTo(x, y);
      return;
    }
    const arc = arcFromEndPoints(this.x, this.y, rx, ry, rotationDeg, largeArc, positiveSweep, x, y);
    const { radiusX, radiusY, cosRotation, sinRotation } = arc;
    const to = applyToPoint(this.#toMm, x, y);
    this.#segments.push({
      kind: 'arc',
      from: this.#at,
      to,
      centre: applyToPoint(this.#toMm, arc.centreX, arc.centreY),
      axisU: applyToVector(this.#toMm, radiusX * cosRotation, radiusX * sinRotation),
      axisV: applyToVector(this.#toMm, -radiusY * sinRotation, radiusY * cosRotation),
      startAngleRad: arc.startAngleRad,
      sweepAngleRad: arc.sweepAngleRad,
    });
    this.#arrive(x, y, to);
  }

  /** A whole ellipse as one closed arc, from its right-hand end towards the y axis (SVG 2, Shapes). */
  ellipse(centreX: number, centreY: number, radiusX: number, radiusY: number): void {
    this.moveTo(centreX + radiusX, centreY);
    this.#segments.push({
      kind: 'arc',
      from: this.#at,
      to: this.#at,
      centre: applyToPoint(this.#toMm, centreX, centreY),
      axisU: applyToVector(this.#toMm, radiusX, 0),
      axisV: applyToVector(this.#toMm, 0, radiusY),
      startAngleRad: 0,
      sweepAngleRad: 2 * Math.PI,
    });
    this.close();
  }

  close(): void {
    if (this.#segments.length > 0 && !meet(this.#at, this.#start)) {
      this.#segments.push({ kind: 'line', from: this.#at, to: this.#start });
    }
    this.#endOutline(true);
    this.x = this.#startX;
    this.y = this.#startY;
    this.#at = this.#start;
  }

  /** Ends the last outline; call it once, after the last segment. */
  finish(): readonly Outline[] {
    this.#endOutline(false);
    return this.outlines;
  }

  #arrive(x: number, y: number, at: Point): void {
    this.x = x;
    this.y = y;
    this.#at = at;
  }

  #endOutline(closedByFile: boolean): void {
    const segments = this.#segments;
    if (segments.length === 0) return;
    const mayClose = segments.length > 1 || segments[0]?.kind !== 'line';
    this.outlines.push({ closed: closedByFile || (mayClose && meet(this.#at, this.#start)), segments });
    this.#segments = [];
  }
}

function meet(a: Point, b: Point): boolean {
  return Math.abs(a.x - b.x) <= MEETING_ENDS_MM && Math.abs(a.y - b.y) <= MEETING_ENDS_MM;
}
