import { eq, lt } from 'drizzle-orm';
import { pendingObject, storedObject } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';

const keptForMs = 24 * 60 * 60 * 1000;

/** Removes objects that no row came to point at within a day, looking again right before each deletion. */
export async function sweepPendingObjects(deps: Pick<Deps, 'database' | 'store' | 'clock'>): Promise<number> {
  const { db } = deps.database;
  const before = new Date(deps.clock.now().getTime() - keptForMs);
  const pending = await db.select().from(pendingObject).where(lt(pendingObject.createdAt, before)).limit(500);
  let removed = 0;
  for (const { key } of pending) {
    const [kept] = await db
      .select({ key: storedObject.key })
      .from(storedObject)
      .where(eq(storedObject.key, key));
    if (kept === undefined) {
      await deps.store.remove(key);
      removed += 1;
    }
    await db.delete(pendingObject).where(eq(pendingObject.key, key));
  }
  return removed;
}
