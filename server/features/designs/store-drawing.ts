import { inArray } from 'drizzle-orm';
import type { ReadDrawing } from '#server/analysis/pool.ts';
import type { Transaction } from '#server/db/client.ts';
import { pendingObject, storedObject } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import type { StoredObject } from '#server/storage/object-store.ts';

export interface StoredDrawing {
  original: StoredObject;
  drawing: StoredObject;
}

/** Stores both forms of a drawing under fresh keys; until a row points at them they are pending. */
export async function storeDrawing(deps: Deps, original: Buffer, read: ReadDrawing): Promise<StoredDrawing> {
  const name = deps.ids.next();
  const keys = { original: `originals/${name}.svg`, drawing: `drawings/${name}.svg` };
  const createdAt = deps.clock.now();
  await deps.database.db.insert(pendingObject).values([
    { key: keys.original, createdAt },
    { key: keys.drawing, createdAt },
  ]);
  const [originalObject, drawingObject] = await Promise.all([
    deps.store.put(keys.original, original, 'image/svg+xml'),
    deps.store.put(keys.drawing, Buffer.from(read.cleanSvg), 'image/svg+xml'),
  ]);
  return { original: originalObject, drawing: drawingObject };
}

/** Makes the stored objects the database's own, in the transaction that points at them. */
export async function keepDrawing(tx: Transaction, stored: StoredDrawing, createdAt: Date): Promise<void> {
  await tx.insert(storedObject).values([
    { ...stored.original, createdAt },
    { ...stored.drawing, createdAt },
  ]);
  await tx.delete(pendingObject).where(inArray(pendingObject.key, [stored.original.key, stored.drawing.key]));
}
