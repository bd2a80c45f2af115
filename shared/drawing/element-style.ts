import type { SvgElement } from './element-tree.ts';
import type { StyleSheet } from './style-sheet.ts';

/** Looks up an element's own value of a property, before inheritance. */
export type PropertyLookup = (property: string) => string | undefined;

/** Initial values of the properties that are inherited (SVG 2): `initial` sets them, whatever stands outside. */
const INITIAL_OF_INHERITED: ReadonlyMap<string, string> = new Map([
  ['visibility', 'visible'],
  ['fill', 'black'],
  ['stroke', 'none'],
  ['stroke-width', '1'],
  ['color', 'black'],
  ['font-size', 'medium'],
]);

/**
 * The cascade for one element (SVG 2, Styling): important declarations, then the style attribute, then
 * rules of style sheets, then presentation attributes. `inherit`, `unset` and `revert` count as not set,
 * `initial` as the initial value.
 */
export function styleOf(element: SvgElement, sheet: StyleSheet): PropertyLookup {
  const declared = declaredStyleOf(element, sheet);
  if (!declared) return (property) => usable(property, element.attributes[property]);
  return (property) => usable(property, declared(property) ?? element.attributes[property]);
}

/** What style attribute and rules say, attributes left out, keywords as written; undefined when neither is there. */
export function declaredStyleOf(element: SvgElement, sheet: StyleSheet): PropertyLookup | undefined {
  const styleText = element.attributes['style'];
  const own = styleText ? sheet.declarationsOf(styleText) : undefined;
  const rules = sheet.isEmpty ? undefined : sheet.match(element);
  if (!own && !rules) return undefined;
  return (property) =>
    own?.important.get(property) ??
    rules?.important.get(property) ??
    own?.normal.get(property) ??
    rules?.normal.get(property);
}

const KEYWORD = /^\s*(?:(initial)|inherit|unset|revert)\s*$/i;

function usable(property: string, value: string | undefined): string | undefined {
  if (value === undefined || value.length > 20) return value;
  const keyword = KEYWORD.exec(value);
  if (!keyword) return value;
  return keyword[1] ? INITIAL_OF_INHERITED.get(property) : undefined;
}

/** True for `display: none`, which takes the whole subtree out. */
export function isNotDisplayed(own: PropertyLookup): boolean {
  return own('display')?.trim().toLowerCase() === 'none';
}

/** Visibility of an element; a word that is none of the property's counts as not set. */
export function isVisible(own: PropertyLookup, inherited: boolean): boolean {
  const word = own('visibility')?.trim().toLowerCase();
  if (word === 'visible') return true;
  return word === 'hidden' || word === 'collapse' ? false : inherited;
}
