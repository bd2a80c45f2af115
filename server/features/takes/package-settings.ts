import type { CutRow } from '#server/features/cuts/records.ts';
import type { RevisionOfDesign } from '#server/features/designs/queries.ts';
import { findingsOf } from '#server/features/review/rule-findings.ts';
import type { PackageSettings } from '#shared/api/package.ts';
import { effectiveFeedMmPerMin } from '#shared/cutting/effective-feed.ts';

const advice = [
  'Numbers are starting points: try them on scrap first.',
  'The machine maker’s manual, the bit maker’s marked limits and local rules come first.',
  'Wear eye, ear and breathing protection; no gloves or loose sleeves near a spindle.',
  'Extraction on before the spindle. Nobody, least of all children, within reach.',
  'Never leave a running machine, and know its emergency stop.',
  'Keep clamps clear of the bit and the dust shoe.',
  'Metal swarf and embers do not go into a wood-dust bin; look at the bin again half an hour later.',
];

/** settings.json of a package, with the record it carries if there is one, and what speaks against it. */
export function packageSettings(
  found: RevisionOfDesign,
  record: CutRow | null,
  cautions: readonly string[],
  schemaUrl: string,
): PackageSettings {
  const { design, revision } = found;
  return {
    $schema: schemaUrl,
    design: {
      title: design.title,
      drawingNumber: design.drawingNumber,
      revision: revision.number,
      geometryHash: revision.geometryHash,
      licence: revision.licence,
    },
    drawing: { widthMm: revision.drawing.widthMm, heightMm: revision.drawing.heightMm, origin: 'front-left' },
    cautions: [...cautions],
    ...(record === null ? {} : { record: recordOf(record) }),
    advice,
  };
}

function recordOf({ cut, memberName, inService }: CutRow): NonNullable<PackageSettings['record']> {
  const { overridePercent } = cut;
  return {
    memberName,
    machineName: cut.machine.name,
    cutOn: cut.cutOn,
    bit: cut.bit,
    materialId: cut.materialId,
    stockThicknessMm: cut.stockThicknessMm,
    settings: cut.settings,
    ...(overridePercent === null ? {} : { overridePercent }),
    effectiveFeedMmPerMin: effectiveFeedMmPerMin(cut.settings, overridePercent),
    holdDown: cut.holdDown,
    outcome: cut.outcome,
    runTimeS: cut.runTimeS,
    notes: cut.notes,
    wentWrong: cut.wentWrong,
    ...(inService === null ? {} : { inService: { result: inService.result, notes: inService.notes } }),
    findings: findingsOf(cut).map(({ level, sentence, source }) => ({ level, sentence, source })),
  };
}
