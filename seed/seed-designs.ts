import { eq } from 'drizzle-orm';
import { machine } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { shareDesign } from '#server/features/designs/share.ts';
import { shareRemix } from '#server/features/designs/share-remix.ts';
import { shareRevision } from '#server/features/designs/share-revision.ts';
import { designDetails, remixDetails, revisionDetails } from '#shared/api/designs.ts';
import type { CutTold, MemberKey, SeedDesign, SeedRemix, SeedRevision } from './club/types.ts';
import { sheetOf } from './drawings/all.ts';
import type { SeededClub } from './seed-club.ts';
import type { Shelf } from './shelf.ts';

interface Seeding {
  deps: Deps;
  club: SeededClub;
  shelf: Shelf;
}

/** Shares a design the way a member does: through the same reading, rules and storage. */
export async function seedDesign({ deps, club, shelf }: Seeding, seed: SeedDesign): Promise<void> {
  const details = designDetails.parse({ ...wordsOf(seed), ...cutOf(club, seed.owner, seed.cut) });
  const share = { ...(await shareOf(deps, club, seed.owner, seed.key, details.cut)), details };
  shelf.issued(seed.key, seed.owner, await shareDesign(deps, share, once(share.memberId, seed.key)));
}

export async function seedRevision({ deps, club, shelf }: Seeding, seed: SeedRevision): Promise<void> {
  const { slug, owner } = shelf.of(seed.design);
  const { changeNote, cut } = seed;
  const details = revisionDetails.parse({ changeNote, ...cutOf(club, owner, cut) });
  const share = { ...(await shareOf(deps, club, owner, seed.sheet, details.cut)), details };
  shelf.issued(seed.design, owner, await shareRevision(deps, slug, share, once(share.memberId, seed.sheet)));
}

export async function seedRemix({ deps, club, shelf }: Seeding, seed: SeedRemix): Promise<void> {
  const { changeNote, parent, owner } = seed;
  const details = remixDetails.parse({
    ...wordsOf(seed),
    ...cutOf(club, owner, seed.cut),
    changeNote,
    parentRevision: parent.revision,
  });
  const share = { ...(await shareOf(deps, club, owner, seed.key, details.cut)), details };
  const { slug } = shelf.of(parent.design);
  shelf.issued(seed.key, owner, await shareRemix(deps, slug, share, once(share.memberId, seed.key)));
}

const once = (memberId: string, request: string) => ({ memberId, key: undefined, request });

const wordsOf = ({ title, summary, kind, licence, tags, scale }: SeedDesign) => ({
  title,
  summary,
  kind,
  licence,
  tags,
  ...(scale === undefined ? {} : { scale }),
});

function cutOf(club: SeededClub, owner: MemberKey, cut: CutTold | undefined) {
  if (cut === undefined) return {};
  const { machine: name, ...told } = cut;
  return { cut: { ...told, machineId: club.machineId(owner, name) } };
}

async function shareOf(
  deps: Deps,
  club: SeededClub,
  owner: MemberKey,
  sheet: string,
  cut: { machineId: string } | undefined,
) {
  const [machineRow] =
    cut === undefined
      ? []
      : await deps.database.db.select().from(machine).where(eq(machine.id, cut.machineId));
  return {
    memberId: club.member(owner).id,
    svgBytes: Buffer.from(sheetOf(sheet)),
    machineRow: machineRow ?? null,
  };
}
