import { presentCutRecord } from '#server/features/cuts/present.ts';
import type { CutRow } from '#server/features/cuts/records.ts';
import type { Availabilities } from '#server/features/review/decisions.ts';
import type { Design, DesignListItem, Revision } from '#shared/api/designs.ts';
import { type Availability, withholdingOf } from '#shared/review/availability.ts';
import type { DesignPage, NewestRevision } from './queries.ts';
import { settingsStandingsOf, standingsOf } from './standing.ts';
import { withheldSettings } from './withheld-settings.ts';

function presentRevision(row: DesignPage['revisions'][number], availability: Availability): Revision {
  const { revision, creatorName } = row;
  const withheld = withholdingOf(availability, revision.id);
  return {
    number: revision.number,
    geometryHash: revision.geometryHash,
    drawing: revision.drawing,
    licence: revision.licence,
    changeNote: revision.changeNote,
    createdAt: revision.createdAt.toISOString(),
    createdBy: { id: revision.createdBy, name: creatorName },
    ...(withheld === null ? {} : { withheld }),
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

/** The design by its newest revision that may be handed out, else its newest: its standing is the design's. */
export function presentDesign(page: DesignPage): Design {
  const availability = page.availabilities.of(page.design.id);
  const revisions = page.revisions.map((row) => presentRevision(row, availability));
  const newest = presentRevision(page.current, availability);
  const context = {
    uploaderId: page.design.ownerId,
    availabilities: page.availabilities,
    isWithheld: newest.withheld !== undefined,
  };
  const { parent, remixes } = page.lineage;
  return {
    ...presentWords(page),
    licence: newest.licence,
    standing: standingsOf(page.evidence, context),
    settingsStanding: settingsStandingsOf(page.evidence, context),
    revision: newest,
    revisions: revisions.map(({ drawing: _drawing, ...revision }) => revision),
    cuts: page.cuts.map((row) => {
      const withheld = withheldSettings(row, page.evidence, page.availabilities);
      return {
        ...presentCutRecord(row, availability),
        ...(withheld === null ? {} : { settingsWithheld: { reason: withheld.reason } }),
      };
    }),
    takeCount: page.takeCount,
    takenByMe: page.isTakenByReader,
    cautions: availability.cautions.map(({ reason, decidedAt }) => ({ reason, decidedAt })),
    ...(newest.withheld === undefined ? {} : { withheld: newest.withheld }),
    ...(parent === null
      ? {}
      : {
          parent: {
            slug: parent.slug,
            revision: parent.revision,
            title: parent.title,
            drawingNumber: parent.drawingNumber,
            ownerName: parent.ownerName,
          },
        }),
    remixes: remixes.map(({ id, ownerId: _owner, revisionIds, ...remix }) => ({
      ...remix,
      // Its page shows a revision that is handed out when there is one.
      withheld: revisionIds.every(
        (revisionId) => withholdingOf(page.availabilities.of(id), revisionId) !== null,
      ),
    })),
  };
}

/** The parent of a remix; a design that is none has nulls in its place. */
function parentOf({ slug, revision, title, drawingNumber, ownerName }: NewestRevision['parent']) {
  if (slug === null || revision === null || title === null || drawingNumber === null || ownerName === null) {
    return {};
  }
  return { parent: { slug, revision, title, drawingNumber, ownerName } };
}

export interface ListEvidence {
  cuts: readonly CutRow[];
  availabilities: Availabilities;
}

export function presentListItem(row: NewestRevision, { cuts, availabilities }: ListEvidence): DesignListItem {
  const { design, revision } = row;
  const { widthMm, heightMm, boundsMm } = revision.drawing;
  const availability = availabilities.of(design.id);
  const withheld = withholdingOf(availability, revision.id);
  const newestCut = cuts[0]?.cut;
  return {
    ...presentWords(row),
    licence: revision.licence,
    standing: standingsOf(cuts, {
      uploaderId: design.ownerId,
      availabilities,
      isWithheld: withheld !== null,
    }),
    cautions: availability.cautions.map(({ reason, decidedAt }) => ({ reason, decidedAt })),
    ...(withheld === null ? {} : { withheld }),
    ...parentOf(row.parent),
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
