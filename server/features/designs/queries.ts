import { and, asc, desc, eq, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Queries } from '#server/db/client.ts';
import { design, revision, revisionGeometry, take, user } from '#server/db/schema/index.ts';
import { cutRows, ofGeometries } from '#server/features/cuts/records.ts';
import { availabilities } from '#server/features/review/decisions.ts';
import { isSlug } from '#shared/api/slug.ts';
import { lineageOf } from './lineage.ts';

/** A design with all that its page shows; null when there is none at that address. */
export async function designPage(db: Queries, slug: string, readerId: string) {
  if (!isSlug(slug)) return null;
  const [found] = await db
    .select({ design, ownerName: user.name })
    .from(design)
    .innerJoin(user, eq(user.id, design.ownerId))
    .where(eq(design.slug, slug));
  if (found === undefined) return null;
  const designId = found.design.id;
  const revisions = await db
    .select({ revision, creatorName: user.name })
    .from(revision)
    .innerJoin(user, eq(user.id, revision.createdBy))
    .where(eq(revision.designId, designId))
    .orderBy(desc(revision.number));
  const cuts = await cutRows(db, eq(revision.designId, designId));
  const own = (await availabilities(db, [designId])).of(designId);
  // A withheld revision stands back behind the newest that may still be taken (product.md, Standing).
  const current = revisions.find((row) => !own.revisions.has(row.revision.id)) ?? revisions[0];
  if (current === undefined) throw new Error(`design ${designId} has no revision`);
  // Evidence is for a geometry: what another design with the same one showed counts here too.
  const evidence = await cutRows(db, ofGeometries([current.revision.geometryHash]));
  const [takes] = await db
    .select({
      count: sql<number>`count(distinct ${take.memberId})::int`,
      mine: sql<boolean>`coalesce(bool_or(${take.memberId} = ${readerId}), false)`,
    })
    .from(take)
    .innerJoin(revision, eq(revision.id, take.revisionId))
    .where(eq(revision.designId, designId));
  const lineage = await lineageOf(db, found.design);
  const availabilityOfAll = await availabilities(db, [
    ...new Set([designId, ...evidence.map((row) => row.design.id), ...lineage.remixes.map(({ id }) => id)]),
  ]);
  return {
    ...found,
    revisions,
    current,
    cuts,
    evidence,
    lineage,
    availabilities: availabilityOfAll,
    takeCount: takes?.count ?? 0,
    isTakenByReader: takes?.mine ?? false,
  };
}
export type DesignPage = NonNullable<Awaited<ReturnType<typeof designPage>>>;

export async function designBySlug(db: Queries, slug: string) {
  if (!isSlug(slug)) return null;
  const [row] = await db.select().from(design).where(eq(design.slug, slug));
  return row ?? null;
}

export async function revisionOf(db: Queries, slug: string, number: number) {
  if (!isSlug(slug)) return null;
  const [row] = await db
    .select({ design, revision, ownerName: user.name })
    .from(revision)
    .innerJoin(design, eq(design.id, revision.designId))
    .innerJoin(user, eq(user.id, design.ownerId))
    .where(and(eq(design.slug, slug), eq(revision.number, number)));
  return row ?? null;
}
export type RevisionOfDesign = NonNullable<Awaited<ReturnType<typeof revisionOf>>>;

export async function geometryOf(db: Queries, revisionId: string) {
  const [row] = await db
    .select({ geometry: revisionGeometry.geometry })
    .from(revisionGeometry)
    .where(eq(revisionGeometry.revisionId, revisionId));
  return row?.geometry ?? null;
}

const parentRevision = alias(revision, 'parent_revision');
const parentDesign = alias(design, 'parent_design');
const parentOwner = alias(user, 'parent_owner');

/**
 * The revision of each design, or of those named, that cards and the search show: the newest that is not withheld,
 * else the newest.
 */
export async function newestRevisions(db: Queries, designIds?: readonly string[]) {
  const { withheldRevisionIds } = await availabilities(db, designIds);
  return db
    .selectDistinctOn([design.id], {
      design,
      revision,
      ownerName: user.name,
      parent: {
        slug: parentDesign.slug,
        revision: parentRevision.number,
        title: parentDesign.title,
        drawingNumber: parentDesign.drawingNumber,
        ownerName: parentOwner.name,
      },
    })
    .from(design)
    .innerJoin(user, eq(user.id, design.ownerId))
    .innerJoin(revision, eq(revision.designId, design.id))
    .leftJoin(parentRevision, eq(parentRevision.id, design.parentRevisionId))
    .leftJoin(parentDesign, eq(parentDesign.id, parentRevision.designId))
    .leftJoin(parentOwner, eq(parentOwner.id, parentDesign.ownerId))
    .where(designIds === undefined ? sql`true` : sql`${design.id} = any(${sql.param(designIds)}::uuid[])`)
    .orderBy(
      asc(design.id),
      sql`${revision.id} = any(${sql.param(withheldRevisionIds)}::uuid[])`,
      desc(revision.number),
    );
}
export type NewestRevision = Awaited<ReturnType<typeof newestRevisions>>[number];
