import type { Queries } from '#server/db/client.ts';
import type { Deps } from '#server/deps.ts';
import { type CutRow, cutRows, ofGeometries } from '#server/features/cuts/records.ts';
import { availabilities } from '#server/features/review/decisions.ts';
import type { SearchDocument } from '#server/search/document.ts';
import type { MaterialFamily } from '#shared/api/vocabulary.ts';
import { familyOf } from '#shared/cutting/material-family.ts';
import { bestStanding } from '#shared/evidence/best-standing.ts';
import { withholdingOf } from '#shared/review/availability.ts';
import { type ListEvidence, presentListItem } from './present.ts';
import { type NewestRevision, newestRevisions } from './queries.ts';

/** The cut records and decisions of many designs, by the geometry that they are evidence for. */
export async function evidenceOfMany(
  db: Queries,
  rows: readonly NewestRevision[],
): Promise<{ of(row: NewestRevision): ListEvidence }> {
  const hashes = [...new Set(rows.map((row) => row.revision.geometryHash))];
  const cuts = hashes.length === 0 ? [] : await cutRows(db, ofGeometries(hashes));
  const designIds = [...rows.map((row) => row.design.id), ...cuts.map((cut) => cut.design.id)];
  const decided = await availabilities(db, [...new Set(designIds)]);
  const byGeometry = new Map<string, CutRow[]>();
  for (const cut of cuts) {
    const list = byGeometry.get(cut.geometryHash);
    if (list === undefined) byGeometry.set(cut.geometryHash, [cut]);
    else list.push(cut);
  }
  return {
    of: (row) => ({ cuts: byGeometry.get(row.revision.geometryHash) ?? [], availabilities: decided }),
  };
}

const isFamily = (family: MaterialFamily | null): family is MaterialFamily => family !== null;

function searchDocument(row: NewestRevision, evidence: ListEvidence): SearchDocument {
  const { design, revision } = row;
  const { cuts } = evidence;
  const standings = presentListItem(row, evidence).standing;
  const withheld = withholdingOf(evidence.availabilities.of(design.id), revision.id) !== null;
  const newest = cuts[0]?.cut;
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
    materials: [...new Set(cuts.map(({ cut }) => familyOf(cut.materialId)).filter(isFamily))],
    bitMms: [...new Set(cuts.map(({ cut }) => cut.bit.diameterMm))],
    standings: standings.map(({ material, word }) => ({ material, word })),
    bestStanding: withheld ? 'withheld' : (bestStanding(standings)?.word ?? 'uncut'),
    minutes: newest === undefined ? null : newest.runTimeS / 60,
    hullMm: revision.hullMm,
    widthMm: revision.drawing.widthMm,
    heightMm: revision.drawing.heightMm,
    bitMm: newest?.bit.diameterMm ?? null,
  };
}

export async function searchDocuments(db: Queries, designIds?: readonly string[]): Promise<SearchDocument[]> {
  const rows = (await newestRevisions(db, designIds)).filter((row) => row.design.withdrawnAt === null);
  const evidence = await evidenceOfMany(db, rows);
  return rows.map((row) => searchDocument(row, evidence.of(row)));
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
