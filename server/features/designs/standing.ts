import type { CutRow } from '#server/features/cuts/records.ts';
import type { Availabilities } from '#server/features/review/decisions.ts';
import type { Design, Standing } from '#shared/api/designs.ts';
import { materialFamilies } from '#shared/api/vocabulary.ts';
import { familyOf } from '#shared/cutting/material-family.ts';
import { sameSettings } from '#shared/evidence/same-settings.ts';
import { standingOf } from '#shared/evidence/standing.ts';
import type { EvidenceRecord } from '#shared/evidence/votes.ts';
import { hazardsSettled } from '#shared/review/availability.ts';

/** Whose records count, by whom the design was shared, and what moderators decided. */
export interface EvidenceContext {
  uploaderId: string;
  /** Of every design that the records were made for: they may be several with one geometry. */
  availabilities: Availabilities;
  isWithheld: boolean;
}

function evidenceOf(row: CutRow, { availabilities }: EvidenceContext): EvidenceRecord {
  const { cut, inService } = row;
  const availability = availabilities.of(row.design.id);
  return {
    memberId: cut.memberId,
    recordedAt: cut.createdAt.toISOString(),
    outcome: cut.outcome,
    wentWrong: cut.wentWrong,
    ...(inService === null ? {} : { inService: inService.result }),
    hazardsSettled: hazardsSettled(availability, cut.id),
    hazardOpen: availability.openHazards.has(cut.id),
  };
}

/** The standing of one geometry in each material family that it was cut in. */
export function standingsOf(rows: readonly CutRow[], context: EvidenceContext): Standing[] {
  const used = new Set(rows.map((row) => familyOf(row.cut.materialId)));
  return materialFamilies
    .filter((material) => used.has(material))
    .map((material) => {
      const records = rows
        .filter((row) => row.cut.materialId === material)
        .map((row) => evidenceOf(row, context));
      const { word, votesFor, votesAgainst, low, high } = standingOf(records, context.uploaderId, {
        withheld: context.isWithheld,
      });
      return { material, word, votesFor, votesAgainst, low, high };
    });
}

/** For each record, the same count over the records that were cut with its settings in its material. */
export function settingsStandingsOf(
  rows: readonly CutRow[],
  context: EvidenceContext,
): Design['settingsStanding'] {
  return rows.map((row) => {
    const alike = rows.filter(
      (other) => other.cut.materialId === row.cut.materialId && sameSettings(row.cut, other.cut),
    );
    const withheld = context.isWithheld || context.availabilities.of(row.design.id).settings.has(row.cut.id);
    const { word, votesFor, votesAgainst, low, high } = standingOf(
      alike.map((other) => evidenceOf(other, context)),
      context.uploaderId,
      { withheld },
    );
    return { recordId: row.cut.id, word, votesFor, votesAgainst, low, high };
  });
}
