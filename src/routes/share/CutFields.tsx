import { useFormContext } from 'react-hook-form';
import type { Bit, Machine } from '#shared/api/bench.ts';
import { RadioCards } from '../../components/RadioCards.tsx';
import { SelectField } from '../../components/SelectField.tsx';
import { TextAreaField } from '../../components/TextAreaField.tsx';
import { holdDownLabels, materialLabels } from '../../words/labels.ts';
import { optionsOf } from '../../words/options.ts';
import { FieldGroup } from '../form/FieldGroup.tsx';
import { BitUsedField } from './BitUsedField.tsx';
import { ShareNumber } from './ShareNumber.tsx';
import type { ShareValues } from './share-values.ts';
import type { ShareForm } from './use-share-form.ts';

interface CutFieldsProps {
  readonly share: ShareForm;
  readonly machines: readonly Machine[];
  readonly bits: readonly Bit[];
}

const outcomeCards = [
  { value: 'clean', label: 'Clean', detail: 'As it should be, straight from the machine.' },
  { value: 'usable', label: 'Usable', detail: 'It works, after sanding or with a flaw.' },
  { value: 'failed', label: 'Failed', detail: 'Not usable. This helps the next member too.' },
];

/** The cut that the settings come from, in the order it happens at the machine. */
export function CutFields({ share, machines, bits }: CutFieldsProps) {
  const { register } = useFormContext<ShareValues>();
  const { errorAt } = share;
  return (
    <div className="space-y-8">
      <FieldGroup legend="On what">
        <SelectField
          label="Machine"
          placeholder="Choose a machine"
          options={machines.map(({ id, name }) => ({ value: id, label: name }))}
          error={errorAt('cut.machineId')}
          {...register('cut.machineId')}
        />
        <SelectField
          label="Material"
          placeholder="Choose a material"
          options={optionsOf(materialLabels)}
          error={errorAt('cut.materialId')}
          {...register('cut.materialId')}
        />
        <BitUsedField share={share} bits={bits} />
        <ShareNumber
          share={share}
          name="cut.stockThicknessMm"
          label="Measured thickness"
          quantity="length"
          hint="Of the stock, with a caliper: “6 mm” ply is often 5.6"
        />
        <SelectField
          label="Hold-down"
          placeholder="Choose a hold-down"
          options={optionsOf(holdDownLabels)}
          error={errorAt('cut.holdDown')}
          {...register('cut.holdDown')}
        />
      </FieldGroup>
      <FieldGroup
        legend="Settings"
        columns={4}
        hint="Type them as your controller shows them, in either unit."
      >
        <ShareNumber share={share} name="cut.settings.spindleRpm" label="Spindle speed" quantity="rpm" />
        <ShareNumber share={share} name="cut.settings.feedMmPerMin" label="Feed" quantity="feed" />
        <ShareNumber share={share} name="cut.settings.plungeMmPerMin" label="Plunge rate" quantity="feed" />
        <ShareNumber share={share} name="cut.settings.depthOfCutMm" label="Depth of cut" quantity="length" />
        <ShareNumber share={share} name="cut.settings.stepoverMm" label="Stepover" quantity="length" />
        <ShareNumber
          share={share}
          name="cut.runTimeS"
          label="Run time"
          quantity="time"
          hint="Minutes, or 1:08 for 1 h 08"
        />
      </FieldGroup>
      <RadioCards
        legend="Outcome"
        cards={outcomeCards}
        error={errorAt('cut.outcome')}
        {...register('cut.outcome')}
      />
      <TextAreaField
        label="Notes"
        isOptional
        hint="What you would tell the next member: what held, what tore, what to watch."
        error={errorAt('cut.notes')}
        {...register('cut.notes')}
      />
    </div>
  );
}
