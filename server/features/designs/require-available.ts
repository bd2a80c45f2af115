import type { Queries } from '#server/db/client.ts';
import { availabilities } from '#server/features/review/decisions.ts';
import { ProblemError } from '#server/http/problem.ts';
import { type Availability, withholdingOf } from '#shared/review/availability.ts';
import type { RevisionOfDesign } from './queries.ts';

/** Refuses a revision that is not handed out, neither to be taken nor to be remixed, with the reason; else what holds of its design. */
export async function requireAvailable(db: Queries, found: RevisionOfDesign): Promise<Availability> {
  if (found.design.withdrawnAt !== null) {
    throw new ProblemError(
      403,
      'design.withdrawn',
      `“${found.design.title}” was withdrawn on ${found.design.withdrawnAt.toISOString().slice(0, 10)} and is not handed out any more.`,
    );
  }
  const availability = (await availabilities(db, [found.design.id])).of(found.design.id);
  const withheld = withholdingOf(availability, found.revision.id);
  if (withheld !== null) {
    throw new ProblemError(403, 'revision.withheld', `A moderator withheld this: ${withheld.reason}`);
  }
  return availability;
}
