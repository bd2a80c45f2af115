import type { ArcSegment, Point } from './types.ts';

/** The point of an arc at an angle of its own parameter, in mm. */
export function arcPoint({ centre, axisU, axisV }: ArcSegment, angleRad: number): Point {
  const cos = Math.cos(angleRad);
  const sin = Math.sin(angleRad);
  return { x: centre.x + axisU.x * cos + axisV.x * sin, y: centre.y + axisU.y * cos + axisV.y * sin };
}

/** The ellipse that an arc lies on, by its own axes. */
export interface EllipseAxes {
  /** The longer half axis, mm. */
  readonly majorMm: number;
  /** The shorter half axis, mm; 0 for an ellipse pressed flat. */
  readonly minorMm: number;
  /** From the x axis to the longer axis, towards the y axis. */
  readonly rotationRad: number;
  /** Angle of the arc's own parameter at an end of the longer axis. */
  readonly majorAtRad: number;
  /** True when the parameter runs from the x axis towards the y axis. */
  readonly isPositive: boolean;
}

/** Axes from conjugate half-diameters: singular values and directions of the 2 × 2 matrix (U V). */
export function ellipseAxes({ axisU, axisV }: ArcSegment): EllipseAxes {
  const e = (axisU.x + axisV.y) / 2;
  const f = (axisU.x - axisV.y) / 2;
  const g = (axisU.y + axisV.x) / 2;
  const h = (axisU.y - axisV.x) / 2;
  const sumAngle = Math.atan2(h, e);
  const differenceAngle = Math.atan2(g, f);
  const majorMm = Math.hypot(e, h) + Math.hypot(f, g);
  const area = axisU.x * axisV.y - axisU.y * axisV.x;
  return {
    majorMm,
    minorMm: majorMm === 0 ? 0 : Math.abs(area) / majorMm,
    rotationRad: (sumAngle + differenceAngle) / 2,
    majorAtRad: (differenceAngle - sumAngle) / 2,
    isPositive: area >= 0,
  };
}
