import { SHAPE_NAMES } from './draw-shape.ts';
import type { SvgElement } from './element-tree.ts';
import { foreignName } from './namespaces.ts';
import type { LineColumn } from './refusals.ts';
import type { SourceText } from './source-text.ts';
import { StyleSheet } from './style-sheet.ts';
import type { WarningCollector } from './warnings.ts';

/** What is known of the whole file before anything is drawn. */
export interface Inspection {
  readonly byId: ReadonlyMap<string, SvgElement>;
  readonly sheet: StyleSheet;
}

const ANIMATIONS = new Set(['animate', 'animateMotion', 'animateTransform', 'animateColor', 'set']);
const EXTERNAL_URL = /url\(\s*["']?(?!\s*["']?#)(?!data:)[^)]/i;

/** What an element stands in: SVG, an element of another namespace, or data and pages that are never drawn. */
type Surroundings = 'svg' | 'foreign' | 'not-drawn';

const NOT_DRAWN = new Set(['metadata', 'foreignObject', 'title', 'desc', 'script', 'style']);
const DRAWN_CONTAINERS = new Set(['g', 'svg', 'use', 'text', 'image']);

/** Tells of what looks like a part of the drawing and is none: by its own namespace, or by that of its parent. */
function surroundingsIn(element: SvgElement, around: Surroundings, onForeign: () => void): Surroundings {
  if (around === 'not-drawn' || NOT_DRAWN.has(element.name)) return 'not-drawn';
  const foreign = foreignName(element.name);
  if (foreign === undefined) {
    if (around === 'foreign' && SHAPE_NAMES.has(element.name)) onForeign();
    return around;
  }
  if (!SHAPE_NAMES.has(foreign) && !DRAWN_CONTAINERS.has(foreign)) return 'foreign';
  onForeign();
  return 'not-drawn';
}

function warnOfWrongTransform(warnings: WarningCollector, at: LineColumn): void {
  const message = `A transform in the style at line ${at.line} is wrong, so it was not applied: a style needs units and commas, as in translate(10px, 5px). Check where its shapes lie.`;
  warnings.locate('transform-error', message, at);
}

/**
 * Looks at every element, drawn or not: collects ids and style rules, and tells of scripts, event
 * handlers, animations and references out of the file. None of these ever leaves the reader.
 */
export function inspectElements(
  root: SvgElement,
  source: SourceText,
  warnings: WarningCollector,
): Inspection {
  const byId = new Map<string, SvgElement>();
  const sheet = new StyleSheet();
  const visit = (element: SvgElement, around: Surroundings) => {
    const at = () => source.at(element.offset);
    if (element.name === 'script') warnings.count('script', at);
    else if (ANIMATIONS.has(element.name)) warnings.count('animation', at);
    else if (element.name === 'style') {
      const hadWrongTransform = sheet.hasWrongTransform;
      sheet.add(element.text);
      if (sheet.hasWrongTransform && !hadWrongTransform) warnOfWrongTransform(warnings, at());
      if (EXTERNAL_URL.test(element.text)) warnings.count('external-reference', at);
    }
    for (const name in element.attributes)
      inspectAttribute(name, element.attributes[name] ?? '', warnings, at);
    const styleText = element.attributes['style'];
    if (styleText) {
      const { hasUnread, hasWrongTransform } = sheet.declarationsOf(styleText);
      if (hasUnread) warnings.count('style-unread', at);
      if (hasWrongTransform) warnOfWrongTransform(warnings, at());
    }
    const inside = surroundingsIn(element, around, () => warnings.count('foreign-namespace', at));
    const id = element.attributes['id'];
    if (id && !byId.has(id)) byId.set(id, element);
    for (const child of element.children) visit(child, inside);
  };
  visit(root, 'svg');
  if (sheet.hasImport) warnings.count('external-reference');
  if (sheet.hasUnreadRules) warnings.count('style-unread');
  return { byId, sheet };
}

function inspectAttribute(
  name: string,
  value: string,
  warnings: WarningCollector,
  at: () => { line: number; column: number },
): void {
  if (/^on[a-z]/i.test(name)) warnings.count('event-handler', at);
  else if (name === 'href' || name.endsWith(':href')) {
    const target = value.trim();
    if (/^javascript:/i.test(target)) warnings.count('script', at);
    else if (target !== '' && !target.startsWith('#') && !/^data:/i.test(target)) {
      warnings.count('external-reference', at);
    }
  } else if (value.includes('url(') && EXTERNAL_URL.test(value)) warnings.count('external-reference', at);
}
