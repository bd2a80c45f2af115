import { and, desc, eq } from 'drizzle-orm';
import { appendAudit } from '#server/audit/append.ts';
import type { Transaction } from '#server/db/client.ts';
import { cut, cutEarlier } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { refreshGeometry } from '#server/features/review/refresh-geometry.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { SignedIn } from '#server/http/session.ts';
import type { CutCorrection, CutRecord, CutRecordWithHistory } from '#shared/api/cuts.ts';
import { judgeCut } from './judge-cut.ts';
import { requireOwnCut, shownCut } from './one-record.ts';
import { benchOfCut } from './own-bench.ts';
import { cutTold } from './present.ts';
import type { CutRow } from './records.ts';
import { toldColumns } from './told-columns.ts';

/** Says a record anew. What it said before is kept whole, and stays readable. */
export async function correctCut(
  deps: Deps,
  member: SignedIn,
  id: string,
  correction: CutCorrection,
): Promise<CutRecord> {
  const { row, shown } = await deps.database.db.transaction(async (tx) => {
    const before = await requireOwnCut(tx, id, member.id);
    if (before.cut.version !== correction.version) throw await changedMeanwhile(tx, id);
    const bench = await benchOfCut(tx, member.id, correction, before.cut);
    await replace(deps, tx, before, toldColumns(deps, correction, bench, before.cut.cutOn));
    return { row: before, shown: await shownCut(tx, id) };
  });
  await refreshGeometry(deps, { designId: row.design.id, geometryHash: row.geometryHash });
  return shown;
}

async function changedMeanwhile(tx: Transaction, id: string): Promise<ProblemError> {
  return new ProblemError(
    409,
    'cut.changed',
    'This record was corrected in the meantime. Look at it as it is now, then correct it again.',
    { current: await shownCut(tx, id) },
  );
}

async function replace(
  deps: Deps,
  tx: Transaction,
  { cut: before, design }: CutRow,
  columns: ReturnType<typeof toldColumns>,
): Promise<void> {
  const now = deps.clock.now();
  const { id, version } = before;
  const [corrected] = await tx
    .update(cut)
    .set({ ...columns, version: version + 1, correctedAt: now })
    .where(and(eq(cut.id, id), eq(cut.version, version)))
    .returning();
  if (corrected === undefined) throw await changedMeanwhile(tx, id);
  await tx.insert(cutEarlier).values({ cutId: id, version, told: before, replacedAt: now });
  await judgeCut(deps, tx, design.id, corrected);
  await appendAudit(tx, {
    at: now,
    actorId: before.memberId,
    action: 'cut.corrected',
    subject: `cut:${id}`,
    detail: { version: version + 1, outcome: corrected.outcome, wentWrong: corrected.wentWrong },
  });
}

/** A record with everything it said before, newest first. */
export async function cutWithHistory(deps: Deps, id: string): Promise<CutRecordWithHistory> {
  const { db } = deps.database;
  const record = await shownCut(db, id);
  const rows = await db
    .select()
    .from(cutEarlier)
    .where(eq(cutEarlier.cutId, record.id))
    .orderBy(desc(cutEarlier.version));
  const earlier = rows.map(({ version, replacedAt, told }) => ({
    version,
    replacedAt: replacedAt.toISOString(),
    // The row as it was, whose instants became text: `cutTold` reads none of them.
    ...cutTold({ cut: told as unknown as typeof cut.$inferSelect }),
  }));
  return { ...record, earlier };
}
