import { parseCssTransform } from './css-transform.ts';
import { declaredStyleOf, type PropertyLookup } from './element-style.ts';
import type { SvgElement } from './element-tree.ts';
import { type Matrix, multiply, translation } from './matrix.ts';
import type { Inherited, ReadState } from './read-state.ts';
import { attributeValueOffset } from './source-text.ts';
import { parseTransform } from './transform.ts';
import { lengthPx, parseLength } from './units.ts';

const KEYWORD_PERCENT: ReadonlyMap<string, string> = new Map([
  ['left', '0%'],
  ['top', '0%'],
  ['center', '50%'],
  ['right', '100%'],
  ['bottom', '100%'],
]);

/**
 * An element's own map to page millimetres: its transform, about its transform-origin, inside what it
 * stands in. A list that is wrong counts as none, as browsers do, and is told with its place.
 */
export function elementToMm(
  element: SvgElement,
  own: PropertyLookup,
  inherited: Inherited,
  state: ReadState,
): Matrix {
  const matrix = ownMatrix(element, own, inherited, state);
  if (!matrix) return inherited.toMm;
  const origin = own('transform-origin');
  if (!origin) return multiply(inherited.toMm, matrix);
  const { x, y } = readOrigin(origin, inherited);
  return multiply(inherited.toMm, multiply(translation(x, y), multiply(matrix, translation(-x, -y))));
}

/** The element's transform by itself; undefined when there is none that counts. */
function ownMatrix(
  element: SvgElement,
  own: PropertyLookup,
  inherited: Inherited,
  state: ReadState,
): Matrix | undefined {
  const text = own('transform');
  if (!text) return undefined;
  if (declaredStyleOf(element, state.inspection.sheet)?.('transform') !== undefined) {
    // What a style declares was judged when it was read; what is not worked out is told there.
    const declared = parseCssTransform(text, inherited.viewport);
    return declared.ok ? declared.matrix : undefined;
  }
  const result = parseTransform(text);
  if (result.ok) return result.matrix;
  const offset = attributeValueOffset(state.source.text, element.offset, 'transform') + result.errorIndex;
  const at = state.source.at(offset);
  const message = `The transform is wrong at line ${at.line}, column ${at.column}, so none was applied. Check where its shapes lie.`;
  state.warnings.locate('transform-error', message, at);
  return undefined;
}

/** The origin in user units; percentages and words refer to the viewport (CSS Transforms 1, view-box). */
function readOrigin(text: string, { viewport, font }: Inherited): { x: number; y: number } {
  const words = text.trim().toLowerCase().split(/\s+/);
  if (words[0] === 'top' || words[0] === 'bottom' || words[1] === 'left' || words[1] === 'right')
    words.reverse();
  const read = (word: string | undefined, percentOf: number) => {
    const length = parseLength(word === undefined ? '50%' : (KEYWORD_PERCENT.get(word) ?? word));
    return length ? (lengthPx(length, percentOf, font) ?? 0) : 0;
  };
  return { x: read(words[0], viewport.width), y: read(words[1], viewport.height) };
}
