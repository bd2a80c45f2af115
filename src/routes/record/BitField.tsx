import { useFormContext, useWatch } from 'react-hook-form';
import type { Bit } from '#shared/api/bench.ts';
import { SelectField } from '../../components/SelectField.tsx';
import { bitKindLabels } from '../../words/labels.ts';
import { optionsOf } from '../../words/options.ts';
import { NumberInput } from '../form/NumberInput.tsx';
import type { SavedForm } from '../form/use-saved-form.ts';
import type { RecordValues } from './record-values.ts';

interface BitFieldProps {
  readonly saved: SavedForm<RecordValues>;
  readonly bits: readonly Bit[];
}

/** The bit of the cut: one of my drawer, or another, described. */
export function BitField({ saved, bits }: BitFieldProps) {
  const { register, control } = useFormContext<RecordValues>();
  const bitFrom = useWatch({ control, name: 'bitFrom' });
  return (
    <>
      <SelectField
        label="Bit"
        placeholder="Choose a bit"
        options={[
          ...bits.map(({ id, name }) => ({ value: id, label: name })),
          { value: 'described', label: 'Another bit: describe it' },
        ]}
        error={saved.errorAt('bitFrom') ?? saved.errorAt('bitId')}
        {...register('bitFrom')}
      />
      {bitFrom === 'described' && (
        <div className="grid items-start gap-4 border-l-2 border-ink pl-4 sm:col-span-full sm:grid-cols-3">
          <NumberInput saved={saved} name="bit.diameterMm" label="Bit diameter" quantity="length" />
          <NumberInput saved={saved} name="bit.flutes" label="Flutes" quantity={{ unit: '' }} />
          <SelectField
            label="Kind of bit"
            placeholder="Choose a kind"
            options={optionsOf(bitKindLabels)}
            error={saved.errorAt('bit.kind')}
            {...register('bit.kind')}
          />
        </div>
      )}
    </>
  );
}
