import { asc, desc, eq, type SQL, sql } from 'drizzle-orm';
import type { Queries } from '#server/db/client.ts';
import { cut, cutPhoto, design, inServiceNote, revision, user } from '#server/db/schema/index.ts';

type Photo = typeof cutPhoto.$inferSelect;
type InServiceNote = typeof inServiceNote.$inferSelect;

/** The records that fit a condition on cut, revision or design, newest first, with what was said of them later. */
export async function cutRows(db: Queries, where: SQL | undefined, limit?: number) {
  const query = db
    .select({
      cut,
      memberName: user.name,
      number: revision.number,
      geometryHash: revision.geometryHash,
      design: {
        id: design.id,
        slug: design.slug,
        title: design.title,
        drawingNumber: design.drawingNumber,
        ownerId: design.ownerId,
      },
    })
    .from(cut)
    .innerJoin(revision, eq(revision.id, cut.revisionId))
    .innerJoin(design, eq(design.id, revision.designId))
    .innerJoin(user, eq(user.id, cut.memberId))
    .where(where)
    .orderBy(desc(cut.createdAt), desc(cut.id));
  const rows = await (limit === undefined ? query : query.limit(limit));
  const ids = rows.map((row) => row.cut.id);
  const notes = await latestNotes(db, ids);
  const photos = await photosOf(db, ids);
  return rows.map((row) => ({
    ...row,
    inService: notes.get(row.cut.id) ?? null,
    photos: photos.get(row.cut.id) ?? [],
  }));
}
export type CutRow = Awaited<ReturnType<typeof cutRows>>[number];

/** Evidence is for a geometry: revisions that share it share their records. */
export const ofGeometries = (hashes: readonly string[]): SQL =>
  sql`${revision.geometryHash} = any(${sql.param(hashes)}::text[])`;

const among = (column: typeof inServiceNote.cutId | typeof cutPhoto.cutId, ids: readonly string[]): SQL =>
  sql`${column} = any(${sql.param(ids)}::uuid[])`;

async function latestNotes(db: Queries, ids: readonly string[]): Promise<Map<string, InServiceNote>> {
  if (ids.length === 0) return new Map();
  const rows = await db
    .selectDistinctOn([inServiceNote.cutId])
    .from(inServiceNote)
    .where(among(inServiceNote.cutId, ids))
    .orderBy(inServiceNote.cutId, desc(inServiceNote.notedAt), desc(inServiceNote.id));
  return new Map(rows.map((row) => [row.cutId, row]));
}

async function photosOf(db: Queries, ids: readonly string[]): Promise<Map<string, Photo[]>> {
  if (ids.length === 0) return new Map();
  const rows = await db
    .select()
    .from(cutPhoto)
    .where(among(cutPhoto.cutId, ids))
    .orderBy(asc(cutPhoto.createdAt), asc(cutPhoto.id));
  const byCut = new Map<string, Photo[]>();
  for (const row of rows) byCut.set(row.cutId, [...(byCut.get(row.cutId) ?? []), row]);
  return byCut;
}
