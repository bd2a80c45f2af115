import type { SvgElement } from './element-tree.ts';
import { type Declarations, parseDeclarations, type StyleSheet } from './style-sheet.ts';

/** Looks up an element's own value of a property, before inheritance. */
export type PropertyLookup = (property: string) => string | undefined;

/**
 * The cascade for one element (SVG 2, Styling): important declarations, then the style attribute, then
 * rules of style sheets, then presentation attributes. `inherit`, `unset` and `initial` count as not set.
 */
export function styleOf(element: SvgElement, sheet: StyleSheet): PropertyLookup {
  const styleText = element.attributes['style'];
  const own = styleText ? parseDeclarations(styleText) : undefined;
  const rules = sheet.isEmpty ? undefined : sheet.match(element);
  if (!own && !rules) return (property) => usable(element.attributes[property]);
  return (property) =>
    usable(
      importantOf(own, property) ??
        importantOf(rules, property) ??
        own?.normal.get(property) ??
        rules?.normal.get(property) ??
        element.attributes[property],
    );
}

function importantOf(declarations: Declarations | undefined, property: string): string | undefined {
  return declarations?.important.get(property);
}

function usable(value: string | undefined): string | undefined {
  return value === undefined || value === 'inherit' || value === 'unset' || value === 'initial'
    ? undefined
    : value;
}
