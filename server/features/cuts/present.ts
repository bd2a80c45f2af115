import { findingsOf } from '#server/features/review/rule-findings.ts';
import type { CutRecord } from '#shared/api/cuts.ts';
import { familyOf } from '#shared/cutting/material-family.ts';
import { type Availability, hazardsSettled } from '#shared/review/availability.ts';
import type { CutRow } from './records.ts';

/** What a record tells, as it is shown and as its earlier versions are kept. */
export function cutTold({ cut }: Pick<CutRow, 'cut'>) {
  const { id, name, bedXMm, bedYMm } = cut.machine;
  return {
    machine: { id, name, bedXMm, bedYMm },
    bit: cut.bit,
    materialId: cut.materialId,
    materialFamily: familyOf(cut.materialId),
    stockThicknessMm: cut.stockThicknessMm,
    settings: cut.settings,
    holdDown: cut.holdDown,
    outcome: cut.outcome,
    runTimeS: cut.runTimeS,
    ...(cut.overridePercent === null ? {} : { overridePercent: cut.overridePercent }),
    wentWrong: cut.wentWrong,
    measured: cut.measured,
    notes: cut.notes,
    cutOn: cut.cutOn,
  };
}

export function presentCutRecord(row: CutRow, availability: Availability): CutRecord {
  const { cut, design, inService, photos } = row;
  const withheld = availability.settings.get(cut.id);
  return {
    id: cut.id,
    version: cut.version,
    design: { slug: design.slug, title: design.title, drawingNumber: design.drawingNumber },
    revision: row.number,
    member: { id: cut.memberId, name: row.memberName },
    ...cutTold(row),
    ...(inService === null
      ? {}
      : {
          inService: {
            result: inService.result,
            notes: inService.notes,
            notedAt: inService.notedAt.toISOString(),
          },
        }),
    photos: photos.map(({ id, widthPx, heightPx }) => ({ id, widthPx, heightPx })),
    hazardsSettled: hazardsSettled(availability, cut.id),
    ...(withheld === undefined ? {} : { settingsWithheld: withheld }),
    findings: findingsOf(cut),
    createdAt: cut.createdAt.toISOString(),
    ...(cut.correctedAt === null ? {} : { correctedAt: cut.correctedAt.toISOString() }),
  };
}
