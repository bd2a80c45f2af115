import { TextCursor } from './text-cursor.ts';

/** Where and why path data stops being path data. */
export interface PathDataError {
  /** Index in the path data. */
  readonly index: number;
  /** What was expected there and what was found. */
  readonly message: string;
}

/** Path data as a flat list: one letter code and its numbers for each complete command. */
export interface PathData {
  /** Character codes of the command letters, as written; repeated sets repeat the letter. */
  readonly codes: readonly number[];
  readonly values: readonly number[];
  readonly error?: PathDataError;
  /** Reading stopped at the largest number of commands allowed. */
  readonly truncated: boolean;
}

/** Numbers that each command letter takes, by character code; -1 for what is no command. */
const VALUE_COUNTS = new Int8Array(128).fill(-1);
for (const [letter, count] of Object.entries({
  m: 2,
  l: 2,
  h: 1,
  v: 1,
  c: 6,
  s: 4,
  q: 4,
  t: 2,
  a: 7,
  z: 0,
})) {
  VALUE_COUNTS[letter.charCodeAt(0)] = count;
  VALUE_COUNTS[letter.toUpperCase().charCodeAt(0)] = count;
}
const ARC_VALUES = 7;

/** Numbers that a command letter takes. */
export function valueCount(code: number): number {
  return VALUE_COUNTS[code] ?? -1;
}

/**
 * Reads path data by the SVG 2 grammar (Paths, 9.3.9). Data with an error is read up to the last
 * complete command before it, as SVG says, and the error is reported with its place.
 */
export function parsePathData(text: string, maxCommands: number): PathData {
  const cursor = new TextCursor(text);
  const codes: number[] = [];
  const values: number[] = [];
  const failed = (expected: string): PathData => {
    const error = {
      index: Math.min(cursor.index, text.length),
      message: `expected ${expected}, found ${foundAt(cursor)}`,
    };
    return { codes, values, error, truncated: false };
  };
  cursor.skipSpace();
  if (text.trim() === 'none') return { codes, values, truncated: false };
  while (!cursor.atEnd) {
    let code = cursor.peek();
    const count = valueCount(code);
    if (count < 0) return failed('a path command');
    if (codes.length === 0 && code !== 77 && code !== 109) return failed('M or m at the start');
    cursor.index++;
    cursor.skipSpace();
    if (count === 0) {
      codes.push(code);
      if (codes.length > maxCommands) return { codes, values, truncated: true };
      continue;
    }
    for (;;) {
      const wrong = readValues(cursor, count, values);
      if (wrong) return failed(wrong);
      codes.push(code);
      if (codes.length > maxCommands) return { codes, values, truncated: true };
      // Further pairs after a move are lines.
      if (code === 77) code = 76;
      else if (code === 109) code = 108;
      const comma = cursor.skipCommaSpace();
      if (!comma && !cursor.startsNumber()) break;
    }
  }
  return { codes, values, truncated: false };
}

/** Reads one set of numbers onto `values`; leaves `values` as it was and says what was expected on an error. */
function readValues(cursor: TextCursor, count: number, values: number[]): string | undefined {
  const before = values.length;
  for (let i = 0; i < count; i++) {
    if (i > 0) cursor.skipCommaSpace();
    const isFlag = count === ARC_VALUES && (i === 3 || i === 4);
    const value = isFlag ? cursor.flag() : cursor.number();
    if (Number.isNaN(value)) {
      values.length = before;
      return isFlag ? 'an arc flag (0 or 1)' : 'a number';
    }
    values.push(value);
  }
  return undefined;
}

function foundAt(cursor: TextCursor): string {
  const point = cursor.text.codePointAt(cursor.index);
  return point === undefined ? 'the end' : `“${String.fromCodePoint(point)}”`;
}
