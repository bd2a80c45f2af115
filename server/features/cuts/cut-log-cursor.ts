import { isUuid } from '#server/db/is-uuid.ts';
import { badCursor } from '#server/http/bad-cursor.ts';

/** The last record of a page: the next page begins after it, whatever came in meanwhile. */
export interface LogPlace {
  createdAt: Date;
  id: string;
}

export const writeLogCursor = ({ createdAt, id }: LogPlace): string =>
  Buffer.from(`${createdAt.toISOString()}\n${id}`).toString('base64url');

/** The place that a cursor of ours names, or 400. */
export function readLogCursor(cursor: string): LogPlace {
  const [instant = '', id = '', ...more] = Buffer.from(cursor, 'base64url').toString().split('\n');
  const createdAt = new Date(instant);
  const isOurs =
    more.length === 0 &&
    isUuid(id) &&
    !Number.isNaN(createdAt.getTime()) &&
    writeLogCursor({ createdAt, id }) === cursor;
  if (isOurs) return { createdAt, id };
  throw badCursor();
}
