import { and, asc, eq } from 'drizzle-orm';
import { isUuid } from '#server/db/is-uuid.ts';
import type { bit, machine, stock } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import { createOnce, requestHash } from '#server/idempotency.ts';
import { mine } from './policy.ts';

type ShelfTable = typeof machine | typeof bit | typeof stock;

/** One kind of thing on a member's bench: machines, bits and stock are kept in the same way. */
export interface Shelf<Given extends object, Shown> {
  list(memberId: string): Promise<{ items: Shown[]; total: number; nextCursor: null }>;
  add(memberId: string, given: Given, key: string | undefined): Promise<Shown>;
  change(memberId: string, id: string, change: Given & { version: number }): Promise<Shown>;
  remove(memberId: string, id: string): Promise<void>;
}

/** How many things of a kind one member may keep: far over any real bench, under what a script could fill. */
const most = 200;

export function shelf<Given extends object, Shown>(
  deps: Deps,
  table: ShelfTable,
  what: string,
  columns: readonly string[],
  present: (row: never) => Shown,
): Shelf<Given, Shown> {
  const { db } = deps.database;
  const missing = () => new ProblemError(404, `${what}.not-found`, `There is no such ${what} on your bench.`);
  const show = (row: unknown) => present(row as never);
  // A field that is not given is emptied: a change always sends the whole thing.
  const whole = (given: object) => ({
    ...Object.fromEntries(columns.map((column) => [column, null])),
    ...given,
  });
  const find = async (memberId: string, id: string) => {
    if (!isUuid(id)) throw missing();
    const [row] = await db
      .select()
      .from(table as typeof bit)
      .where(mine(table, id, memberId));
    if (row === undefined) throw missing();
    return row;
  };
  return {
    async list(memberId) {
      const rows = await db
        .select()
        .from(table as typeof bit)
        .where(eq(table.ownerId, memberId))
        .orderBy(asc(table.createdAt), asc(table.id));
      return { items: rows.map(show), total: rows.length, nextCursor: null };
    },
    async add(memberId, given, key) {
      const request = requestHash(what, JSON.stringify(given));
      return createOnce(deps, { memberId, key, request }, async (tx) => {
        if ((await tx.$count(table, eq(table.ownerId, memberId))) >= most) {
          throw new ProblemError(
            409,
            `${what}.too-many`,
            `Your bench already holds ${most} of these. Remove one first.`,
          );
        }
        const values = {
          ...whole(given),
          id: deps.ids.next(),
          ownerId: memberId,
          createdAt: deps.clock.now(),
        };
        const [row] = await tx
          .insert(table as typeof bit)
          .values(values as never)
          .returning();
        return show(row);
      });
    },
    async change(memberId, id, { version, ...given }) {
      await find(memberId, id);
      const [row] = await db
        .update(table as typeof bit)
        .set({ ...whole(given), version: version + 1 } as never)
        .where(and(mine(table, id, memberId), eq(table.version, version)))
        .returning();
      if (row === undefined) {
        throw new ProblemError(
          409,
          `${what}.changed`,
          `This ${what} was changed in the meantime. Look at it as it is now, then change it again.`,
          { current: show(await find(memberId, id)) },
        );
      }
      return show(row);
    },
    async remove(memberId, id) {
      await find(memberId, id);
      await db.delete(table as typeof bit).where(mine(table, id, memberId));
    },
  };
}
