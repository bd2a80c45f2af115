import type { cut } from '#server/db/schema/index.ts';
import { standingsOf } from '#server/features/designs/standing.ts';
import type { CutSummary, Design, DesignListItem, Revision } from '#shared/api/designs.ts';
import type { CutOfDesign, DesignPage, NewestRevision } from './queries.ts';

type Cut = typeof cut.$inferSelect;

export function presentCut(row: CutOfDesign): CutSummary {
  const { cut, memberName, number } = row;
  return {
    id: cut.id,
    revision: number,
    member: { id: cut.memberId, name: memberName },
    machine: { name: cut.machine.name, bedXMm: cut.machine.bedXMm, bedYMm: cut.machine.bedYMm },
    bit: cut.bit,
    materialId: cut.materialId,
    stockThicknessMm: cut.stockThicknessMm,
    settings: cut.settings,
    holdDown: cut.holdDown,
    outcome: cut.outcome,
    runTimeS: cut.runTimeS,
    notes: cut.notes,
    createdAt: cut.createdAt.toISOString(),
  };
}

function presentRevision(row: DesignPage['revisions'][number]): Revision {
  const { revision, creatorName } = row;
  return {
    number: revision.number,
    geometryHash: revision.geometryHash,
    drawing: revision.drawing,
    licence: revision.licence,
    changeNote: revision.changeNote,
    createdAt: revision.createdAt.toISOString(),
    createdBy: { id: revision.createdBy, name: creatorName },
  };
}

function presentWords(row: { design: NewestRevision['design']; ownerName: string }) {
  const { design, ownerName } = row;
  return {
    id: design.id,
    slug: design.slug,
    drawingNumber: design.drawingNumber,
    title: design.title,
    summary: design.summary,
    kind: design.kind,
    tags: design.tags,
    owner: { id: design.ownerId, name: ownerName },
    version: design.version,
    createdAt: design.createdAt.toISOString(),
    ...(design.withdrawnAt === null ? {} : { withdrawnAt: design.withdrawnAt.toISOString() }),
  };
}

export function presentDesign(page: DesignPage): Design {
  const revisions = page.revisions.map(presentRevision);
  const [newest] = revisions;
  if (newest === undefined) throw new Error(`design ${page.design.id} has no revision`);
  return {
    ...presentWords(page),
    licence: newest.licence,
    standing: standingsOf(
      page.evidence.map((row) => row.cut),
      page.design.ownerId,
    ),
    revision: newest,
    revisions: revisions.map(({ drawing: _drawing, ...revision }) => revision),
    cuts: page.cuts.map(presentCut),
    takeCount: page.takeCount,
  };
}

export function presentListItem(row: NewestRevision, cuts: readonly Cut[]): DesignListItem {
  const { design, revision } = row;
  const { widthMm, heightMm, boundsMm } = revision.drawing;
  const newestCut = cuts[0];
  return {
    ...presentWords(row),
    licence: revision.licence,
    standing: standingsOf(cuts, design.ownerId),
    revision: {
      number: revision.number,
      geometryHash: revision.geometryHash,
      drawing: { widthMm, heightMm, boundsMm },
    },
    outline: revision.outline,
    hullMm: revision.hullMm,
    ...(newestCut === undefined
      ? {}
      : {
          cut: {
            bitMm: newestCut.bit.diameterMm,
            bitKind: newestCut.bit.kind,
            materialId: newestCut.materialId,
            stockThicknessMm: newestCut.stockThicknessMm,
            runTimeS: newestCut.runTimeS,
          },
        }),
  };
}
