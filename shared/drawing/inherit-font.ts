import type { PropertyLookup } from './element-style.ts';
import type { FontSizes } from './font-size.ts';
import { lengthPx, parseLength } from './units.ts';

/** Pixels of the size words of CSS Fonts 4 for a medium of 16 px, as browsers have them. */
const WORD_PX: ReadonlyMap<string, number> = new Map([
  ['xx-small', 9],
  ['x-small', 10],
  ['small', 13],
  ['medium', 16],
  ['large', 18],
  ['x-large', 24],
  ['xx-large', 32],
  ['xxx-large', 48],
]);

/** The font sizes inside an element; a size that is not plainly written is passed over and remembered as unknown. */
export function inheritFont(parent: FontSizes, own: PropertyLookup, isRoot = false): FontSizes {
  const text = own('font-size')?.trim().toLowerCase();
  if (text === undefined) return parent;
  const sizePx = readSize(text, parent);
  if (sizePx === undefined) return { ...parent, isKnown: false };
  // A size in em or percent of an unknown one stays unknown.
  const isKnown = parent.isKnown || !/(?:em|ex|ch|%)$/.test(text);
  return { sizePx, rootSizePx: isRoot ? sizePx : parent.rootSizePx, isKnown };
}

function readSize(text: string, parent: FontSizes): number | undefined {
  const word = WORD_PX.get(text);
  if (word !== undefined) return word;
  const length = parseLength(text);
  if (!length || length.value < 0 || length.unit === 'ex' || length.unit === 'ch') return undefined;
  return lengthPx(length, parent.sizePx, parent);
}

/** The size in a `font` shorthand (`bold 10px/2 serif`); undefined when it is not plainly there. */
export function fontShorthandSize(value: string): string | undefined {
  const sized = /(?:^|\s)((?:\d*\.)?\d+(?:[a-z]{1,4}|%)|(?:x{1,3}-)?(?:small|large)|medium)(?=[\s/])/i;
  return sized.exec(value)?.[1];
}
