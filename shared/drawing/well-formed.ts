import { SaxesParser } from 'saxes';
import { DRAWING_LIMITS, REPORT_LIMITS } from './limits.ts';
import { plainText } from './plain-text.ts';
import { refuse } from './refusals.ts';
import type { DrawingRefusal } from './types.ts';

/** What the strict pass over the markup found. */
export type MarkupCheck =
  | { readonly ok: true; readonly rootName: string; readonly hasDoctype: boolean }
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
 * positions. Checks well-formedness (XML 1.0), that the root is `svg`, nesting, and the DOCTYPE.
 */
export function checkMarkup(text: string): MarkupCheck {
  const parser = new SaxesParser({ xmlns: false, position: true });
  let depth = 0;
  let rootName = '';
  let hasDoctype = false;
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
  parser.on('closetag', () => {
    depth--;
  });
  parser.on('error', (error) => {
    const reason = plainText(error.message.replace(/^(\S*?\d+:\d+: )/, ''), REPORT_LIMITS.detailCharacters);
    stop(refuse.illFormed(reason.replace(/\.$/, ''), here()));
  });
  try {
    parser.write(text).close();
  } catch (error) {
    if (error instanceof StopParsing) return { ok: false, refusal: error.refusal };
    throw error;
  }
  return { ok: true, rootName, hasDoctype };
}
