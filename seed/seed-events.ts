import { lt, sql } from 'drizzle-orm';
import { notice } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { isHazard } from '#shared/evidence/went-wrong.ts';
import { cuts } from './club/cuts.ts';
import { designs } from './club/designs.ts';
import { remixes, revisions } from './club/lineage.ts';
import { flags } from './club/review.ts';
import type { SeededClub } from './seed-club.ts';
import { seedCut, seedInService, settleHazards } from './seed-cuts.ts';
import { seedDesign, seedRemix, seedRevision } from './seed-designs.ts';
import { seedDecision, seedFlag } from './seed-flags.ts';
import type { SetClock } from './seeded-ids.ts';
import { emptyShelf } from './shelf.ts';

interface Event {
  at: Date;
  happen(): Promise<void>;
}

/** Hazards reported after this still wait for a moderator. */
const settledUntil = '2026-10-01';
/** Records are written up in the evening; moderators look at them two days later. */
const evening = (day: string, daysLater = 0) =>
  new Date(Date.parse(`${day}T19:00:00Z`) + daysLater * 24 * 60 * 60 * 1000);

/** Everything that happened in the demo club, each at its own date, through the use cases that members use. */
export async function seedEvents(deps: Deps, clock: SetClock, club: SeededClub): Promise<void> {
  const seeding = { deps, club, shelf: emptyShelf() };
  const events: Event[] = [
    ...designs.map((seed) => ({ at: new Date(seed.publishedAt), happen: () => seedDesign(seeding, seed) })),
    ...revisions.map((seed) => ({ at: new Date(seed.issuedAt), happen: () => seedRevision(seeding, seed) })),
    ...remixes.map((seed) => ({ at: new Date(seed.publishedAt), happen: () => seedRemix(seeding, seed) })),
    ...cuts.flatMap((seed): Event[] => {
      let cutId = '';
      const later: Event[] = [];
      const { inService } = seed;
      if (inService !== undefined) {
        later.push({
          at: evening(inService.notedOn),
          happen: () => seedInService(seeding, seed, cutId, inService),
        });
      }
      if (seed.wentWrong?.some(isHazard) && seed.cutOn < settledUntil) {
        later.push({ at: evening(seed.cutOn, 2), happen: () => settleHazards(seeding, seed, cutId) });
      }
      const record = async () => {
        cutId = await seedCut(seeding, seed);
      };
      return [{ at: evening(seed.cutOn), happen: record }, ...later];
    }),
    ...flags.flatMap((seed): Event[] => {
      const { decision } = seed;
      let raised: Awaited<ReturnType<typeof seedFlag>> | undefined;
      const raise = async () => {
        raised = await seedFlag(seeding, seed);
      };
      const decide = async () => {
        if (raised !== undefined && decision !== undefined) await seedDecision(seeding, raised, decision);
      };
      const decided = decision === undefined ? [] : [{ at: new Date(decision.decidedAt), happen: decide }];
      return [{ at: new Date(seed.raisedAt), happen: raise }, ...decided];
    }),
  ];
  for (const { at, happen } of events.sort((a, b) => a.at.getTime() - b.at.getTime())) {
    clock.set(at);
    await happen();
  }
  await readOldNotices(deps);
}

/** Members have read what is more than two months old. */
async function readOldNotices({ database }: Deps): Promise<void> {
  await database.db
    .update(notice)
    .set({ readAt: sql`${notice.createdAt}` })
    .where(lt(notice.createdAt, new Date(settledUntil)));
}
