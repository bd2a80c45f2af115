import { useFormContext, useWatch } from 'react-hook-form';
import type { Bit } from '#shared/api/bench.ts';
import { SelectField } from '../../components/SelectField.tsx';
import { bitKindLabels } from '../../words/labels.ts';
import { optionsOf } from '../../words/options.ts';
import { ShareNumber } from './ShareNumber.tsx';
import type { ShareValues } from './share-values.ts';
import type { ShareForm } from './use-share-form.ts';

interface BitUsedFieldProps {
  readonly share: ShareForm;
  readonly bits: readonly Bit[];
}

/** The bit of the cut: one of my drawer, whose measures are taken over, or another, described. */
export function BitUsedField({ share, bits }: BitUsedFieldProps) {
  const { register, control, setValue } = useFormContext<ShareValues>();
  const bitFrom = useWatch({ control, name: 'bitFrom' });
  const { errorAt } = share;
  const takeOver = (id: string) => {
    const bit = bits.find((each) => each.id === id);
    if (bit === undefined) return;
    const { diameterMm, flutes, kind } = bit;
    setValue('cut.bit', { diameterMm, flutes, kind }, { shouldDirty: true });
  };
  return (
    <>
      <SelectField
        label="Bit"
        placeholder="Choose a bit"
        hint="From your drawer, or another that you describe"
        options={[
          ...bits.map(({ id, name }) => ({ value: id, label: name })),
          { value: 'described', label: 'Another bit: describe it' },
        ]}
        error={errorAt('bitFrom')}
        {...register('bitFrom', { onChange: (event) => takeOver(event.target.value) })}
      />
      {bitFrom === 'described' && (
        <div className="grid items-start gap-4 border-l-2 border-ink pl-4 sm:col-span-full sm:grid-cols-3">
          <ShareNumber share={share} name="cut.bit.diameterMm" label="Bit diameter" quantity="length" />
          <ShareNumber share={share} name="cut.bit.flutes" label="Flutes" quantity={{ unit: '' }} />
          <SelectField
            label="Kind of bit"
            placeholder="Choose a kind"
            options={optionsOf(bitKindLabels)}
            error={errorAt('cut.bit.kind')}
            {...register('cut.bit.kind')}
          />
        </div>
      )}
    </>
  );
}
