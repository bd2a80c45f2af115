import { eq, sql } from 'drizzle-orm';
import { appendAudit } from '#server/audit/append.ts';
import type { Queries, Transaction } from '#server/db/client.ts';
import { design, revision } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { ProblemError } from '#server/http/problem.ts';
import { earlierAnswer, type Repeatable } from '#server/idempotency.ts';
import type { Design, RevisionDetails } from '#shared/api/designs.ts';
import type { Licence } from '#shared/api/vocabulary.ts';
import { designNotFound } from './edit.ts';
import { insertFirstCut } from './insert-first-cut.ts';
import { insertRevision } from './insert-revision.ts';
import { ancestorsOf } from './lineage.ts';
import { mayIssueRevision } from './policy.ts';
import { designBySlug } from './queries.ts';
import { readSharedDrawing } from './read-shared-drawing.ts';
import { requireLicence } from './require-licence.ts';
import type { Share } from './share.ts';
import { shareOnce } from './share-once.ts';

/** The member's own design, or a sentence that says why they may not revise it. */
export async function requireOwnDesign(db: Queries, memberId: string, slug: string) {
  const row = await designBySlug(db, slug);
  if (row === null) throw designNotFound();
  if (!mayIssueRevision({ id: memberId }, row)) {
    throw new ProblemError(
      403,
      'design.not-yours',
      'Only the member who shared this design may issue a new revision of it. Share your change as a remix.',
    );
  }
  return row;
}

/** Issues the next revision of a design; those before it stay as they are, and so does what it was remixed from. */
export async function shareRevision(
  deps: Deps,
  slug: string,
  { memberId, svgBytes, details, machineRow }: Share<RevisionDetails>,
  repeatable: Repeatable,
): Promise<Design> {
  const { db } = deps.database;
  const { id: designId, title } = await requireOwnDesign(db, memberId, slug);
  const earlier = await earlierAnswer<Design>(deps, repeatable);
  if (earlier !== null) return earlier;
  await next(db, { designId, memberId, licence: details.licence });
  const drawing = await readSharedDrawing(deps, svgBytes, {
    title,
    millimetresPerUnit: details.scale?.millimetresPerUnit,
  });
  return shareOnce(deps, repeatable, async (tx) => {
    await lockDesign(tx, designId);
    const { number, licence } = await next(tx, { designId, memberId, licence: details.licence });
    const given = { designId, number, licence, memberId, changeNote: details.changeNote };
    const revisionId = await insertRevision(deps, tx, given, drawing);
    await insertFirstCut(deps, tx, { designId, revisionId, memberId, firstCut: details.cut, machineRow });
    const now = deps.clock.now();
    await tx.update(design).set({ updatedAt: now }).where(eq(design.id, designId));
    await appendAudit(tx, {
      at: now,
      actorId: memberId,
      action: 'revision.issued',
      subject: `design:${designId}`,
      detail: { revision: number, licence },
    });
    return { slug };
  });
}

/** Two revisions at once wait for each other: each gets a number of its own. */
const lockDesign = (tx: Transaction, designId: string) =>
  tx.select({ id: design.id }).from(design).where(eq(design.id, designId)).for('update');

/** The next number and the licence it carries; refused when withdrawn, or when the originals forbid the licence. */
async function next(
  db: Queries,
  { designId, memberId, licence }: { designId: string; memberId: string; licence: Licence | undefined },
): Promise<{ number: number; licence: Licence }> {
  const [newest] = await db
    .select({ design, number: revision.number, licence: revision.licence })
    .from(revision)
    .innerJoin(design, eq(design.id, revision.designId))
    .where(eq(revision.designId, designId))
    .orderBy(sql`${revision.number} desc`)
    .limit(1);
  if (newest === undefined) throw new Error(`design ${designId} has no revision`);
  if (newest.design.withdrawnAt !== null) {
    throw new ProblemError(
      403,
      'design.withdrawn',
      `“${newest.design.title}” was withdrawn and gets no new revisions. Share the drawing as a new design.`,
    );
  }
  const number = newest.number + 1;
  if (licence === undefined || licence === newest.licence) return { number, licence: newest.licence };
  requireLicence(memberId, await ancestorsOf(db, newest.design.parentRevisionId), licence);
  return { number, licence };
}
