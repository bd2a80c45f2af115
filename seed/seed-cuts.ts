import { and, eq } from 'drizzle-orm';
import { flag } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { noteInService } from '#server/features/cuts/note-in-service.ts';
import { recordCut } from '#server/features/cuts/record-cut.ts';
import { decideFlag } from '#server/features/review/decide-flag.ts';
import { cutCreate } from '#shared/api/cuts.ts';
import type { SeedCut } from './club/types.ts';
import type { SeededClub } from './seed-club.ts';
import type { Shelf } from './shelf.ts';

interface Seeding {
  deps: Deps;
  club: SeededClub;
  shelf: Shelf;
}

/** Records a cut; answers with the record's id, for what is said of it later. */
export async function seedCut({ deps, club, shelf }: Seeding, seed: SeedCut): Promise<string> {
  const { design, member, machine, inService: _later, ...told } = seed;
  const { slug, revision } = shelf.of(design);
  const cut = cutCreate.parse({ ...told, revision, machineId: club.machineId(member, machine) });
  const signedIn = club.member(member);
  const request = `${design} ${seed.cutOn}`;
  return (await recordCut(deps, signedIn, slug, cut, { memberId: signedIn.id, key: undefined, request })).id;
}

export async function seedInService(
  { deps, club }: Seeding,
  seed: SeedCut,
  cutId: string,
  { holds, notes }: NonNullable<SeedCut['inService']>,
): Promise<void> {
  const member = club.member(seed.member);
  const repeatable = { memberId: member.id, key: undefined, request: `${cutId} in service` };
  await noteInService(deps, member, cutId, { result: holds ? 'holds' : 'broke', notes }, repeatable);
}

/** What the moderators made of the hazards that a record reported. */
export async function settleHazards(
  { deps, club, shelf }: Seeding,
  seed: SeedCut,
  cutId: string,
): Promise<void> {
  // Nobody decides on their own design or record.
  const isOfMoss = shelf.of(seed.design).owner === 'moss' || seed.member === 'moss';
  const moderator = club.member(isOfMoss ? 'ada' : 'moss');
  const open = await deps.database.db
    .select({ id: flag.id, version: flag.version })
    .from(flag)
    .where(and(eq(flag.cutId, cutId), eq(flag.isOpen, true)));
  for (const { id, version } of open) {
    await decideFlag(deps, moderator, id, {
      action: 'caution',
      reason: `Talked over at the club evening: ${seed.notes}`.slice(0, 1000),
      version,
    });
  }
}
