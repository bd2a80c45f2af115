import { eq } from 'drizzle-orm';
import { machine } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { shareDesign } from '#server/features/designs/share.ts';
import { designDetails } from '#shared/api/designs.ts';
import { designs } from './club/designs.ts';
import type { SeedDesign } from './club/types.ts';
import { sheetOf } from './drawings/all.ts';
import type { SeededClub } from './seed-club.ts';
import type { SetClock } from './seeded-ids.ts';

/** Shares every design of the demo the way a member does: through the same reading, rules and storage. */
export async function seedDesigns(deps: Deps, clock: SetClock, club: SeededClub): Promise<void> {
  for (const seed of designs) {
    clock.set(new Date(seed.publishedAt));
    const memberId = club.memberId(seed.owner);
    const details = designDetails.parse(detailsOf(seed, club));
    const machineRow = details.cut === undefined ? null : await machineById(deps, details.cut.machineId);
    const share = { memberId, svgBytes: Buffer.from(sheetOf(seed.key)), details, machineRow };
    await shareDesign(deps, share, { memberId, key: undefined, request: seed.key });
  }
}

function detailsOf(
  { title, summary, kind, licence, tags, scale, cut, owner }: SeedDesign,
  club: SeededClub,
): unknown {
  const words = { title, summary, kind, licence, tags };
  const size = scale === undefined ? {} : { scale };
  if (cut === undefined) return { ...words, ...size };
  const { machine: name, ...told } = cut;
  return { ...words, ...size, cut: { ...told, machineId: club.machineId(owner, name) } };
}

async function machineById(deps: Deps, id: string) {
  const [row] = await deps.database.db.select().from(machine).where(eq(machine.id, id));
  return row ?? null;
}
