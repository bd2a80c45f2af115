// Control, direction and private characters, lone surrogates, and noncharacters (U+FFFE is not even XML);
// joiners stay, since scripts need them.
const UNSAFE = /(?:(?![\u200c\u200d])[\p{Cc}\p{Cf}\p{Co}\p{Cs}\p{Zl}\p{Zp}\p{Noncharacter_Code_Point}])+/gu;

/**
 * Makes a text from a member's file safe to show anywhere: no control or direction characters,
 * no markup (angle brackets become the single quotation marks that look like them), one line,
 * at most `maxCharacters` characters.
 */
export function plainText(text: string, maxCharacters: number): string {
  const oneLine = text
    .slice(0, maxCharacters * 8)
    .replace(UNSAFE, ' ')
    .replaceAll('<', '‹')
    .replaceAll('>', '›')
    .replace(/\s+/gu, ' ')
    .trim();
  const characters = Array.from(oneLine);
  if (characters.length <= maxCharacters) return oneLine;
  return `${characters.slice(0, maxCharacters - 1).join('')}…`;
}
