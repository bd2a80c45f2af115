/** Markup with nothing in it but elements and text, and where each element started in the file. */
export interface TreeMarkup {
  readonly markup: string;
  /** Offset of `<` of each element in the file, in document order. */
  readonly elementOffsets: readonly number[];
  /** Attribute values taken out of the markup, which holds `&kept;` and the index instead. */
  readonly keptValues: readonly string[];
  /** An `xml-stylesheet` instruction was dropped. */
  readonly hasStylesheetInstruction: boolean;
}

/** Stands for a value that was taken out; no well-formed markup without entities can hold it. */
export const KEPT_VALUE = '&kept;';
/** Values longer than this do not go through the tree builder, which takes them one character at a time. */
const LONGEST_VALUE_LEFT = 48;

/**
 * Takes out of well-formed markup what the tree builder reads wrongly: comments, instructions, the
 * DOCTYPE; CDATA becomes escaped text (the builder's own CDATA reading takes quadratic time);
 * long attribute values are kept aside, since path data would take the builder ten times as long.
 * `prefix` is the root's namespace prefix with its colon, or empty: it is dropped from element names.
 */
export function markupForTree(text: string, prefix: string): TreeMarkup {
  const kept: string[] = [];
  const elementOffsets: number[] = [];
  const keptValues: string[] = [];
  let hasStylesheetInstruction = false;
  let keepFrom = 0;
  const replace = (from: number, to: number, by: string) => {
    kept.push(text.slice(keepFrom, from), by);
    keepFrom = to;
  };
  for (let i = text.indexOf('<'); i >= 0; ) {
    const next = text.charAt(i + 1);
    let end: number;
    if (next === '?') {
      end = after(text, '?>', i + 2);
      if (text.startsWith('<?xml-stylesheet', i)) hasStylesheetInstruction = true;
      replace(i, end, '');
    } else if (text.startsWith('<!--', i)) {
      end = after(text, '-->', i + 4);
      replace(i, end, '');
    } else if (text.startsWith('<![CDATA[', i)) {
      end = after(text, ']]>', i + 9);
      replace(i, end, escapeText(text.slice(i + 9, end - 3)));
    } else if (next === '!') {
      end = doctypeEnd(text, i);
      replace(i, end, '');
    } else {
      const nameAt = next === '/' ? i + 2 : i + 1;
      if (next !== '/') elementOffsets.push(i);
      if (prefix && text.startsWith(prefix, nameAt)) replace(nameAt, nameAt + prefix.length, '');
      end = tagEnd(text, nameAt, (from, to) => {
        replace(from, to, `${KEPT_VALUE}${keptValues.length}`);
        keptValues.push(text.slice(from, to));
      });
    }
    i = text.indexOf('<', end);
  }
  kept.push(text.slice(keepFrom));
  return { markup: kept.join(''), elementOffsets, keptValues, hasStylesheetInstruction };
}

function after(text: string, mark: string, from: number): number {
  const found = text.indexOf(mark, from);
  return found < 0 ? text.length : found + mark.length;
}

function escapeText(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;');
}

/** Index after the `>` of a tag; tells of the long quoted values on the way. */
function tagEnd(text: string, from: number, onLongValue: (from: number, to: number) => void): number {
  for (let i = from; i < text.length; i++) {
    const code = text.charCodeAt(i);
    if (code === 62) return i + 1;
    if (code !== 34 && code !== 39) continue;
    const close = after(text, code === 34 ? '"' : "'", i + 1) - 1;
    if (close - i > LONGEST_VALUE_LEFT) onLongValue(i + 1, close);
    i = close;
  }
  return text.length;
}

/** End of a DOCTYPE, its internal subset (which declares no entities) included. */
function doctypeEnd(text: string, from: number): number {
  let inSubset = false;
  for (let i = from; i < text.length; i++) {
    const character = text.charAt(i);
    if (character === '"' || character === "'") i = after(text, character, i + 1) - 1;
    else if (inSubset && text.startsWith('<!--', i)) i = after(text, '-->', i + 4) - 1;
    else if (inSubset && text.startsWith('<?', i)) i = after(text, '?>', i + 2) - 1;
    else if (character === '[') inSubset = true;
    else if (character === ']') inSubset = false;
    else if (character === '>' && !inSubset) return i + 1;
  }
  return text.length;
}
