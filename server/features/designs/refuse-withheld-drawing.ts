import { eq } from 'drizzle-orm';
import type { Queries } from '#server/db/client.ts';
import { design, revision } from '#server/db/schema/index.ts';
import { availabilities } from '#server/features/review/decisions.ts';
import { ProblemError } from '#server/http/problem.ts';
import { withholdingOf } from '#shared/review/availability.ts';

/** A withheld drawing does not come back as a new revision or under another name: its geometry is known. */
export async function refuseWithheldDrawing(db: Queries, geometryHash: string): Promise<void> {
  const same = await db
    .select({
      revisionId: revision.id,
      number: revision.number,
      designId: design.id,
      title: design.title,
      drawingNumber: design.drawingNumber,
    })
    .from(revision)
    .innerJoin(design, eq(design.id, revision.designId))
    .where(eq(revision.geometryHash, geometryHash));
  if (same.length === 0) return;
  const known = await availabilities(
    db,
    same.map(({ designId }) => designId),
  );
  for (const { revisionId, number, designId, title, drawingNumber } of same) {
    const withheld = withholdingOf(known.of(designId), revisionId);
    if (withheld === null) continue;
    throw new ProblemError(
      403,
      'drawing.withheld',
      `This is the same drawing as “${title}” (${drawingNumber}, revision ${number}), which a moderator withheld: ${withheld.reason} Change what was wrong, or ask a moderator to restore it.`,
    );
  }
}
