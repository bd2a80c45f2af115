import { IDENTITY, type Matrix, multiply } from './matrix.ts';
import { transformFunction } from './transform-function.ts';
import { isFontUnit, lengthPx, parseLength } from './units.ts';

/** The size that percentages in `translate` refer to, in user units. */
export interface PercentSize {
  readonly width: number;
  readonly height: number;
}

/**
 * A `transform` of a style read. `invalid`: browsers drop the whole declaration. `unread`: it is valid
 * and counts, but it is in space, calculated, or sized by a font, and so is not worked out here.
 */
export type CssTransformResult =
  | { readonly ok: true; readonly matrix: Matrix }
  | { readonly ok: false; readonly why: 'invalid' | 'unread' };

type Kind = 'number' | 'scale' | 'angle' | 'across' | 'down';

const RADIANS_PER: Readonly<Record<string, number>> = {
  deg: Math.PI / 180,
  grad: Math.PI / 200,
  rad: 1,
  turn: 2 * Math.PI,
};

const FUNCTIONS: ReadonlyMap<string, { readonly kinds: readonly Kind[]; readonly least: number }> = new Map([
  ['matrix', { kinds: Array<Kind>(6).fill('number'), least: 6 }],
  ['translate', { kinds: ['across', 'down'], least: 1 }],
  ['translatex', { kinds: ['across'], least: 1 }],
  ['translatey', { kinds: ['down'], least: 1 }],
  ['scale', { kinds: ['scale', 'scale'], least: 1 }],
  ['scalex', { kinds: ['scale'], least: 1 }],
  ['scaley', { kinds: ['scale'], least: 1 }],
  ['rotate', { kinds: ['angle'], least: 1 }],
  ['skew', { kinds: ['angle', 'angle'], least: 1 }],
  ['skewx', { kinds: ['angle'], least: 1 }],
  ['skewy', { kinds: ['angle'], least: 1 }],
]);

const IN_SPACE = /^(?:(?:matrix|translate|scale|rotate)3d|(?:translate|scale)z|rotate[xyz]|perspective)$/;
const CALCULATED = /\b(?:calc|var|env|attr|min|max|clamp)\(/i;

/**
 * Reads a `transform` declared in a style (CSS Transforms 1): commas between values, none between
 * functions, no space before a bracket, a unit on every length and angle but 0.
 */
export function parseCssTransform(text: string, percentOf: PercentSize): CssTransformResult {
  if (/^\s*none\s*$/i.test(text)) return { ok: true, matrix: IDENTITY };
  if (CALCULATED.test(text)) return { ok: false, why: 'unread' };
  let matrix = IDENTITY;
  let isUnread = false;
  const step = /\s*([a-z][a-z0-9]*)\(([^()]*)\)\s*/iy;
  for (step.lastIndex = 0; step.lastIndex < text.length; ) {
    const match = step.exec(text);
    if (!match) return { ok: false, why: 'invalid' };
    const name = (match[1] ?? '').toLowerCase();
    if (IN_SPACE.test(name)) {
      isUnread = true;
      continue;
    }
    const result = oneFunction(name, (match[2] ?? '').split(','), percentOf);
    if (!result) return { ok: false, why: 'invalid' };
    if (result === 'unread') isUnread = true;
    else matrix = multiply(matrix, result);
  }
  return isUnread ? { ok: false, why: 'unread' } : { ok: true, matrix };
}

function oneFunction(
  name: string,
  written: readonly string[],
  percentOf: PercentSize,
): Matrix | 'unread' | undefined {
  const grammar = FUNCTIONS.get(name);
  if (!grammar || written.length < grammar.least || written.length > grammar.kinds.length) return undefined;
  const values: number[] = [];
  let isUnread = false;
  for (const [index, text] of written.entries()) {
    const value = oneValue(text, grammar.kinds[index] ?? 'number', percentOf);
    if (value === undefined) return undefined;
    if (value === 'unread') isUnread = true;
    else values.push(value);
  }
  return isUnread ? 'unread' : transformFunction(name, values);
}

function oneValue(text: string, kind: Kind, percentOf: PercentSize): number | 'unread' | undefined {
  const length = parseLength(text);
  if (!length) return undefined;
  const { value, unit } = length;
  if (kind === 'number' || kind === 'scale') {
    if (unit === '%' && kind === 'scale') return value / 100;
    return unit === '' ? value : undefined;
  }
  if (unit === '') return value === 0 ? 0 : undefined;
  if (kind === 'angle') {
    const radians = RADIANS_PER[unit];
    return radians === undefined ? undefined : value * radians;
  }
  if (isFontUnit(unit)) return 'unread';
  return lengthPx(length, kind === 'across' ? percentOf.width : percentOf.height);
}
