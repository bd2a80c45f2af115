import { SaxesParser } from 'saxes';
import { DRAWING_LIMITS, REPORT_LIMITS } from './limits.ts';
import { elementName, SVG_NAMESPACE, svgNamespaces } from './namespaces.ts';
import { plainText } from './plain-text.ts';
import { refuse } from './refusals.ts';
import type { DrawingRefusal } from './types.ts';

/** What the strict pass over the markup found. */
export type MarkupCheck =
  | {
      readonly ok: true;
      /** Name of the root as written, with its prefix. */
      readonly rootName: string;
      /** Names of all elements in document order, namespaces resolved. */
      readonly elementNames: readonly string[];
      readonly hasDoctype: boolean;
    }
  | { readonly ok: false; readonly refusal: DrawingRefusal };

/** Stops the parser from inside its callbacks; it never leaves this file. */
class StopParsing extends Error {
  readonly refusal: DrawingRefusal;
  constructor(refusal: DrawingRefusal) {
    super(refusal.message);
    this.refusal = refusal;
  }
}

/**
 * Strict pass before the tree is built: the tree builder itself takes ill-formed markup and knows no
 * positions. Checks well-formedness (XML 1.0), that the root is `svg`, nesting, and the DOCTYPE, and
 * resolves the namespaces.
 */
export function checkMarkup(text: string): MarkupCheck {
  const parser = new SaxesParser({ xmlns: true, position: true });
  let depth = 0;
  let rootName = '';
  let hasDoctype = false;
  let namespaces: ReadonlySet<string> | undefined;
  const elementNames: string[] = [];
  const here = () => ({ line: parser.line, column: Math.max(1, parser.column) });
  const stop = (refusal: DrawingRefusal): never => {
    throw new StopParsing(refusal);
  };
  parser.on('doctype', (doctype) => {
    if (/^\s*html\b/i.test(doctype)) stop(refuse.html());
    if (/<!ENTITY/i.test(doctype)) stop(refuse.entities(here()));
    hasDoctype = true;
  });
  parser.on('opentagstart', (tag) => {
    depth++;
    if (depth > DRAWING_LIMITS.levels) stop(refuse.tooDeep(here()));
    if (depth > 1) return;
    rootName = tag.name;
    if (/^html$/i.test(rootName)) stop(refuse.html());
    if (!/^([\w.-]+:)?svg$/.test(rootName)) {
      stop(
        refuse.notSvg(
          `its root element is “${plainText(rootName, REPORT_LIMITS.detailCharacters)}”, not “svg”`,
        ),
      );
    }
  });
  parser.on('opentag', (tag) => {
    namespaces ??= svgNamespaces(tag);
    if (!namespaces) {
      const uri = plainText(tag.uri, REPORT_LIMITS.detailCharacters);
      return stop(refuse.notSvg(`its root element is in the namespace “${uri}”, not “${SVG_NAMESPACE}”`));
    }
    elementNames.push(elementName(tag, namespaces));
  });
  parser.on('closetag', () => {
    depth--;
  });
  parser.on('error', (error) => {
    // Many files use xlink:href or an editor's prefix without declaring it: told apart well enough without.
    if (error.message.includes('unbound namespace prefix: ')) return;
    const reason = plainText(error.message.replace(/^(\S*?\d+:\d+: )/, ''), REPORT_LIMITS.detailCharacters);
    stop(refuse.illFormed(reason.replace(/\.$/, ''), here()));
  });
  try {
    parser.write(text).close();
  } catch (error) {
    if (error instanceof StopParsing) return { ok: false, refusal: error.refusal };
    throw error;
  }
  return { ok: true, rootName, elementNames, hasDoctype };
}
