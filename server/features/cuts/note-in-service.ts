import { appendAudit } from '#server/audit/append.ts';
import { inServiceNote } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { refreshGeometry } from '#server/features/review/refresh-geometry.ts';
import type { SignedIn } from '#server/http/session.ts';
import { createOnce, type Repeatable } from '#server/idempotency.ts';
import type { CutRecord, InServiceCreate } from '#shared/api/cuts.ts';
import { requireOwnCut, shownCut } from './one-record.ts';

/** Weeks later: how the part holds in use. Notes are added, never changed; the newest counts. */
export async function noteInService(
  deps: Deps,
  member: SignedIn,
  id: string,
  { result, notes }: InServiceCreate,
  repeatable: Repeatable,
): Promise<CutRecord> {
  let evidence: { designId: string; geometryHash: string } | undefined;
  const noted = await createOnce(deps, repeatable, async (tx) => {
    const row = await requireOwnCut(tx, id, member.id);
    const notedAt = deps.clock.now();
    await tx
      .insert(inServiceNote)
      .values({ id: deps.ids.next(), cutId: row.cut.id, result, notes: notes ?? '', notedAt });
    await appendAudit(tx, {
      at: notedAt,
      actorId: member.id,
      action: 'cut.noted-in-service',
      subject: `cut:${row.cut.id}`,
      detail: { result },
    });
    evidence = { designId: row.design.id, geometryHash: row.geometryHash };
    return shownCut(tx, row.cut.id);
  });
  if (evidence !== undefined) await refreshGeometry(deps, evidence);
  return noted;
}
