import { IDENTITY, type Matrix, multiply } from './matrix.ts';
import { TextCursor } from './text-cursor.ts';
import { transformFunction } from './transform-function.ts';

/** A transform list read, or the index in the text at which it is wrong. */
export type TransformResult =
  | { readonly ok: true; readonly matrix: Matrix }
  | { readonly ok: false; readonly errorIndex: number };

const RADIANS_PER_DEGREE = Math.PI / 180;
/** Numbers that each function of the attribute takes; which of them are angles. */
const FUNCTIONS: Readonly<Record<string, { counts: readonly number[]; angles: number }>> = {
  matrix: { counts: [6], angles: 0 },
  translate: { counts: [1, 2], angles: 0 },
  scale: { counts: [1, 2], angles: 0 },
  rotate: { counts: [1, 3], angles: 1 },
  skewX: { counts: [1], angles: 1 },
  skewY: { counts: [1], angles: 1 },
};

/**
 * Reads the list of a `transform` attribute (SVG 2, 8.5.1 as browsers take it): matrix, translate,
 * scale, rotate (with its centre too), skewX and skewY in this spelling, bare numbers only, angles in
 * degrees. Units and the other functions of CSS are errors here.
 */
export function parseTransform(text: string): TransformResult {
  const cursor = new TextCursor(text);
  let matrix = IDENTITY;
  let comma = false;
  cursor.skipSpace();
  if (text.trim() === 'none') return { ok: true, matrix };
  while (!cursor.atEnd) {
    const functionAt = cursor.index;
    const name = readName(cursor);
    cursor.skipSpace();
    if (cursor.peek() !== 40) return { ok: false, errorIndex: name ? functionAt : cursor.index };
    cursor.index++;
    const values = readValues(cursor);
    const step = values && numbersMatrix(name, values);
    if (!step) return { ok: false, errorIndex: values ? functionAt : cursor.index };
    matrix = multiply(matrix, step);
    comma = cursor.skipCommaSpace();
  }
  return comma ? { ok: false, errorIndex: text.lastIndexOf(',') } : { ok: true, matrix };
}

function numbersMatrix(name: string, values: readonly number[]): Matrix | undefined {
  const grammar = Object.hasOwn(FUNCTIONS, name) ? FUNCTIONS[name] : undefined;
  if (!grammar?.counts.includes(values.length)) return undefined;
  const inRadians = values.map((value, index) =>
    index < grammar.angles ? value * RADIANS_PER_DEGREE : value,
  );
  return transformFunction(name.toLowerCase(), inRadians);
}

function readName(cursor: TextCursor): string {
  const start = cursor.index;
  while (/[a-z0-9]/i.test(cursor.text.charAt(cursor.index))) cursor.index++;
  return cursor.text.slice(start, cursor.index);
}

/** The numbers up to the closing bracket; undefined, the cursor at the error, when they are not a list. */
function readValues(cursor: TextCursor): number[] | undefined {
  const values: number[] = [];
  cursor.skipSpace();
  while (cursor.peek() !== 41) {
    const value = cursor.number();
    if (!Number.isFinite(value)) return undefined;
    values.push(value);
    const comma = cursor.skipCommaSpace();
    if (comma && cursor.peek() === 41) return undefined;
  }
  cursor.index++;
  return values;
}
