import type { SvgElement } from './element-tree.ts';
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
  const visit = (element: SvgElement) => {
    const at = () => source.at(element.offset);
    if (element.name === 'script') warnings.count('script', at);
    else if (ANIMATIONS.has(element.name)) warnings.count('animation', at);
    else if (element.name === 'style') {
      sheet.add(element.text);
      if (EXTERNAL_URL.test(element.text)) warnings.count('external-reference', at);
    }
    for (const name in element.attributes)
      inspectAttribute(name, element.attributes[name] ?? '', warnings, at);
    const id = element.attributes['id'];
    if (id && !byId.has(id)) byId.set(id, element);
    for (const child of element.children) visit(child);
  };
  visit(root);
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
