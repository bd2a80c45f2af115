import { IDENTITY, type Matrix, multiply, rotation, scaling, translation } from './matrix.ts';
import { TextCursor } from './text-cursor.ts';
import { lengthPx, type WrittenLength } from './units.ts';

const RADIANS_PER: Readonly<Record<string, number>> = {
  '': Math.PI / 180,
  deg: Math.PI / 180,
  grad: Math.PI / 200,
  rad: 1,
  turn: 2 * Math.PI,
};

/** A transform list read, or the index in the text at which it is wrong. */
export type TransformResult =
  | { readonly ok: true; readonly matrix: Matrix }
  | { readonly ok: false; readonly errorIndex: number };

/** The size that percentages in `translate` refer to, in user units. */
export interface PercentSize {
  readonly width: number;
  readonly height: number;
}

/**
 * Reads a transform list in the attribute's syntax and in CSS syntax (SVG 2, Coordinates; CSS
 * Transforms 1): matrix, translate, translateX, translateY, scale, scaleX, scaleY, rotate (with its
 * centre too), skew, skewX, skewY; angles in deg, rad, grad and turn, lengths in any unit.
 */
export function parseTransform(text: string, percentOf: PercentSize): TransformResult {
  const cursor = new TextCursor(text);
  let matrix = IDENTITY;
  cursor.skipSpace();
  if (/^\s*none\s*$/i.test(text)) return { ok: true, matrix };
  while (!cursor.atEnd) {
    const functionAt = cursor.index;
    const name = readName(cursor);
    cursor.skipSpace();
    if (cursor.peek() !== 40) return { ok: false, errorIndex: name ? functionAt : cursor.index };
    cursor.index++;
    const values = readValues(cursor);
    const step = values && functionMatrix(name.toLowerCase(), values, percentOf);
    if (!step) return { ok: false, errorIndex: values ? functionAt : cursor.index };
    matrix = multiply(matrix, step);
    cursor.skipCommaSpace();
  }
  return { ok: true, matrix };
}

function readName(cursor: TextCursor): string {
  const start = cursor.index;
  while (/[a-z0-9]/i.test(cursor.text.charAt(cursor.index))) cursor.index++;
  return cursor.text.slice(start, cursor.index);
}

/** The values up to the closing bracket; undefined when they are not a list of values. */
function readValues(cursor: TextCursor): WrittenLength[] | undefined {
  const values: WrittenLength[] = [];
  cursor.skipSpace();
  while (cursor.peek() !== 41) {
    const value = cursor.number();
    if (!Number.isFinite(value)) return undefined;
    const unitAt = cursor.index;
    while (/[a-z%]/i.test(cursor.text.charAt(cursor.index))) cursor.index++;
    values.push({ value, unit: cursor.text.slice(unitAt, cursor.index).toLowerCase() });
    const comma = cursor.skipCommaSpace();
    if (comma && cursor.peek() === 41) return undefined;
  }
  cursor.index++;
  return values;
}

function functionMatrix(
  name: string,
  values: readonly WrittenLength[],
  percentOf: PercentSize,
): Matrix | undefined {
  const count = values.length;
  const bare = (index: number) => {
    const value = values[index];
    if (value?.unit === '%') return value.value / 100;
    return value?.unit === '' ? value.value : Number.NaN;
  };
  const angle = (index: number) => {
    const value = values[index];
    return value ? value.value * (RADIANS_PER[value.unit] ?? Number.NaN) : 0;
  };
  const length = (index: number, percentOfPx: number) => {
    const value = values[index];
    return value ? (lengthPx(value, percentOfPx) ?? Number.NaN) : 0;
  };
  const lengthX = (index: number) => length(index, percentOf.width);
  const lengthY = (index: number) => length(index, percentOf.height);
  const skew = (x: number, y: number) => ({ a: 1, b: Math.tan(y), c: Math.tan(x), d: 1, e: 0, f: 0 });
  let matrix: Matrix | undefined;
  if (name === 'matrix' && count === 6) {
    matrix = { a: bare(0), b: bare(1), c: bare(2), d: bare(3), e: lengthX(4), f: lengthY(5) };
  } else if (name === 'translate' && (count === 1 || count === 2))
    matrix = translation(lengthX(0), lengthY(1));
  else if (name === 'translatex' && count === 1) matrix = translation(lengthX(0), 0);
  else if (name === 'translatey' && count === 1) matrix = translation(0, lengthY(0));
  else if (name === 'scale' && (count === 1 || count === 2)) matrix = scaling(bare(0), bare(count - 1));
  else if (name === 'scalex' && count === 1) matrix = scaling(bare(0), 1);
  else if (name === 'scaley' && count === 1) matrix = scaling(1, bare(0));
  else if (name === 'rotate' && count === 1) matrix = rotation(angle(0));
  else if (name === 'rotate' && count === 3) {
    const back = translation(-lengthX(1), -lengthY(2));
    matrix = multiply(translation(lengthX(1), lengthY(2)), multiply(rotation(angle(0)), back));
  } else if (name === 'skewx' && count === 1) matrix = skew(angle(0), 0);
  else if (name === 'skewy' && count === 1) matrix = skew(0, angle(0));
  else if (name === 'skew' && (count === 1 || count === 2)) matrix = skew(angle(0), angle(1));
  if (!matrix) return undefined;
  const { a, b, c, d, e, f } = matrix;
  return Number.isFinite(a + b + c + d + e + f) ? matrix : undefined;
}
