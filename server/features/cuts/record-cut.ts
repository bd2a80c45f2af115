import { and, eq } from 'drizzle-orm';
import { appendAudit } from '#server/audit/append.ts';
import type { Transaction } from '#server/db/client.ts';
import { cut, revision } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { designNotFound } from '#server/features/designs/edit.ts';
import { designBySlug } from '#server/features/designs/queries.ts';
import { insertNotice } from '#server/features/notices/insert-notice.ts';
import { refreshGeometry } from '#server/features/review/refresh-geometry.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { SignedIn } from '#server/http/session.ts';
import { createOnce, type Repeatable } from '#server/idempotency.ts';
import type { CutCreate, CutRecord } from '#shared/api/cuts.ts';
import { isHazard } from '#shared/evidence/went-wrong.ts';
import { judgeCut } from './judge-cut.ts';
import { shownCut } from './one-record.ts';
import { benchOfCut } from './own-bench.ts';
import { toldColumns } from './told-columns.ts';

/**
 * Records a cut of a revision. A withdrawn or withheld one may be recorded too: whoever took it before may have
 * cut it since, and what happened is evidence all the same. So may hazardous stock: the rules flag it.
 */
export async function recordCut(
  deps: Deps,
  member: SignedIn,
  slug: string,
  told: CutCreate,
  repeatable: Repeatable,
): Promise<CutRecord> {
  let evidence: { designId: string; geometryHash: string } | undefined;
  const recorded = await createOnce(deps, repeatable, async (tx) => {
    const found = await revisionToCut(tx, slug, told.revision);
    const columns = toldColumns(deps, told, await benchOfCut(tx, member.id, told));
    const now = deps.clock.now();
    const row = {
      ...columns,
      id: deps.ids.next(),
      revisionId: found.revision.id,
      memberId: member.id,
      createdAt: now,
    };
    await tx.insert(cut).values(row);
    await judgeCut(deps, tx, found.design.id, row);
    await appendAudit(tx, {
      at: now,
      actorId: member.id,
      action: 'cut.recorded',
      subject: `cut:${row.id}`,
      detail: { revisionId: row.revisionId, outcome: row.outcome, wentWrong: row.wentWrong },
    });
    await tellOwner(deps, tx, member, found, row);
    evidence = { designId: found.design.id, geometryHash: found.revision.geometryHash };
    return shownCut(tx, row.id);
  });
  if (evidence !== undefined) await refreshGeometry(deps, evidence);
  return recorded;
}

async function revisionToCut(tx: Transaction, slug: string, number: number) {
  const design = await designBySlug(tx, slug);
  if (design === null) throw designNotFound();
  const [found] = await tx
    .select()
    .from(revision)
    .where(and(eq(revision.designId, design.id), eq(revision.number, number)));
  if (found === undefined) {
    throw new ProblemError(
      404,
      'revision.not-found',
      `“${design.title}” has no revision ${number}. Choose the one that you cut.`,
    );
  }
  return { design, revision: found };
}

/** The member who shared a design hears of cuts by others. */
async function tellOwner(
  deps: Deps,
  tx: Transaction,
  member: SignedIn,
  { design, revision }: Awaited<ReturnType<typeof revisionToCut>>,
  { outcome, wentWrong }: Pick<typeof cut.$inferSelect, 'outcome' | 'wentWrong'>,
): Promise<void> {
  if (design.ownerId === member.id) return;
  const hazard = wentWrong.some(isHazard)
    ? ' and reports a hazard. Read it before anybody cuts it again'
    : '';
  await insertNotice(deps, tx, {
    memberId: design.ownerId,
    kind: 'cut-recorded',
    sentence: `${member.name} recorded a cut of “${design.title}” (${design.drawingNumber}, revision ${revision.number}): ${outcome}${hazard}.`,
    designId: design.id,
  });
}
