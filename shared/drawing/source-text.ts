import type { LineColumn } from './refusals.ts';

/** Turns offsets in the file into lines and columns, both counted from 1 (columns in UTF-16 units). */
export class SourceText {
  readonly text: string;
  #lineStarts: number[] | undefined;

  constructor(text: string) {
    this.text = text;
  }

  at(offset: number): LineColumn {
    const starts = this.#starts();
    let low = 0;
    let high = starts.length - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if ((starts[middle] ?? 0) <= offset) low = middle;
      else high = middle - 1;
    }
    return { line: low + 1, column: offset - (starts[low] ?? 0) + 1 };
  }

  #starts(): number[] {
    if (this.#lineStarts) return this.#lineStarts;
    const starts = [0];
    for (let i = this.text.indexOf('\n'); i >= 0; i = this.text.indexOf('\n', i + 1)) starts.push(i + 1);
    this.#lineStarts = starts;
    return starts;
  }
}

/**
 * Offset of the first character of an attribute's value in the tag that starts at `tagOffset`;
 * the tag's own offset when the attribute is not written there. The markup must be well-formed.
 */
export function attributeValueOffset(text: string, tagOffset: number, attribute: string): number {
  const tag = /[^\s/>"'=]+\s*=\s*(["'])/y;
  let i = tagOffset + 1;
  while (i < text.length && !/[\s/>]/.test(text.charAt(i))) i++;
  for (;;) {
    while (i < text.length && /\s/.test(text.charAt(i))) i++;
    tag.lastIndex = i;
    const match = tag.exec(text);
    if (!match?.[1]) return tagOffset;
    const valueAt = tag.lastIndex;
    if (match[0].split('=', 1)[0]?.trim() === attribute) return valueAt;
    i = text.indexOf(match[1], valueAt) + 1;
    if (i === 0) return tagOffset;
  }
}
