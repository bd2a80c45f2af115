import type { PropertyLookup } from './element-style.ts';
import type { FontSizes } from './font-size.ts';
import type { OutlineBuilder } from './outline-builder.ts';
import { readNumberList } from './text-cursor.ts';
import { isFontUnit, lengthPx, parseLength } from './units.ts';

/** What is to be told of a length: no such unit, a font that is not known, or no plain length at all. */
export type LengthProblem = 'unknown-unit' | 'font-unit' | 'length-unread';

/** Sizes that percentages and em refer to, and what to do about a length that is not certain. */
export interface LengthContext {
  readonly viewport: { readonly width: number; readonly height: number };
  readonly font: FontSizes;
  readonly onProblem: (problem: LengthProblem) => void;
}

type Axis = 'x' | 'y' | 'both';

/** A length property in user units; undefined when missing, `auto` or unreadable. */
export function userLength(text: string | undefined, axis: Axis, context: LengthContext): number | undefined {
  const length = parseLength(text);
  if (!length) {
    if (text !== undefined && !/^\s*(?:auto)?\s*$/i.test(text)) context.onProblem('length-unread');
    return undefined;
  }
  const { width, height } = context.viewport;
  const percentOf =
    axis === 'x' ? width : axis === 'y' ? height : Math.sqrt((width * width + height * height) / 2);
  const user = lengthPx(length, percentOf, context.font);
  if (user === undefined) context.onProblem('unknown-unit');
  else if (isGuess(length.unit, context.font)) context.onProblem('font-unit');
  return user ?? length.value;
}

function isGuess(unit: string, font: FontSizes): boolean {
  return unit === 'ex' || unit === 'ch' || (isFontUnit(unit) && !font.isKnown);
}

/** What came of drawing a basic shape: drawn, of no size, or a list of points that goes wrong at an index. */
export type ShapeOutcome = { readonly drawn: boolean; readonly pointsErrorIndex?: number };

/** Draws rect, circle, ellipse, line, polyline or polygon as its equivalent path (SVG 2, Shapes). */
export function drawBasicShape(
  name: string,
  property: PropertyLookup,
  pen: OutlineBuilder,
  context: LengthContext,
): ShapeOutcome {
  const length = (key: string, axis: Axis) => userLength(property(key), axis, context);
  switch (name) {
    case 'rect':
      return drawRect(property, pen, context);
    case 'circle': {
      const radius = length('r', 'both') ?? 0;
      return drawEllipse(length('cx', 'x') ?? 0, length('cy', 'y') ?? 0, radius, radius, pen);
    }
    case 'ellipse': {
      const rx = length('rx', 'x');
      const ry = length('ry', 'y');
      return drawEllipse(length('cx', 'x') ?? 0, length('cy', 'y') ?? 0, rx ?? ry ?? 0, ry ?? rx ?? 0, pen);
    }
    case 'line':
      pen.moveTo(length('x1', 'x') ?? 0, length('y1', 'y') ?? 0);
      pen.lineTo(length('x2', 'x') ?? 0, length('y2', 'y') ?? 0);
      return { drawn: true };
    default:
      return drawPoints(property('points') ?? '', name === 'polygon', pen);
  }
}

function drawEllipse(cx: number, cy: number, rx: number, ry: number, pen: OutlineBuilder): ShapeOutcome {
  if (!(rx > 0 && ry > 0)) return { drawn: false };
  pen.ellipse(cx, cy, rx, ry);
  return { drawn: true };
}

function drawRect(property: PropertyLookup, pen: OutlineBuilder, context: LengthContext): ShapeOutcome {
  const length = (key: string, axis: Axis) => userLength(property(key), axis, context);
  const x = length('x', 'x') ?? 0;
  const y = length('y', 'y') ?? 0;
  const width = length('width', 'x') ?? 0;
  const height = length('height', 'y') ?? 0;
  if (!(width > 0 && height > 0)) return { drawn: false };
  // A negative radius is an error and counts as auto; auto takes the other radius (SVG 2, 9.2).
  const notNegative = (value: number | undefined) => (value !== undefined && value >= 0 ? value : undefined);
  const givenX = notNegative(length('rx', 'x'));
  const givenY = notNegative(length('ry', 'y'));
  const rx = Math.min(givenX ?? givenY ?? 0, width / 2);
  const ry = Math.min(givenY ?? givenX ?? 0, height / 2);
  const right = x + width;
  const bottom = y + height;
  if (rx === 0 || ry === 0) {
    pen.moveTo(x, y);
    pen.lineTo(right, y);
    pen.lineTo(right, bottom);
    pen.lineTo(x, bottom);
    pen.close();
    return { drawn: true };
  }
  const hasAcross = width > 2 * rx;
  const hasDown = height > 2 * ry;
  pen.moveTo(x + rx, y);
  if (hasAcross) pen.lineTo(right - rx, y);
  pen.arcTo(rx, ry, 0, false, true, right, y + ry);
  if (hasDown) pen.lineTo(right, bottom - ry);
  pen.arcTo(rx, ry, 0, false, true, right - rx, bottom);
  if (hasAcross) pen.lineTo(x + rx, bottom);
  pen.arcTo(rx, ry, 0, false, true, x, bottom - ry);
  if (hasDown) pen.lineTo(x, y + ry);
  pen.arcTo(rx, ry, 0, false, true, x + rx, y);
  pen.close();
  return { drawn: true };
}

/** Points up to the first error; a single coordinate at the end is an error too. */
function drawPoints(text: string, close: boolean, pen: OutlineBuilder): ShapeOutcome {
  const { values, errorIndex } = readNumberList(text);
  for (let i = 0; i + 1 < values.length; i += 2) {
    const x = values[i] ?? 0;
    const y = values[i + 1] ?? 0;
    if (i === 0) pen.moveTo(x, y);
    else pen.lineTo(x, y);
  }
  if (close) pen.close();
  const wrongAt = errorIndex ?? (values.length % 2 === 1 ? text.trimEnd().length : undefined);
  const drawn = values.length >= 4;
  return wrongAt === undefined ? { drawn } : { drawn, pointsErrorIndex: wrongAt };
}
