import { appendAudit } from '#server/audit/append.ts';
import type { Transaction } from '#server/db/client.ts';
import { design } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import type { DesignDetails } from '#shared/api/designs.ts';
import { freeSlug, nextDrawingNumber } from './design-address.ts';
import { insertFirstCut, type MachineRow } from './insert-first-cut.ts';
import { insertRevision } from './insert-revision.ts';
import type { SharedDrawing } from './read-shared-drawing.ts';

export interface NewDesign {
  memberId: string;
  details: Omit<DesignDetails, 'scale'>;
  machineRow: MachineRow | null;
  drawing: SharedDrawing;
  changeNote: string;
  /** The revision that it is a remix of. */
  parentRevisionId: string | null;
}

/** Writes a design with revision 1, its first cut if there was one, and the audit entry. */
export async function insertDesign(
  deps: Deps,
  tx: Transaction,
  { memberId, details, machineRow, drawing, changeNote, parentRevisionId }: NewDesign,
): Promise<{ id: string; slug: string }> {
  const now = deps.clock.now();
  const slug = await freeSlug(tx, details.title);
  const id = deps.ids.next();
  await tx.insert(design).values({
    id,
    slug,
    drawingNumber: await nextDrawingNumber(tx),
    ownerId: memberId,
    title: details.title,
    summary: details.summary,
    kind: details.kind,
    tags: details.tags,
    createdAt: now,
    updatedAt: now,
    parentRevisionId,
  });
  const revisionId = await insertRevision(
    deps,
    tx,
    { designId: id, number: 1, changeNote, licence: details.licence, memberId },
    drawing,
  );
  await insertFirstCut(deps, tx, {
    designId: id,
    revisionId,
    memberId,
    firstCut: details.cut,
    machineRow,
  });
  await appendAudit(tx, {
    at: now,
    actorId: memberId,
    action: 'design.published',
    subject: `design:${id}`,
    detail: {
      revision: 1,
      ...(parentRevisionId === null ? {} : { remixOf: `revision:${parentRevisionId}` }),
    },
  });
  return { id, slug };
}
