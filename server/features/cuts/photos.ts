import { eq } from 'drizzle-orm';
import type { Response } from 'express';
import { appendAudit } from '#server/audit/append.ts';
import type { Queries, Transaction } from '#server/db/client.ts';
import { isUuid } from '#server/db/is-uuid.ts';
import { cut, cutPhoto, pendingObject, storedObject } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { SignedIn } from '#server/http/session.ts';
import { createOnce, earlierAnswer, type Repeatable } from '#server/idempotency.ts';
import type { StoredObject } from '#server/storage/object-store.ts';
import type { CutRecord } from '#shared/api/cuts.ts';
import { requireOwnCut } from './one-record.ts';
import { type ReadPhoto, readPhoto } from './read-photo.ts';

type Photo = CutRecord['photos'][number];

const mostPhotos = 8;

/** Adds a photo to the member's own record: decoded, stored, then one transaction that points at it. */
export async function addPhoto(
  deps: Deps,
  member: SignedIn,
  cutId: string,
  bytes: Buffer,
  repeatable: Repeatable,
): Promise<Photo> {
  const earlier = await earlierAnswer<Photo>(deps, repeatable);
  if (earlier !== null) return earlier;
  const { db } = deps.database;
  await requireOwnCut(db, cutId, member.id);
  // Looked at again below, under a lock: this only spares the decoding.
  await refuseOneTooMany(db, cutId);
  const read = await readPhoto(bytes);
  const stored = await storePhoto(deps, read);
  return createOnce(deps, repeatable, (tx) => keepPhoto(deps, tx, member.id, cutId, read, stored));
}

async function refuseOneTooMany(db: Queries, cutId: string): Promise<void> {
  if ((await db.$count(cutPhoto, eq(cutPhoto.cutId, cutId))) < mostPhotos) return;
  throw new ProblemError(
    409,
    'photo.too-many',
    `This record already has ${mostPhotos} photos, the most it may.`,
  );
}

/** Stores the photo under a fresh key; until a row points at it, it is pending. */
async function storePhoto(deps: Deps, { webp }: ReadPhoto): Promise<StoredObject> {
  const key = `photos/${deps.ids.next()}.webp`;
  await deps.database.db.insert(pendingObject).values({ key, createdAt: deps.clock.now() });
  return deps.store.put(key, webp, 'image/webp');
}

async function keepPhoto(
  deps: Deps,
  tx: Transaction,
  memberId: string,
  cutId: string,
  { widthPx, heightPx }: ReadPhoto,
  stored: StoredObject,
): Promise<Photo> {
  // Two photos at once wait for each other here, so that neither is one too many.
  await tx.select({ id: cut.id }).from(cut).where(eq(cut.id, cutId)).for('update');
  await refuseOneTooMany(tx, cutId);
  const id = deps.ids.next();
  const createdAt = deps.clock.now();
  await tx.insert(storedObject).values({ ...stored, createdAt });
  await tx.delete(pendingObject).where(eq(pendingObject.key, stored.key));
  await tx.insert(cutPhoto).values({ id, cutId, objectKey: stored.key, widthPx, heightPx, createdAt });
  await appendAudit(tx, {
    at: createdAt,
    actorId: memberId,
    action: 'cut.photo-added',
    subject: `cut:${cutId}`,
    detail: { photoId: id },
  });
  return { id, widthPx, heightPx };
}

/** Sends a photo to be shown in a page of ours, and nowhere run. */
export async function sendPhoto(deps: Deps, response: Response, id: string): Promise<void> {
  const [row] = isUuid(id) ? await deps.database.db.select().from(cutPhoto).where(eq(cutPhoto.id, id)) : [];
  if (row === undefined) throw new ProblemError(404, 'photo.not-found', 'There is no such photo.');
  const bytes = await deps.store.read(row.objectKey);
  response
    .set({
      'Content-Type': 'image/webp',
      'Content-Disposition': 'inline; filename="cut.webp"',
      'Content-Security-Policy': "default-src 'none'",
      'X-Content-Type-Options': 'nosniff',
      // A photo never changes; only the browser of the member who asked may keep it.
      'Cache-Control': 'private, max-age=86400, immutable',
    })
    .send(bytes);
}
