import { zodResolver } from '@hookform/resolvers/zod';
import { type Stock, type StockCreate, stockCreate } from '#shared/api/bench.ts';
import { useAddStock, useChangeStock } from '../../../api/stock.ts';
import { SelectField } from '../../../components/SelectField.tsx';
import { TextField } from '../../../components/TextField.tsx';
import { useUnits } from '../../../units/units-context.tsx';
import { familyLabels } from '../../../words/labels.ts';
import { optionsOf } from '../../../words/options.ts';
import { ConflictNote } from '../../form/ConflictNote.tsx';
import { FormFrame } from '../../form/FormFrame.tsx';
import type { FieldLabels } from '../../form/field-problems.ts';
import { NumberInput } from '../../form/NumberInput.tsx';
import { sayValue } from '../../form/say-value.ts';
import { useSavedForm } from '../../form/use-saved-form.ts';

interface StockFormProps {
  /** Null for a new piece. */
  readonly stock: Stock | null;
  readonly onSaved: () => void;
  readonly onCancel: () => void;
}

const labels: FieldLabels = {
  name: 'Name',
  materialId: 'Material',
  lengthMm: 'Length',
  widthMm: 'Width',
  thicknessMm: 'Measured thickness',
};
const valuesOf = ({ id: _id, version: _version, createdAt: _at, ...values }: Stock) => values;

export function StockForm({ stock, onSaved, onCancel }: StockFormProps) {
  const { system } = useUnits();
  const add = useAddStock();
  const change = useChangeStock();
  const saved = useSavedForm<StockCreate>({
    resolver: zodResolver(stockCreate),
    values: stock === null ? { name: '', materialId: 'plywood' } : valuesOf(stock),
    labels,
    version: stock?.version,
    save: (given, version) =>
      stock === null || version === undefined
        ? add.mutateAsync(given)
        : change.mutateAsync({ id: stock.id, version, given }),
    onSaved,
  });
  const { form, errorAt, current } = saved;
  return (
    <FormFrame
      saved={saved}
      does={stock === null ? 'Add stock' : 'Save stock'}
      onCancel={onCancel}
      conflict={
        current !== null && (
          <ConflictNote
            what="piece of stock"
            current={current}
            mine={form.getValues()}
            labels={labels}
            say={(path, value) => sayValue(path, value, system)}
            onKeepMine={saved.keepMine}
            onTakeCurrent={() => saved.takeCurrent(valuesOf(current as unknown as Stock))}
          />
        )
      }
    >
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <TextField
          label="Name"
          hint="Such as Birch ply offcut"
          error={errorAt('name')}
          {...form.register('name')}
        />
        <SelectField
          label="Material"
          options={optionsOf(familyLabels)}
          error={errorAt('materialId')}
          {...form.register('materialId')}
        />
      </div>
      <div className="grid items-start gap-4 sm:grid-cols-3">
        <NumberInput saved={saved} name="lengthMm" label="Length" quantity="length" />
        <NumberInput saved={saved} name="widthMm" label="Width" quantity="length" />
        <NumberInput
          saved={saved}
          name="thicknessMm"
          label="Measured thickness"
          quantity="length"
          hint="With a caliper: sheets are rarely what they are called"
        />
      </div>
    </FormFrame>
  );
}
