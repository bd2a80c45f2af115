import { asc, eq, sql } from 'drizzle-orm';
import type { Queries } from '#server/db/client.ts';
import { design, revision, user } from '#server/db/schema/index.ts';

const shown = {
  id: design.id,
  slug: design.slug,
  title: design.title,
  drawingNumber: design.drawingNumber,
  ownerId: design.ownerId,
  ownerName: user.name,
};

/** What a design was remixed from, and what was remixed from any of its revisions. */
export async function lineageOf(db: Queries, of: { id: string; parentRevisionId: string | null }) {
  const parent = of.parentRevisionId === null ? null : await designOfRevision(db, of.parentRevisionId);
  const remixes = await remixesOf(db, of.id);
  return { parent, remixes };
}

/** The design that a revision belongs to, as lineage shows it. */
export async function designOfRevision(db: Queries, revisionId: string) {
  const [row] = await db
    .select({
      ...shown,
      revision: revision.number,
      licence: revision.licence,
      changeNote: revision.changeNote,
      parentRevisionId: design.parentRevisionId,
    })
    .from(revision)
    .innerJoin(design, eq(design.id, revision.designId))
    .innerJoin(user, eq(user.id, design.ownerId))
    .where(eq(revision.id, revisionId));
  return row ?? null;
}

/**
 * The whole chain of originals, the nearest first; withdrawn and withheld ones are among them, since whoever made
 * them is credited all the same. A parent is always older than its remix, so the chain ends.
 */
export async function ancestorsOf(db: Queries, parentRevisionId: string | null): Promise<Ancestor[]> {
  const chain: Ancestor[] = [];
  for (let next = parentRevisionId; next !== null; ) {
    const found = await designOfRevision(db, next);
    if (found === null) break;
    chain.push(found);
    next = found.parentRevisionId;
  }
  return chain;
}
export type Ancestor = NonNullable<Awaited<ReturnType<typeof designOfRevision>>>;

/** What was remixed from any revision of a design, oldest first; withdrawn ones are among them. */
function remixesOf(db: Queries, designId: string) {
  return db
    .select({
      ...shown,
      fromRevision: revision.number,
      /** Its own revisions, so that it can be told whether any of them is handed out. */
      revisionIds: sql<
        string[]
      >`array(select r.id::text from ${revision} r where r.design_id = ${design.id})`,
    })
    .from(revision)
    .innerJoin(design, eq(design.parentRevisionId, revision.id))
    .innerJoin(user, eq(user.id, design.ownerId))
    .where(eq(revision.designId, designId))
    .orderBy(asc(design.createdAt), asc(design.id));
}
