import { drawBasicShape } from './basic-shapes.ts';
import { outlinesBounds } from './bounds.ts';
import type { PropertyLookup } from './element-style.ts';
import type { SvgElement } from './element-tree.ts';
import { outlinesLength } from './length.ts';
import { DRAWING_LIMITS } from './limits.ts';
import { determinant } from './matrix.ts';
import { OutlineBuilder } from './outline-builder.ts';
import { warnOfOutlines } from './outline-warnings.ts';
import { paintName } from './paint.ts';
import { drawPath } from './path-to-segments.ts';
import type { Inherited, ReadState } from './read-state.ts';
import { refuse } from './refusals.ts';
import { attributeValueOffset } from './source-text.ts';
import type { DrawingShape, Outline } from './types.ts';
import { lengthPx, parseLength } from './units.ts';
import { WIDE_STROKE_MM } from './warnings.ts';

/** The elements that are shapes of their own. */
export const SHAPE_NAMES = new Set(['path', 'rect', 'circle', 'ellipse', 'line', 'polyline', 'polygon']);

/** Reads one shape into page millimetres and adds it to the drawing, with what is to be told of it. */
export function drawShape(
  element: SvgElement,
  own: PropertyLookup,
  inherited: Inherited,
  state: ReadState,
): void {
  const at = () => state.at(element);
  const key = `s${state.shapes.length + 1}`;
  const det = determinant(inherited.toMm);
  if (det === 0) {
    state.warnings.count('flat-shape', at);
    return;
  }
  const outlines = readOutlines(element, own, inherited, state, key);
  if (state.refusal || outlines.length === 0) return;
  for (const outline of outlines) state.segmentCount += outline.segments.length;
  if (state.segmentCount > DRAWING_LIMITS.segments) {
    state.stop(refuse.tooManySegments(at()));
    return;
  }
  const box = outlinesBounds(outlines);
  const limit = DRAWING_LIMITS.coordinateMm;
  const isInside = box.minX >= -limit && box.minY >= -limit && box.maxX <= limit && box.maxY <= limit;
  if (!box.isFinite || !isInside) {
    state.stop(refuse.outOfRange(at()));
    return;
  }
  warnOfOutlines(outlines, state.warnings, at, key);
  warnOfPaint(own, inherited, Math.sqrt(Math.abs(det)), state, at, key);
  state.shapes.push({
    key,
    layerKey: state.layerKeys.keyOf(inherited.label ?? paintName(inherited.paint)),
    source: placeOf(element, state),
    outlines,
    boundsMm: box.toBounds(),
    lengthMm: outlinesLength(outlines),
  });
}

function placeOf(element: SvgElement, state: ReadState): DrawingShape['source'] {
  const id = element.attributes['id'];
  return { element: element.name, ...(id ? { id } : {}), ...state.at(element) };
}

function readOutlines(
  element: SvgElement,
  own: PropertyLookup,
  inherited: Inherited,
  state: ReadState,
  key: string,
): readonly Outline[] {
  const pen = new OutlineBuilder(inherited.toMm);
  if (element.name === 'path') {
    const data = state.pathData(element, element.attributes['d'] ?? '');
    if (data.truncated) {
      state.stop(refuse.tooManySegments(state.at(element)));
      return [];
    }
    drawPath(data, pen);
    if (data.error) warnOfError(element, 'd', 'path', data.error.index, data.error.message, state, key);
    return pen.finish();
  }
  let hasUnreadLength = false;
  const outcome = drawBasicShape(element.name, own, pen, {
    viewport: inherited.viewport,
    font: inherited.font,
    onProblem: (problem) => {
      if (problem === 'length-unread') hasUnreadLength = true;
      state.warnings.count(problem, () => state.at(element));
    },
  });
  if (outcome.pointsErrorIndex !== undefined) {
    const expected = 'expected pairs of numbers';
    warnOfError(element, 'points', 'list of points', outcome.pointsErrorIndex, expected, state, key);
  } else if (!outcome.drawn && !hasUnreadLength) state.warnings.count('flat-shape', () => state.at(element));
  return pen.finish();
}

function warnOfError(
  element: SvgElement,
  attribute: string,
  what: string,
  index: number,
  reason: string,
  state: ReadState,
  shapeKey: string,
): void {
  const at = state.source.at(attributeValueOffset(state.source.text, element.offset, attribute) + index);
  const message = `The ${what} is wrong at line ${at.line}, column ${at.column}: ${reason}. It is read up to there.`;
  state.warnings.locate('path-error', message, at, shapeKey);
}

function warnOfPaint(
  own: PropertyLookup,
  inherited: Inherited,
  mmPerUnit: number,
  state: ReadState,
  at: () => { line: number; column: number },
  key: string,
): void {
  const { fill, stroke, strokeWidth } = inherited.paint;
  if (fill.startsWith('url(') || stroke.startsWith('url('))
    state.warnings.count('gradient-or-pattern', at, key);
  if (stroke === 'none') return;
  const width = parseLength(strokeWidth);
  const widthMm = width ? (lengthPx(width, inherited.viewport.width, inherited.font) ?? 0) * mmPerUnit : 0;
  const keepsWidth = own('vector-effect') === 'non-scaling-stroke';
  if (widthMm > WIDE_STROKE_MM && !keepsWidth) state.warnings.count('wide-stroke', at, key);
}
