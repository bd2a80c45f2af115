import type { Deps } from '#server/deps.ts';
import { decideFlag } from '#server/features/review/decide-flag.ts';
import { raiseFlag } from '#server/features/review/raise-flag.ts';
import type { Flag } from '#shared/api/flags.ts';
import type { SeedFlag } from './club/types.ts';
import type { SeededClub } from './seed-club.ts';
import type { Shelf } from './shelf.ts';

interface Seeding {
  deps: Deps;
  club: SeededClub;
  shelf: Shelf;
}

export function seedFlag({ deps, club, shelf }: Seeding, seed: SeedFlag): Promise<Flag> {
  const { slug, revision } = shelf.of(seed.design);
  return raiseFlag(deps, club.member(seed.by), { designSlug: slug, revision, reason: seed.reason });
}

export async function seedDecision(
  { deps, club }: Seeding,
  flag: Flag,
  { by, action, reason }: NonNullable<SeedFlag['decision']>,
): Promise<void> {
  await decideFlag(deps, club.member(by), flag.id, { action, reason, version: flag.version });
}
