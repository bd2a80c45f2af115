import type { DrawingRefusal } from '#shared/drawing/types.ts';

export type FileText =
  | { readonly ok: true; readonly text: string }
  | { readonly ok: false; readonly refusal: DrawingRefusal };

const saveAsUtf8 = 'Save it as UTF-8 (in the export settings, or with a text editor) and choose that file.';

/** The text of an uploaded file. Only UTF-8 is read, with or without a byte order mark. */
export function fileText(bytes: Uint8Array): FileText {
  if (looksLikeUtf16(bytes)) return refused(`The file is written in UTF-16, not UTF-8. ${saveAsUtf8}`);
  try {
    return { ok: true, text: new TextDecoder('utf-8', { fatal: true }).decode(bytes) };
  } catch {
    return refused(`The file has bytes that are not UTF-8 text. ${saveAsUtf8}`);
  }
}

const refused = (message: string): FileText => ({ ok: false, refusal: { code: 'not-utf8', message } });

/** By its mark, or by the zero byte that UTF-16 puts beside the first `<`. */
function looksLikeUtf16(bytes: Uint8Array): boolean {
  const [first, second] = bytes;
  if (first === undefined || second === undefined) return false;
  const pair = (first << 8) | second;
  return pair === 0xfeff || pair === 0xfffe || pair === 0x003c || pair === 0x3c00;
}
