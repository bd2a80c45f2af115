/** What a mail says, before it is laid out. */
export interface Letter {
  subject: string;
  /** Plain words; nothing in them is markup. */
  paragraphs: readonly string[];
  link?: { words: string; href: string };
  closing: string;
}

const entities: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

export const escapeHtml = (text: string): string =>
  text.replace(/[&<>"']/g, (sign) => entities[sign] ?? sign);

/** One line: what a title or name holds cannot begin another header. */
const oneLine = (text: string): string => text.replace(/[\p{Cc}\u2028\u2029]+/gu, ' ').trim();

/** The same letter as plain text and as simple HTML without images, styles from elsewhere or scripts. */
export function layOut({ subject, paragraphs, link, closing }: Letter): {
  subject: string;
  text: string;
  html: string;
} {
  const linkLines = link === undefined ? [] : [`${link.words}:\n${link.href}`];
  const linkMarkup =
    link === undefined ? [] : [`<p><a href="${escapeHtml(link.href)}">${escapeHtml(link.words)}</a></p>`];
  const markup = [
    ...paragraphs.map((paragraph) => `<p>${escapeHtml(paragraph)}</p>`),
    ...linkMarkup,
    `<p>${escapeHtml(closing)}</p>`,
  ];
  const title = oneLine(subject);
  return {
    subject: title,
    text: `${[...paragraphs, ...linkLines, closing].join('\n\n')}\n`,
    html: `<!doctype html>\n<html lang="en"><head><meta charset="utf-8"><title>${escapeHtml(title)}</title></head>\n<body>\n${markup.join('\n')}\n</body></html>\n`,
  };
}
