import { Plus, X } from 'lucide-react';
import { useFieldArray, useWatch } from 'react-hook-form';
import { Button } from '../../components/Button.tsx';
import { NumberInput } from '../form/NumberInput.tsx';
import type { SavedForm } from '../form/use-saved-form.ts';
import type { RecordValues } from './record-values.ts';
import { UnitQuestion } from './UnitQuestion.tsx';

interface MeasuredFieldProps {
  readonly saved: SavedForm<RecordValues>;
  /** The server asked which unit these rows are in. */
  readonly rowsInDoubt: ReadonlySet<number>;
  readonly onAsTyped: () => void;
  readonly onSettled: (row: number) => void;
}

const MOST_ROWS = 20;

/** Sizes as drawn and as they came out, a pair in each row. */
export function MeasuredField({ saved, rowsInDoubt, onAsTyped, onSettled }: MeasuredFieldProps) {
  const { control, setValue, clearErrors } = saved.form;
  const { fields, append, remove } = useFieldArray({ control, name: 'measured' });
  const rows = useWatch({ control, name: 'measured' });
  return (
    <fieldset className="min-w-0 border-t border-ink pt-3">
      <legend className="float-left mb-3 w-full text-lg leading-7 font-bold">
        Measured against drawn
        <span className="block text-[0.9375rem] leading-6 font-normal text-ink-soft">
          With a caliper, where it matters: a slot, a bore, the outside.
        </span>
      </legend>
      <div className="clear-both space-y-3">
        {fields.length > 0 && (
          <ol className="max-w-2xl space-y-4">
            {fields.map(({ id }, row) => {
              const { drawnMm, measuredMm } = rows[row] ?? {};
              return (
                <li key={id} className="space-y-2">
                  <div className="flex items-start gap-1">
                    <div className="grid min-w-0 flex-1 gap-2 sm:grid-cols-2">
                      <NumberInput
                        saved={saved}
                        name={`measured.${row}.drawnMm`}
                        label={`Drawn ${row + 1}`}
                        quantity="length"
                      />
                      <NumberInput
                        saved={saved}
                        name={`measured.${row}.measuredMm`}
                        label={`Measured ${row + 1}`}
                        quantity="length"
                      />
                    </div>
                    <Button
                      look="quiet"
                      className="mt-6"
                      aria-label={`Remove size ${row + 1}`}
                      onClick={() => remove(row)}
                    >
                      <X size={18} strokeWidth={1.5} aria-hidden="true" />
                    </Button>
                  </div>
                  {rowsInDoubt.has(row) && drawnMm !== undefined && measuredMm !== undefined && (
                    <UnitQuestion
                      size={{ drawnMm, measuredMm }}
                      onAsTyped={onAsTyped}
                      onConvert={({ field, sizeMm }) => {
                        setValue(`measured.${row}.${field}`, sizeMm, { shouldDirty: true });
                        clearErrors(`measured.${row}`);
                        onSettled(row);
                      }}
                    />
                  )}
                </li>
              );
            })}
          </ol>
        )}
        {fields.length < MOST_ROWS && (
          <Button name={fields.length === 0 ? 'measured' : undefined} onClick={() => append({})}>
            <Plus size={18} strokeWidth={1.5} aria-hidden="true" />
            {fields.length === 0 ? 'Measured size' : 'Another size'}
          </Button>
        )}
      </div>
    </fieldset>
  );
}
