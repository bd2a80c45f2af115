import type { Queries } from '#server/db/client.ts';
import type { Deps } from '#server/deps.ts';
import type { SearchDocument } from '#server/search/document.ts';
import { bestStanding } from '#shared/evidence/best-standing.ts';
import { cutsOfGeometries, type NewestRevision, newestRevisions } from './queries.ts';
import { standingsOf } from './standing.ts';

type CutRow = Awaited<ReturnType<typeof cutsOfGeometries>>[number]['cut'];

/** Groups the cut records of many designs by the geometry they are evidence for. */
export async function cutsByGeometry(
  db: Queries,
  rows: readonly NewestRevision[],
): Promise<Map<string, CutRow[]>> {
  const byGeometry = new Map<string, CutRow[]>();
  for (const { cut, geometryHash } of await cutsOfGeometries(
    db,
    rows.map((row) => row.revision.geometryHash),
  )) {
    const list = byGeometry.get(geometryHash);
    if (list === undefined) byGeometry.set(geometryHash, [cut]);
    else list.push(cut);
  }
  return byGeometry;
}

function searchDocument(row: NewestRevision, cuts: readonly CutRow[]): SearchDocument {
  const { design, revision } = row;
  const standings = standingsOf(cuts, design.ownerId);
  return {
    id: design.id,
    slug: design.slug,
    drawingNumber: design.drawingNumber,
    title: design.title,
    summary: design.summary,
    tags: design.tags,
    kind: design.kind,
    ownerName: row.ownerName,
    createdAt: design.createdAt.toISOString(),
    materials: [...new Set(cuts.map((cut) => cut.materialId))],
    bitMms: [...new Set(cuts.map((cut) => cut.bit.diameterMm))],
    standings: standings.map(({ material, word }) => ({ material, word })),
    bestStanding: bestStanding(standings)?.word ?? 'uncut',
    minutes: cuts[0] === undefined ? null : cuts[0].runTimeS / 60,
    hullMm: revision.hullMm,
    widthMm: revision.drawing.widthMm,
    heightMm: revision.drawing.heightMm,
    bitMm: cuts[0]?.bit.diameterMm ?? null,
  };
}

export async function searchDocuments(db: Queries, designIds?: readonly string[]): Promise<SearchDocument[]> {
  const rows = (await newestRevisions(db, designIds)).filter((row) => row.design.withdrawnAt === null);
  const byGeometry = await cutsByGeometry(db, rows);
  return rows.map((row) => searchDocument(row, byGeometry.get(row.revision.geometryHash) ?? []));
}

/**
 * Tells the search of a design after its change was committed. The change stands whatever the search does: a
 * failure is logged, and the next change or start tells it again.
 */
export async function refreshSearch(deps: Deps, designId: string): Promise<void> {
  try {
    const [document] = await searchDocuments(deps.database.db, [designId]);
    if (document === undefined) await deps.search.remove(designId);
    else await deps.search.upsert(document);
  } catch (error) {
    deps.log.error({ err: error, designId }, 'the search did not learn of a design');
  }
}
