import type { Sort } from '#shared/api/vocabulary.ts';
import { BadCursor } from './document.ts';
import type { Position } from './orders.ts';

/** The last position of a page, so that the next begins after it even when documents came or went. */
export function writeCursor(sort: Sort, { value, id }: Position): string {
  return Buffer.from(`${sort}\n${id}\n${value}`).toString('base64url');
}

/** Throws BadCursor for text that `writeCursor` did not write for this order. */
export function readCursor(sort: Sort, cursor: string): Position {
  const bytes = Buffer.from(cursor, 'base64url');
  const text = bytes.toString();
  const [, writtenSort, id, written] = /^(\w+)\n([^\n]+)\n(.+)$/s.exec(text) ?? [];
  const isOurs = bytes.toString('base64url') === cursor && writtenSort === sort;
  if (!isOurs || id === undefined || written === undefined) throw new BadCursor();
  if (sort === 'title') return { value: written, id };
  if (sort === 'newest') {
    if (Number.isNaN(Date.parse(written))) throw new BadCursor();
    return { value: written, id };
  }
  const value = Number(written);
  if (!Number.isFinite(value) || String(value) !== written) throw new BadCursor();
  return { value, id };
}
