import { parseCssTransform } from './css-transform.ts';
import { isFontUnit, MM_PER_UNIT, parseLength } from './units.ts';

/** The properties that decide what is cut and how it is named. */
const READ_PROPERTIES = new Set([
  'display',
  'visibility',
  'fill',
  'stroke',
  'stroke-width',
  'color',
  'font-size',
  'vector-effect',
  'transform',
  'transform-origin',
  'clip-path',
  'mask',
  'filter',
]);

/** Geometry that a style may set (SVG 2, Geometry Properties); these may not be below 0. */
const POSITIONS = new Set(['x', 'y', 'cx', 'cy']);
const SIZES = new Set(['width', 'height', 'r', 'rx', 'ry']);

/** Properties that move or shape what is cut and are not read, with the value that does nothing. */
const UNREAD_PROPERTIES: ReadonlyMap<string, string> = new Map([
  ['transform-box', 'view-box'],
  ['rotate', 'none'],
  ['translate', 'none'],
  ['scale', 'none'],
  ['offset', 'none'],
  ['offset-path', 'none'],
  ['d', ''],
  ['all', ''],
]);

const WIDE_KEYWORD = /^(?:initial|unset|revert)$/i;
const CALCULATED = /\b(?:calc|var|env|attr|min|max|clamp)\(/i;
const VIEWPORT_UNIT = /^[sld]?v(?:w|h|i|b|min|max)$/;
const DISPLAY =
  /^(?:none|(?:inline|block)(?:[\s-][a-z-]+)?|flow(?:-root)?|list-item|run-in|flex|grid|table(?:-[a-z-]+)?|ruby(?:-[a-z-]+)?|-webkit-[a-z-]+)$/i;

/**
 * What becomes of a declaration: `read`; `passed-over`, since it says nothing of what is cut; `invalid`,
 * which browsers drop, so that a weaker declaration or the attribute counts; `wrong-transform`, the same
 * for a transform; `unread`, which counts but is not worked out here.
 */
export type Judgement = 'read' | 'passed-over' | 'invalid' | 'wrong-transform' | 'unread';

/** Judges one declaration of a style; `property` is in lower case. */
export function judgeDeclaration(property: string, value: string): Judgement {
  const isGeometry = POSITIONS.has(property) || SIZES.has(property);
  const idle = UNREAD_PROPERTIES.get(property);
  if (!isGeometry && idle === undefined && !READ_PROPERTIES.has(property)) return 'passed-over';
  if (WIDE_KEYWORD.test(value)) return property === 'all' ? 'unread' : 'read';
  if (idle !== undefined) return value.toLowerCase() === idle ? 'passed-over' : 'unread';
  if (/^revert-layer$/i.test(value)) return 'unread';
  const takesOver = /^inherit$/i.test(value);
  if (isGeometry || property.startsWith('transform')) {
    if (takesOver || CALCULATED.test(value)) return 'unread';
    if (isGeometry) return isLength(value, SIZES.has(property)) ? 'read' : 'invalid';
    if (property === 'transform-origin') return isOrigin(value) ? 'read' : 'invalid';
    const result = parseCssTransform(value, { width: 1, height: 1 });
    if (result.ok) return 'read';
    return result.why === 'unread' ? 'unread' : 'wrong-transform';
  }
  if (takesOver) return 'read';
  if (property !== 'display' && property !== 'visibility') return 'read';
  if (CALCULATED.test(value) || /^contents$/i.test(value)) return 'unread';
  const grammar = property === 'display' ? DISPLAY : /^(?:visible|hidden|collapse)$/i;
  return grammar.test(value) ? 'read' : 'invalid';
}

function isLength(value: string, isSize: boolean): boolean {
  if (/^auto$/i.test(value)) return isSize;
  const length = parseLength(value);
  if (!length || (isSize && length.value < 0)) return false;
  const { unit } = length;
  return unit === '' || unit === '%' || MM_PER_UNIT.has(unit) || isFontUnit(unit) || VIEWPORT_UNIT.test(unit);
}

/** One to three words; bare numbers other than 0 are no lengths in a style. */
function isOrigin(value: string): boolean {
  const words = value.split(/\s+/);
  return (
    words.length <= 3 &&
    words.every((word) => {
      if (/^(?:left|right|top|bottom|center)$/i.test(word)) return true;
      const length = parseLength(word);
      return length !== undefined && isLength(word, false) && (length.unit !== '' || length.value === 0);
    })
  );
}
