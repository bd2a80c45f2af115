import { take } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import type { RevisionOfDesign } from '#server/features/designs/queries.ts';
import { availabilities } from '#server/features/review/decisions.ts';
import { ProblemError } from '#server/http/problem.ts';
import { withholdingOf } from '#shared/review/availability.ts';

/** Refuses a revision that may not be taken, with the reason. */
export async function requireAvailable(deps: Deps, found: RevisionOfDesign): Promise<void> {
  if (found.design.withdrawnAt !== null) {
    throw new ProblemError(
      403,
      'design.withdrawn',
      `“${found.design.title}” was withdrawn by ${found.ownerName} on ${found.design.withdrawnAt.toISOString().slice(0, 10)} and is not handed out any more.`,
    );
  }
  const availability = (await availabilities(deps.database.db, [found.design.id])).of(found.design.id);
  const withheld = withholdingOf(availability, found.revision.id);
  if (withheld !== null) {
    throw new ProblemError(403, 'revision.withheld', `A moderator withheld this: ${withheld.reason}`);
  }
}

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
