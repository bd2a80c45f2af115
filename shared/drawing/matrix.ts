import type { Point } from './types.ts';

/** An affine map: x' = a·x + c·y + e, y' = b·x + d·y + f (SVG 2, Coordinates). */
export interface Matrix {
  readonly a: number;
  readonly b: number;
  readonly c: number;
  readonly d: number;
  readonly e: number;
  readonly f: number;
}

export const IDENTITY: Matrix = { a: 1, b: 0, c: 0, d: 1, e: 0, f: 0 };

/** The map that applies `inner` first, then `outer`. */
export function multiply(outer: Matrix, inner: Matrix): Matrix {
  return {
    a: outer.a * inner.a + outer.c * inner.b,
    b: outer.b * inner.a + outer.d * inner.b,
    c: outer.a * inner.c + outer.c * inner.d,
    d: outer.b * inner.c + outer.d * inner.d,
    e: outer.a * inner.e + outer.c * inner.f + outer.e,
    f: outer.b * inner.e + outer.d * inner.f + outer.f,
  };
}

export function translation(x: number, y: number): Matrix {
  return { a: 1, b: 0, c: 0, d: 1, e: x, f: y };
}

export function scaling(x: number, y: number): Matrix {
  return { a: x, b: 0, c: 0, d: y, e: 0, f: 0 };
}

/** Rotation from the x axis towards the y axis; whole quarter turns are exact. */
export function rotation(angleRad: number): Matrix {
  const quarters = angleRad / (Math.PI / 2);
  const nearest = Math.round(quarters);
  const isQuarter = Math.abs(quarters - nearest) < 1e-12;
  const turn = ((nearest % 4) + 4) % 4;
  const cos = isQuarter ? ([1, 0, -1, 0][turn] ?? 1) : Math.cos(angleRad);
  const sin = isQuarter ? ([0, 1, 0, -1][turn] ?? 0) : Math.sin(angleRad);
  return { a: cos, b: sin, c: -sin, d: cos, e: 0, f: 0 };
}

export function determinant(matrix: Matrix): number {
  return matrix.a * matrix.d - matrix.b * matrix.c;
}

export function applyToPoint(matrix: Matrix, x: number, y: number): Point {
  return { x: matrix.a * x + matrix.c * y + matrix.e, y: matrix.b * x + matrix.d * y + matrix.f };
}

/** Maps a direction: the translation is left out. */
export function applyToVector(matrix: Matrix, x: number, y: number): Point {
  return { x: matrix.a * x + matrix.c * y, y: matrix.b * x + matrix.d * y };
}
