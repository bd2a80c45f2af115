import type { Transaction } from '#server/db/client.ts';
import { cut, type machine } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { machineThen } from '#server/features/cuts/machine-then.ts';
import { raiseRuleFlags } from '#server/features/review/raise-rule-flags.ts';
import { findingsOf } from '#server/features/review/rule-findings.ts';
import { localDate } from '#server/local-date.ts';
import type { FirstCut } from '#shared/api/cuts.ts';

export type MachineRow = typeof machine.$inferSelect;

/** The cut that came with a shared drawing, if one did; the rules look at its settings at once. */
export async function insertFirstCut(
  deps: Deps,
  tx: Transaction,
  given: {
    designId: string;
    revisionId: string;
    memberId: string;
    firstCut: FirstCut | undefined;
    machineRow: MachineRow | null;
  },
): Promise<void> {
  const { designId, revisionId, memberId, firstCut, machineRow } = given;
  if (firstCut === undefined || machineRow === null) return;
  const now = deps.clock.now();
  const [row] = await tx
    .insert(cut)
    .values({
      ...firstCut,
      notes: firstCut.notes ?? '',
      id: deps.ids.next(),
      revisionId,
      memberId,
      machine: machineThen(machineRow),
      cutOn: localDate(now, deps.clubTimeZone),
      createdAt: now,
    })
    .returning();
  if (row === undefined) throw new Error(`the first cut of revision ${revisionId} was not written`);
  await raiseRuleFlags(deps, tx, { designId, revisionId, cutId: row.id, findings: findingsOf(row) });
}
