import { and, desc, eq } from 'drizzle-orm';
import type { Queries } from '#server/db/client.ts';
import { isUuid } from '#server/db/is-uuid.ts';
import { cut, design, revision } from '#server/db/schema/index.ts';
import { ProblemError } from '#server/http/problem.ts';
import type { FlagCreate } from '#shared/api/flags.ts';
import { isSlug } from '#shared/api/slug.ts';

const noDesign = () =>
  new ProblemError(404, 'design.not-found', 'There is no design at this address. It may have been mistyped.');
const noRevision = () =>
  new ProblemError(404, 'revision.not-found', 'There is no such revision of this design.');
const noRecord = () =>
  new ProblemError(404, 'record.not-found', 'There is no such cut record of this design and revision.');

const shown = {
  designId: design.id,
  ownerId: design.ownerId,
  title: design.title,
  drawingNumber: design.drawingNumber,
  revisionId: revision.id,
  revision: revision.number,
  geometryHash: revision.geometryHash,
};

/** What a flag is about: a record's own revision, the one named, or the newest; 404 for what is not there. */
export async function findTarget(db: Queries, given: FlagCreate) {
  const revisions = isSlug(given.designSlug)
    ? await db
        .select(shown)
        .from(revision)
        .innerJoin(design, eq(design.id, revision.designId))
        .where(eq(design.slug, given.designSlug))
        .orderBy(desc(revision.number))
    : [];
  const [newest] = revisions;
  if (newest === undefined) throw noDesign();
  const named =
    given.revision === undefined ? newest : revisions.find((row) => row.revision === given.revision);
  if (named === undefined) throw noRevision();
  if (given.recordId === undefined) return { ...named, record: null };
  const [record] = isUuid(given.recordId)
    ? await db
        .select({
          id: cut.id,
          memberId: cut.memberId,
          wentWrong: cut.wentWrong,
          revisionId: cut.revisionId,
        })
        .from(cut)
        .innerJoin(revision, eq(revision.id, cut.revisionId))
        .where(and(eq(cut.id, given.recordId), eq(revision.designId, newest.designId)))
    : [];
  const ofRecord = revisions.find((row) => row.revisionId === record?.revisionId);
  const isOther = given.revision !== undefined && ofRecord?.revision !== given.revision;
  if (record === undefined || ofRecord === undefined || isOther) throw noRecord();
  return { ...ofRecord, record };
}
export type FlagTarget = Awaited<ReturnType<typeof findTarget>>;
