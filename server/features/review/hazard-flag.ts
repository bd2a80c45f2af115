import { and, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '#server/db/client.ts';
import { flag } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import type { Hazard } from '#shared/evidence/went-wrong.ts';
import { insertFlag } from './insert-flag.ts';
import { tellOfFlag } from './tell-of-flag.ts';
import { toldBefore } from './told-before.ts';

const named: Record<Hazard, string> = {
  'part-came-loose': 'the part came loose',
  'bit-broke': 'the bit broke',
  'fire-or-smoke': 'there was fire or smoke',
  'unexpected-motion': 'the machine moved unexpectedly',
};

/** What a record with these hazards reports, as one sentence. */
export function hazardSentence(hazards: readonly Hazard[]): string {
  const list = hazards.map((hazard) => named[hazard]);
  const last = list.pop() ?? 'something dangerous happened';
  return `A cut record reports a hazard: ${list.length === 0 ? last : `${list.join(', ')} and ${last}`}.`;
}

/**
 * Calls for a decision on a record that reports hazards, unless one by the program is open for it already, or the
 * record told no other hazards before it was corrected. One that tells of none any more leaves its flag open.
 */
export async function hazardFlag(
  deps: Pick<Deps, 'ids' | 'clock'>,
  tx: Transaction,
  {
    designId,
    revisionId,
    cutId,
    hazards,
  }: { designId: string; revisionId: string; cutId: string; hazards: readonly Hazard[] },
): Promise<void> {
  if (hazards.length === 0) return;
  const reason = hazardSentence(hazards);
  const [open] = await tx
    .select({ id: flag.id, reason: flag.reason, version: flag.version })
    .from(flag)
    .where(and(eq(flag.isOpen, true), isNull(flag.raisedBy), isNull(flag.finding), eq(flag.cutId, cutId)));
  if (open !== undefined) {
    // A correction may name another hazard: the open flag says what the record says now.
    if (open.reason === reason) return;
    await tx
      .update(flag)
      .set({ reason, version: open.version + 1 })
      .where(eq(flag.id, open.id));
    return;
  }
  const before = await toldBefore(tx, cutId);
  if (before !== null && hazards.every((hazard) => before.wentWrong.includes(hazard))) return;
  const flagId = await insertFlag(deps, tx, {
    designId,
    revisionId,
    cutId,
    level: 'do-not-cut',
    reason,
    raisedBy: null,
  });
  await tellOfFlag(deps, tx, flagId);
}
