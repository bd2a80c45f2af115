import { type INode, parseSync } from 'svgson';
import { KEPT_VALUE, type TreeMarkup } from './markup-for-tree.ts';

/** An element of the file, its attribute values and text with their references resolved. */
export interface SvgElement {
  readonly name: string;
  readonly attributes: Readonly<Record<string, string>>;
  readonly children: readonly SvgElement[];
  /** Text directly inside the element. */
  readonly text: string;
  /** Offset of its `<` in the file. */
  readonly offset: number;
}

const NAMED: ReadonlyMap<string, string> = new Map([
  ['lt', '<'],
  ['gt', '>'],
  ['amp', '&'],
  ['quot', '"'],
  ['apos', "'"],
]);

/**
 * Builds the tree of markup that was made ready for it; the markup must be well-formed. `elementNames`
 * are the names with their namespaces resolved, in document order.
 */
export function buildElementTree(
  { markup, elementOffsets, keptValues }: TreeMarkup,
  elementNames: readonly string[],
): SvgElement {
  let index = 0;
  const convert = (node: INode): SvgElement => {
    const name = elementNames[index] ?? node.name;
    const offset = elementOffsets[index++] ?? 0;
    const attributes = node.attributes;
    for (const key in attributes) {
      const value = attributes[key];
      if (!value?.includes('&')) continue;
      const written = value.startsWith(KEPT_VALUE)
        ? keptValues[Number(value.slice(KEPT_VALUE.length))]
        : value;
      attributes[key] = resolveReferences(written ?? '');
    }
    const children: SvgElement[] = [];
    let text = '';
    for (const child of node.children) {
      if (child.type === 'text') text += resolveReferences(child.value);
      else children.push(convert(child));
    }
    return { name, attributes, children, text, offset };
  };
  return convert(parseSync(markup));
}

/** Resolves the five named and the numeric character references of XML 1.0. */
export function resolveReferences(text: string): string {
  if (!text.includes('&')) return text;
  return text.replace(
    /&(?:#x([\da-f]+)|#(\d+)|(\w+));/gi,
    (whole, hex?: string, decimal?: string, name?: string) => {
      if (name) return NAMED.get(name) ?? whole;
      const code = hex ? Number.parseInt(hex, 16) : Number(decimal);
      return code > 0 && code <= 0x10ffff ? String.fromCodePoint(code) : '';
    },
  );
}
