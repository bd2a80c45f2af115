import { fontShorthandSize } from './inherit-font.ts';
import { judgeDeclaration } from './judge-declaration.ts';

/** Declarations by property name; `important` ones win over all that are not. */
export interface Declarations {
  readonly normal: ReadonlyMap<string, string>;
  readonly important: ReadonlyMap<string, string>;
  /** Something that shapes or moves what is cut was declared in a way that is not read. */
  readonly hasUnread: boolean;
  /** A transform was left out, because browsers drop it. */
  readonly hasWrongTransform: boolean;
}

/** Where one declaration ends: semicolons inside brackets and quotes do not end it. */
function declarationEnd(text: string, from: number): number {
  for (let i = from; i < text.length; i++) {
    const character = text.charAt(i);
    if (character === ';') return i;
    if (character !== '"' && character !== "'" && character !== '(') continue;
    const close = text.indexOf(character === '(' ? ')' : character, i + 1);
    if (close < 0) return text.length;
    i = close;
  }
  return text.length;
}

/** Reads `name: value; …`, keeping what says anything of the shapes to be cut. */
export function parseDeclarations(text: string): Declarations {
  const normal = new Map<string, string>();
  const important = new Map<string, string>();
  let hasUnread = false;
  let hasWrongTransform = false;
  for (let at = 0; at < text.length; ) {
    const end = declarationEnd(text, at);
    const part = text.slice(at, end);
    at = end + 1;
    const colon = part.indexOf(':');
    if (colon < 0) continue;
    let property = part.slice(0, colon).trim().toLowerCase();
    const written = part.slice(colon + 1).trim();
    let value = written.replace(/\s*!\s*important$/i, '');
    const isImportant = value !== written;
    if (property === 'font') {
      property = 'font-size';
      value = fontShorthandSize(value) ?? value;
    }
    const judgement = judgeDeclaration(property, value);
    if (judgement === 'wrong-transform') hasWrongTransform = true;
    if (judgement === 'unread' || judgement === 'invalid') hasUnread = true;
    if (judgement === 'read' || judgement === 'unread')
      (isImportant ? important : normal).set(property, value);
  }
  return { normal, important, hasUnread, hasWrongTransform };
}
