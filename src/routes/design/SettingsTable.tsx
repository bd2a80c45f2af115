import type { CutRecord } from '#shared/api/cuts.ts';
import { formatDuration } from '#shared/units/duration.ts';
import { feedUnit, formatFeedBare } from '#shared/units/feed.ts';
import { formatLength, formatLengthBare } from '#shared/units/length.ts';
import { formatRpmBare } from '#shared/units/spindle-speed.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { useUnits } from '../../units/units-context.tsx';
import { bitKindLabels, holdDownLabels, materialLabels, outcomeLabels } from '../../words/labels.ts';

interface Row {
  readonly name: string;
  readonly unit?: string;
  readonly figure: string;
}

/** What is typed in, in the order it is asked for at the machine. */
const settingRows = ({ settings, runTimeS }: CutRecord, system: UnitSystem): readonly Row[] => {
  const length = (mm: number) => formatLengthBare(mm, system, { digits: 2, trim: true });
  return [
    { name: 'Spindle', unit: 'rpm', figure: formatRpmBare(settings.spindleRpm) },
    { name: 'Feed', unit: feedUnit(system), figure: formatFeedBare(settings.feedMmPerMin, system) },
    { name: 'Plunge', unit: feedUnit(system), figure: formatFeedBare(settings.plungeMmPerMin, system) },
    { name: 'Depth of cut', unit: system, figure: length(settings.depthOfCutMm) },
    { name: 'Stepover', unit: system, figure: length(settings.stepoverMm) },
    { name: 'Run time', figure: formatDuration(runTimeS) },
  ];
};

const factRows = (cut: CutRecord, system: UnitSystem): readonly Row[] => {
  const length = (mm: number, digits = 2) => formatLength(mm, system, { digits, trim: true });
  return [
    {
      name: 'Bit',
      figure: `${length(cut.bit.diameterMm, 3)}, ${bitKindLabels[cut.bit.kind].toLowerCase()}, ${cut.bit.flutes === 1 ? '1 flute' : `${cut.bit.flutes} flutes`}`,
    },
    {
      name: 'Material',
      figure: `${length(cut.stockThicknessMm)} ${materialLabels[cut.materialId]}, measured`,
    },
    { name: 'Hold-down', figure: holdDownLabels[cut.holdDown] },
    { name: 'Machine', figure: cut.machine.name },
    { name: 'Outcome', figure: outcomeLabels[cut.outcome] },
  ];
};

/** One record's settings, as they were typed into its machine. */
export function SettingsTable({ record }: { readonly record: CutRecord }) {
  const { system } = useUnits();
  return (
    <>
      <table className="w-full">
        <caption className="sr-only">Settings as recorded by {record.member.name}</caption>
        <thead>
          <tr className="border-b-2 border-ink text-sm text-ink-soft">
            <th scope="col" className="py-1 text-left font-normal">
              Setting
            </th>
            <th scope="col" className="py-1 text-right font-normal">
              as recorded
            </th>
          </tr>
        </thead>
        <tbody>
          {settingRows(record, system).map(({ name, unit, figure }) => (
            <tr key={name} className="border-b border-rule">
              <th scope="row" className="py-1.5 text-left font-semibold">
                {name} {unit !== undefined && <span className="font-normal text-ink-soft">{unit}</span>}
              </th>
              <td className="figures py-1.5 text-right text-base font-semibold">{figure}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <dl className="mt-3 grid grid-cols-[6.5rem_1fr] gap-x-3 gap-y-1 text-sm leading-5">
        {factRows(record, system).map(({ name, figure }) => (
          <div key={name} className="contents">
            <dt className="text-ink-soft">{name}</dt>
            <dd className="min-w-0">{figure}</dd>
          </div>
        ))}
      </dl>
      {record.notes !== '' && (
        <p className="mt-3 border-l-2 border-ink pl-3 text-sm leading-5 whitespace-pre-line">
          {record.notes}
        </p>
      )}
    </>
  );
}
