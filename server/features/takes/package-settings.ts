import type { CutRow } from '#server/features/cuts/records.ts';
import type { RevisionOfDesign } from '#server/features/designs/queries.ts';
import type { PackageSettings } from '#shared/api/package.ts';

const advice = [
  'Numbers are starting points: try them on scrap first.',
  'The machine maker’s manual, the bit maker’s marked limits and local rules come first.',
  'Wear eye, ear and breathing protection; no gloves or loose sleeves near a spindle.',
  'Extraction on before the spindle. Nobody, least of all children, within reach.',
  'Never leave a running machine, and know its emergency stop.',
  'Keep clamps clear of the bit and the dust shoe.',
  'Metal swarf and embers do not go into a wood-dust bin; look at the bin again half an hour later.',
];

/** settings.json of a package, with the record it carries if there is one. */
export function packageSettings(
  found: RevisionOfDesign,
  record: CutRow | null,
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
    ...(record === null
      ? {}
      : {
          record: {
            memberName: record.memberName,
            machineName: record.cut.machine.name,
            cutOn: record.cut.cutOn,
            bit: record.cut.bit,
            materialId: record.cut.materialId,
            stockThicknessMm: record.cut.stockThicknessMm,
            settings: record.cut.settings,
            holdDown: record.cut.holdDown,
            outcome: record.cut.outcome,
            runTimeS: record.cut.runTimeS,
            notes: record.cut.notes,
          },
        }),
    advice,
  };
}
