import { createHash } from 'node:crypto';
import type { Transaction } from '#server/db/client.ts';
import { revision, revisionGeometry } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import type { Licence } from '#shared/api/vocabulary.ts';
import type { SharedDrawing } from './read-shared-drawing.ts';
import { refuseWithheldDrawing } from './refuse-withheld-drawing.ts';
import { keepDrawing } from './store-drawing.ts';

/** Writes one revision with its geometry, and makes the stored drawing its own. */
export async function insertRevision(
  deps: Deps,
  tx: Transaction,
  given: { designId: string; number: number; changeNote: string; licence: Licence; memberId: string },
  { read, stored }: SharedDrawing,
): Promise<string> {
  const { scaleReadings: _readings, geometry, ...drawing } = read.inspection;
  const geometryHash = createHash('sha256').update(read.geometryText).digest('hex');
  await refuseWithheldDrawing(tx, geometryHash);
  const now = deps.clock.now();
  await keepDrawing(tx, stored, now);
  const id = deps.ids.next();
  await tx.insert(revision).values({
    id,
    designId: given.designId,
    number: given.number,
    geometryHash,
    licence: given.licence,
    changeNote: given.changeNote,
    drawing,
    hullMm: geometry.hullMm,
    outline: read.outline,
    originalKey: stored.original.key,
    drawingKey: stored.drawing.key,
    createdBy: given.memberId,
    createdAt: now,
  });
  await tx.insert(revisionGeometry).values({ revisionId: id, geometry });
  return id;
}
