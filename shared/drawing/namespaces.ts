/** The namespace of SVG elements (SVG 2, 5.1). */
export const SVG_NAMESPACE = 'http://www.w3.org/2000/svg';

/** Stands before the names of elements of other namespaces, so that none is taken for an SVG element. */
const FOREIGN_MARK = 'other:';

/** The namespace, prefix and local name that the strict pass found for a tag. */
export interface NamedTag {
  readonly uri: string;
  readonly prefix: string;
  readonly local: string;
}

/**
 * The namespaces whose elements are read as SVG, decided by the root; undefined when the root is none.
 * Files written by hand may leave out the declaration, or the one of their prefix: these are read all the same.
 */
export function svgNamespaces(root: NamedTag): ReadonlySet<string> | undefined {
  const isUndeclared = root.uri === root.prefix;
  if (root.uri !== SVG_NAMESPACE && !isUndeclared) return undefined;
  return new Set([SVG_NAMESPACE, root.uri]);
}

/** Name by which an element goes from here on: its local name in SVG, a marked one elsewhere. */
export function elementName(tag: NamedTag, namespaces: ReadonlySet<string>): string {
  return namespaces.has(tag.uri) ? tag.local : `${FOREIGN_MARK}${tag.local}`;
}

/** The local name of an element of another namespace; undefined for SVG elements. */
export function foreignName(name: string): string | undefined {
  return name.startsWith(FOREIGN_MARK) ? name.slice(FOREIGN_MARK.length) : undefined;
}
