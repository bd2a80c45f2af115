import { eq } from 'drizzle-orm';
import type { Queries, Transaction } from '#server/db/client.ts';
import { user } from '#server/db/schema/index.ts';
import type { Deps } from '#server/deps.ts';
import { insertNotice } from '#server/features/notices/insert-notice.ts';
import { earlierAnswer, type Repeatable } from '#server/idempotency.ts';
import type { Design, RemixDetails } from '#shared/api/designs.ts';
import { insertDesign } from './insert-design.ts';
import { ancestorsOf } from './lineage.ts';
import { type RevisionOfDesign, revisionOf } from './queries.ts';
import { readSharedDrawing } from './read-shared-drawing.ts';
import { requireAvailable } from './require-available.ts';
import { requireLicence } from './require-licence.ts';
import { revisionNotFound } from './require-revision.ts';
import type { Share } from './share.ts';
import { shareOnce } from './share-once.ts';

/** Publishes a remix: a design of the member's own, linked to the revision that it was made from. */
export async function shareRemix(
  deps: Deps,
  parentSlug: string,
  { memberId, svgBytes, details, machineRow }: Share<RemixDetails>,
  repeatable: Repeatable,
): Promise<Design> {
  const earlier = await earlierAnswer<Design>(deps, repeatable);
  if (earlier !== null) return earlier;
  await remixable(deps.database.db, memberId, parentSlug, details);
  const drawing = await readSharedDrawing(deps, svgBytes, {
    title: details.title,
    millimetresPerUnit: details.scale?.millimetresPerUnit,
  });
  return shareOnce(deps, repeatable, async (tx) => {
    // Again, since a moderator may have withheld it while the drawing was read.
    const parent = await remixable(tx, memberId, parentSlug, details);
    const made = await insertDesign(deps, tx, {
      memberId,
      details,
      machineRow,
      drawing,
      changeNote: details.changeNote,
      parentRevisionId: parent.revision.id,
    });
    await tellOwner(deps, tx, parent, { memberId, title: details.title, designId: made.id });
    return made;
  });
}

/** The parent revision, or a sentence that says why it may not be remixed so. */
async function remixable(
  db: Queries,
  memberId: string,
  slug: string,
  details: RemixDetails,
): Promise<RevisionOfDesign> {
  const parent = await revisionOf(db, slug, details.parentRevision);
  if (parent === null) throw revisionNotFound();
  await requireAvailable(db, parent);
  requireLicence(memberId, await ancestorsOf(db, parent.revision.id), details.licence);
  return parent;
}

async function tellOwner(
  deps: Deps,
  tx: Transaction,
  { design, revision }: RevisionOfDesign,
  remix: { memberId: string; title: string; designId: string },
): Promise<void> {
  if (design.ownerId === remix.memberId) return;
  const [maker] = await tx.select({ name: user.name }).from(user).where(eq(user.id, remix.memberId));
  await insertNotice(deps, tx, {
    memberId: design.ownerId,
    kind: 'remixed',
    sentence: `${maker?.name ?? 'A member'} remixed revision ${revision.number} of your “${design.title}” (${design.drawingNumber}) as “${remix.title}”.`,
    designId: remix.designId,
  });
}
