import { take } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';

/** Writes down who took what, before the first byte leaves: a recall reaches them by it. */
export async function recordTake(
  deps: Deps,
  given: {
    memberId: string;
    revisionId: string;
    what: 'drawing' | 'package';
    machineId: string | undefined;
    cutId: string | undefined;
  },
): Promise<void> {
  await deps.database.db.insert(take).values({
    id: deps.ids.next(),
    revisionId: given.revisionId,
    memberId: given.memberId,
    what: given.what,
    machineId: given.machineId ?? null,
    cutId: given.cutId ?? null,
    takenAt: deps.clock.now(),
  });
}
