import { type Matrix, multiply, rotation, scaling, translation } from './matrix.ts';

/**
 * The matrix of one transform function by its name in lower case; lengths in user units, angles in
 * radians, the number of values already checked. Undefined for an unknown name or values that are not finite.
 */
export function transformFunction(name: string, values: readonly number[]): Matrix | undefined {
  const [first = 0, second, third = 0] = values;
  const matrix = matrixOf(name, values, first, second, third);
  if (!matrix) return undefined;
  const { a, b, c, d, e, f } = matrix;
  return Number.isFinite(a + b + c + d + e + f) ? matrix : undefined;
}

function matrixOf(
  name: string,
  values: readonly number[],
  first: number,
  second: number | undefined,
  third: number,
): Matrix | undefined {
  switch (name) {
    case 'matrix': {
      const [a = 0, b = 0, c = 0, d = 0, e = 0, f = 0] = values;
      return { a, b, c, d, e, f };
    }
    case 'translate':
      return translation(first, second ?? 0);
    case 'translatex':
      return translation(first, 0);
    case 'translatey':
      return translation(0, first);
    case 'scale':
      return scaling(first, second ?? first);
    case 'scalex':
      return scaling(first, 1);
    case 'scaley':
      return scaling(1, first);
    case 'rotate':
      if (second === undefined) return rotation(first);
      return multiply(translation(second, third), multiply(rotation(first), translation(-second, -third)));
    case 'skewx':
      return skew(first, 0);
    case 'skewy':
      return skew(0, first);
    case 'skew':
      return skew(first, second ?? 0);
    default:
      return undefined;
  }
}

function skew(xRad: number, yRad: number): Matrix {
  return { a: 1, b: Math.tan(yRad), c: Math.tan(xRad), d: 1, e: 0, f: 0 };
}
