import { useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import type { Bit } from '#shared/api/bench.ts';
import { formatFeed } from '#shared/units/feed.ts';
import { formatLength } from '#shared/units/length.ts';
import { formatRpm } from '#shared/units/spindle-speed.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { SelectField } from '../../components/SelectField.tsx';
import { useUnits } from '../../units/units-context.tsx';
import { holdDownLabels, materialLabels } from '../../words/labels.ts';
import { optionsOf } from '../../words/options.ts';
import { FieldGroup } from '../form/FieldGroup.tsx';
import { NumberInput } from '../form/NumberInput.tsx';
import type { SavedForm } from '../form/use-saved-form.ts';
import { BitField } from './BitField.tsx';
import type { RecordValues } from './record-values.ts';

interface CutWithProps {
  readonly saved: SavedForm<RecordValues>;
  readonly machines: readonly { readonly id: string; readonly name: string }[];
  readonly bits: readonly Bit[];
}

const has = (value: number | undefined): value is number => value !== undefined && !Number.isNaN(value);
const labelIn = (labels: Readonly<Record<string, string>>, code: string): string | undefined => labels[code];

/** What stands in the closed part, so that nobody records what they did not read. */
const lineOf = (values: RecordValues, { machines, bits }: CutWithProps, system: UnitSystem): string => {
  const { machineId, bitFrom, bit, materialId, stockThicknessMm, holdDown, settings } = values;
  const length = (mm: number | undefined) =>
    has(mm) ? formatLength(mm, system, { digits: 3, trim: true }) : undefined;
  const own = bits.find(({ id }) => id === bitFrom)?.name;
  const { spindleRpm, feedMmPerMin, depthOfCutMm } = settings;
  return [
    machines.find(({ id }) => id === machineId)?.name,
    own ?? (bitFrom === 'described' && has(bit.diameterMm) ? `${length(bit.diameterMm)} bit` : undefined),
    [length(stockThicknessMm), labelIn(materialLabels, materialId)].filter(Boolean).join(' '),
    labelIn(holdDownLabels, holdDown)?.toLowerCase(),
    has(spindleRpm) ? formatRpm(spindleRpm) : undefined,
    has(feedMmPerMin) ? formatFeed(feedMmPerMin, system) : undefined,
    has(depthOfCutMm) ? `${length(depthOfCutMm)} deep a pass` : undefined,
  ]
    .filter((part) => part !== undefined && part !== '')
    .join(' · ');
};

const isMissing = ({ machineId, bitFrom, materialId, stockThicknessMm, holdDown, settings }: RecordValues) =>
  [machineId, bitFrom, materialId, holdDown].includes('') ||
  ![stockThicknessMm, settings.feedMmPerMin, settings.spindleRpm].every(has);

/** What it was cut with: filled in beforehand, folded away as long as nothing is missing. */
export function CutWith(props: CutWithProps) {
  const { saved, machines, bits } = props;
  const { system } = useUnits();
  const { register, control } = useFormContext<RecordValues>();
  const values = useWatch({ control }) as RecordValues;
  const [isOpen, setIsOpen] = useState(() => isMissing(values));
  return (
    <details
      open={isOpen}
      onToggle={(event) => setIsOpen(event.currentTarget.open)}
      className="border border-ink bg-paper"
    >
      <summary className="p-4 leading-6">
        <span className="font-bold">Cut with</span>{' '}
        <span className="text-layout underline underline-offset-4">{isOpen ? 'close' : 'change'}</span>
        <span className="mt-1 block">{lineOf(values, props, system)}</span>
      </summary>
      <div className="space-y-6 p-4 pt-0">
        <FieldGroup legend="On what">
          <SelectField
            label="Machine"
            placeholder="Choose a machine"
            options={machines.map(({ id, name }) => ({ value: id, label: name }))}
            error={saved.errorAt('machineId')}
            {...register('machineId')}
          />
          <BitField saved={saved} bits={bits} />
          <SelectField
            label="Material"
            placeholder="Choose a material"
            options={optionsOf(materialLabels)}
            error={saved.errorAt('materialId')}
            {...register('materialId')}
          />
          <NumberInput
            saved={saved}
            name="stockThicknessMm"
            label="Measured thickness"
            quantity="length"
            hint="Of the stock, with a caliper"
          />
          <SelectField
            label="Hold-down"
            placeholder="Choose a hold-down"
            options={optionsOf(holdDownLabels)}
            error={saved.errorAt('holdDown')}
            {...register('holdDown')}
          />
        </FieldGroup>
        <FieldGroup legend="Settings as typed into the machine" columns={4}>
          <NumberInput saved={saved} name="settings.spindleRpm" label="Spindle speed" quantity="rpm" />
          <NumberInput saved={saved} name="settings.feedMmPerMin" label="Feed" quantity="feed" />
          <NumberInput saved={saved} name="settings.plungeMmPerMin" label="Plunge rate" quantity="feed" />
          <NumberInput saved={saved} name="settings.depthOfCutMm" label="Depth of cut" quantity="length" />
          <NumberInput saved={saved} name="settings.stepoverMm" label="Stepover" quantity="length" />
        </FieldGroup>
      </div>
    </details>
  );
}
