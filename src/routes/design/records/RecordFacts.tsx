import type { CutRecord } from '#shared/api/cuts.ts';
import { formatDuration } from '#shared/units/duration.ts';
import { formatFeed } from '#shared/units/feed.ts';
import { formatLength } from '#shared/units/length.ts';
import { formatRpm } from '#shared/units/spindle-speed.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { useUnits } from '../../../units/units-context.tsx';
import { holdDownLabels, materialLabels } from '../../../words/labels.ts';
import { sayBitUsed } from '../../../words/say-bit-used.ts';

/** What a record tells, in each of its versions. */
export type CutTold = Pick<
  CutRecord,
  | 'machine'
  | 'bit'
  | 'materialId'
  | 'stockThicknessMm'
  | 'settings'
  | 'holdDown'
  | 'outcome'
  | 'runTimeS'
  | 'overridePercent'
  | 'wentWrong'
  | 'measured'
  | 'notes'
  | 'cutOn'
>;

interface RecordFactsProps {
  readonly told: CutTold;
  /** Withheld settings are not written out. */
  readonly withSettings: boolean;
}

const settingsLine = ({ settings }: CutTold, system: UnitSystem): string =>
  [
    formatRpm(settings.spindleRpm),
    `feed ${formatFeed(settings.feedMmPerMin, system)}`,
    `plunge ${formatFeed(settings.plungeMmPerMin, system)}`,
    `${formatLength(settings.depthOfCutMm, system, { digits: 2, trim: true })} deep a pass`,
  ].join(', ');

/** The facts of a cut, as on a label. */
export function RecordFacts({ told, withSettings }: RecordFactsProps) {
  const { system } = useUnits();
  const { machine, bit, materialId, stockThicknessMm, holdDown, runTimeS, overridePercent } = told;
  const thickness = formatLength(stockThicknessMm, system, { digits: 2, trim: true });
  const facts: readonly (readonly [string, string])[] = [
    ['Machine', machine.name],
    ['Bit', sayBitUsed(bit, system)],
    ['Material', `${thickness} ${materialLabels[materialId]}`],
    ['Hold-down', holdDownLabels[holdDown]],
    ['Run time', formatDuration(runTimeS)],
    ...(overridePercent === undefined ? [] : [['Feed override', `${overridePercent} %`] as const]),
    ...(withSettings ? [['Settings', settingsLine(told, system)] as const] : []),
  ];
  return (
    <dl className="grid grid-cols-[6.5rem_minmax(0,1fr)] gap-x-3 gap-y-0.5 text-sm leading-5">
      {facts.map(([name, fact]) => (
        <div key={name} className="contents">
          <dt className="text-ink-soft">{name}</dt>
          <dd className="min-w-0">{fact}</dd>
        </div>
      ))}
    </dl>
  );
}
