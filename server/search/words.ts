/** A number with its unit written on: `6.35mm`, `1/4in`. */
const numberAndUnit = /^(\d+(?:[./]\d+)*)(mm|cm|in|inch|inches|deg|rpm)$/;
/** Sizes written together: `90x15`. */
const sizesTogether = /^\d+(?:[./]\d+)*(?:x\d+(?:[./]\d+)*)+$/;

/** Letters without case and accents; ¼ becomes 1/4; Ø90 becomes 90; `bitTray` becomes `bit-tray`. */
function plain(text: string): string {
  return text
    .replace(/[Øø⌀](?=\s*\d)/g, ' ')
    .replace(/(\d)(?=[¼-¾⅐-⅞])/g, '$1 ')
    .normalize('NFKD')
    .replace(/[\p{M}'’]/gu, '')
    .replaceAll('\u2044', '/')
    .replace(/(\p{Ll})(?=\p{Lu})/gu, '$1-')
    .toLowerCase();
}

/**
 * The words of a text, each as its parts: `hold-down` and `hold_down` are `hold`, `down`; `ML-0142` is
 * `ml`, `0142`; but `1/4` and `6.35` are one size, which a search for 4 must not find.
 */
export function wordsOf(text: string): string[][] {
  const words = plain(text).match(/[\p{L}\p{N}]+(?:[-_./][\p{L}\p{N}]+)*/gu) ?? [];
  return words.map((word) => word.split(/[-_]|(?<!\d)[./]|[./](?!\d)/).flatMap(sizesApart));
}

function sizesApart(part: string): string[] {
  const [, size, unit] = numberAndUnit.exec(part) ?? [];
  if (size !== undefined && unit !== undefined) return [size, unit];
  return sizesTogether.test(part) ? part.split('x') : [part];
}

/** The terms that a text is indexed under: every part, and the parts written as one word. */
export function termsOf(text: string): string[] {
  return wordsOf(text).flatMap((parts) => (parts.length > 1 ? [...parts, parts.join('')] : parts));
}

/** A drawing number is also found without its prefix and without leading zeros: `ML-0142`, `ML142`, `142`. */
export function drawingNumberTerms(drawingNumber: string): string[] {
  const terms = termsOf(drawingNumber);
  const [, prefix, figures] = /^(.*?)-?0*([1-9]\d*)$/.exec(drawingNumber) ?? [];
  if (prefix === undefined || figures === undefined) return terms;
  return [...new Set([...terms, figures, ...termsOf(`${prefix}${figures}`)])];
}
