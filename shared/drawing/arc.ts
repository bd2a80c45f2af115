/** An elliptical arc by its centre, in the units of its end points. */
export interface CentreArc {
  readonly centreX: number;
  readonly centreY: number;
  readonly radiusX: number;
  readonly radiusY: number;
  readonly cosRotation: number;
  readonly sinRotation: number;
  readonly startAngleRad: number;
  /** Signed: positive from the x axis towards the y axis. */
  readonly sweepAngleRad: number;
}

/**
 * From an arc's end points to its centre (SVG 2, implementation notes B.2.4 and B.2.5): negative radii
 * lose their sign, radii too small to span the ends are scaled up by √Λ. Radii must not be 0 and the
 * ends must differ: the caller draws a line, or nothing.
 */
export function arcFromEndPoints(
  fromX: number,
  fromY: number,
  radiusX: number,
  radiusY: number,
  rotationDeg: number,
  largeArc: boolean,
  positiveSweep: boolean,
  toX: number,
  toY: number,
): CentreArc {
  const rotationRad = ((rotationDeg % 360) * Math.PI) / 180;
  const cos = rotationDeg % 180 === 0 ? Math.sign(Math.cos(rotationRad)) : Math.cos(rotationRad);
  const sin = rotationDeg % 180 === 0 ? 0 : Math.sin(rotationRad);
  const halfX = (fromX - toX) / 2;
  const halfY = (fromY - toY) / 2;
  // The half chord in the ellipse's own directions, on the unit circle.
  let rx = Math.abs(radiusX);
  let ry = Math.abs(radiusY);
  let unitX = (cos * halfX + sin * halfY) / rx;
  let unitY = (-sin * halfX + cos * halfY) / ry;
  const lambda = unitX * unitX + unitY * unitY;
  let factor = 0;
  if (lambda > 1) {
    const scale = Math.sqrt(lambda);
    rx *= scale;
    ry *= scale;
    unitX /= scale;
    unitY /= scale;
  } else {
    factor = Math.sqrt((1 - lambda) / lambda) * (largeArc === positiveSweep ? -1 : 1);
  }
  // Centre relative to the middle of the chord, on the unit circle.
  const centreUnitX = factor * unitY;
  const centreUnitY = -factor * unitX;
  const startAngleRad = Math.atan2(unitY - centreUnitY, unitX - centreUnitX);
  const endAngleRad = Math.atan2(-unitY - centreUnitY, -unitX - centreUnitX);
  let sweepAngleRad = endAngleRad - startAngleRad;
  if (positiveSweep && sweepAngleRad < 0) sweepAngleRad += 2 * Math.PI;
  else if (!positiveSweep && sweepAngleRad > 0) sweepAngleRad -= 2 * Math.PI;
  const alongX = centreUnitX * rx;
  const alongY = centreUnitY * ry;
  return {
    centreX: cos * alongX - sin * alongY + (fromX + toX) / 2,
    centreY: sin * alongX + cos * alongY + (fromY + toY) / 2,
    radiusX: rx,
    radiusY: ry,
    cosRotation: cos,
    sinRotation: sin,
    startAngleRad,
    sweepAngleRad,
  };
}
