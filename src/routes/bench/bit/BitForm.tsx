import { zodResolver } from '@hookform/resolvers/zod';
import { useWatch } from 'react-hook-form';
import { type Bit, type BitCreate, bitCreate } from '#shared/api/bench.ts';
import { useAddBit, useChangeBit } from '../../../api/bits.ts';
import { CheckField } from '../../../components/CheckField.tsx';
import { SelectField } from '../../../components/SelectField.tsx';
import { TextField } from '../../../components/TextField.tsx';
import { useUnits } from '../../../units/units-context.tsx';
import { bitKindLabels } from '../../../words/labels.ts';
import { optionsOf } from '../../../words/options.ts';
import { ConflictNote } from '../../form/ConflictNote.tsx';
import { FieldGroup } from '../../form/FieldGroup.tsx';
import { FormFrame } from '../../form/FormFrame.tsx';
import { NumberInput } from '../../form/NumberInput.tsx';
import { sayValue } from '../../form/say-value.ts';
import { useSavedForm } from '../../form/use-saved-form.ts';
import { bitLabels } from './bit-labels.ts';

interface BitFormProps {
  /** Null for a new one. */
  readonly bit: Bit | null;
  readonly onSaved: () => void;
  readonly onCancel: () => void;
}

const newBit = { name: '', kind: 'up-cut', canPlunge: true, flutes: 2 } as const;
const valuesOf = ({ id: _id, version: _version, createdAt: _at, ...values }: Bit) => values;

export function BitForm({ bit, onSaved, onCancel }: BitFormProps) {
  const { system } = useUnits();
  const add = useAddBit();
  const change = useChangeBit();
  const saved = useSavedForm<BitCreate>({
    resolver: zodResolver(bitCreate),
    values: bit === null ? newBit : valuesOf(bit),
    labels: bitLabels,
    version: bit?.version,
    save: (given, version) =>
      bit === null || version === undefined
        ? add.mutateAsync(given)
        : change.mutateAsync({ id: bit.id, version, given }),
    onSaved,
  });
  const { form, errorAt, current } = saved;
  const kind = useWatch({ control: form.control, name: 'kind' });
  return (
    <FormFrame
      saved={saved}
      does={bit === null ? 'Add bit' : 'Save bit'}
      onCancel={onCancel}
      conflict={
        current !== null && (
          <ConflictNote
            what="bit"
            current={current}
            mine={form.getValues()}
            labels={bitLabels}
            say={(path, value) => sayValue(path, value, system)}
            onKeepMine={saved.keepMine}
            onTakeCurrent={() => saved.takeCurrent(valuesOf(current as unknown as Bit))}
          />
        )
      }
    >
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <TextField
          label="Name"
          hint="Such as 1/8 in up-cut, two flutes"
          error={errorAt('name')}
          {...form.register('name')}
        />
        <SelectField
          label="Kind"
          options={optionsOf(bitKindLabels)}
          error={errorAt('kind')}
          {...form.register('kind')}
        />
      </div>
      <FieldGroup legend="Measures" columns={4}>
        <NumberInput saved={saved} name="diameterMm" label="Cutting diameter" quantity="length" />
        <NumberInput saved={saved} name="shankMm" label="Shank" quantity="length" hint="1/4 in is not 6 mm" />
        <NumberInput saved={saved} name="cuttingLengthMm" label="Cutting length" quantity="length" />
        <NumberInput saved={saved} name="flutes" label="Flutes" quantity={{ unit: '' }} />
        {kind === 'v-bit' && (
          <NumberInput
            saved={saved}
            name="angleDeg"
            label="Included angle"
            quantity={{ unit: '°' }}
            hint="From edge to edge, not half of it"
          />
        )}
        <NumberInput
          saved={saved}
          name="maxRpm"
          label="Marked greatest speed"
          quantity="rpm"
          isOptional
          hint="As marked on the shank"
        />
      </FieldGroup>
      <CheckField
        label="Its end can plunge: it cuts to the centre"
        error={errorAt('canPlunge')}
        {...form.register('canPlunge')}
      />
    </FormFrame>
  );
}
