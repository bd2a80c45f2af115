import { and, eq, type SQL, sql } from 'drizzle-orm';
import { isUuid } from '#server/db/is-uuid.ts';
import { flag } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { badCursor } from '#server/http/bad-cursor.ts';
import { type FlagRow, flagRows } from './flag-rows.ts';
import { presentFlag } from './present-flag.ts';

const pageSize = 50;

const gravity = { 'do-not-cut': 0, caution: 1, note: 2 } as const;

/** Open before decided; the open ones gravest first, then oldest; the decided ones newest first. */
const order = {
  isDecided: sql`(case when ${flag.isOpen} then 0 else 1 end)`,
  gravity: sql`(case when not ${flag.isOpen} then 9 when ${flag.level} = 'do-not-cut' then 0 when ${flag.level} = 'caution' then 1 else 2 end)`,
  age: sql`(case when ${flag.isOpen} then 1 else -1 end * (extract(epoch from ${flag.createdAt}) * 1000)::bigint)`,
  id: sql`${flag.id}`,
};

const positionOf = ({ flag }: FlagRow) =>
  flag.isOpen
    ? [0, gravity[flag.level], flag.createdAt.getTime(), flag.id]
    : [1, 9, -flag.createdAt.getTime(), flag.id];

const writeCursor = (row: FlagRow): string => Buffer.from(positionOf(row).join(' ')).toString('base64url');

/** What comes after the last flag of a page, even when others were raised or decided meanwhile. */
function after(cursor: string): SQL {
  const text = Buffer.from(cursor, 'base64url').toString();
  const [, isDecided, grave, age, id] = /^([01]) (\d) (-?\d{1,16}) ([0-9a-f-]{36})$/.exec(text) ?? [];
  if (id === undefined || !isUuid(id)) throw badCursor();
  return sql`(${order.isDecided}, ${order.gravity}, ${order.age}, ${order.id}) > (${Number(isDecided)}::int, ${Number(grave)}::int, ${Number(age)}::bigint, ${id}::uuid)`;
}

/** One page of the review desk. */
export async function listFlags(
  deps: Deps,
  query: { state?: 'open' | 'decided' | undefined; cursor?: string | undefined },
) {
  const { db } = deps.database;
  const inState = query.state === undefined ? undefined : eq(flag.isOpen, query.state === 'open');
  const rows = await flagRows(db, {
    where: and(inState, query.cursor === undefined ? undefined : after(query.cursor)),
    order: Object.values(order),
    limit: pageSize + 1,
  });
  const page = rows.slice(0, pageSize);
  const last = page.at(-1);
  return {
    items: page.map(presentFlag),
    total: await db.$count(flag, inState),
    nextCursor: rows.length > pageSize && last !== undefined ? writeCursor(last) : null,
  };
}
