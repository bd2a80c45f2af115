import { Controller } from 'react-hook-form';
import type { Spindle } from '#shared/api/bench.ts';
import { NumberField } from '../../../components/NumberField.tsx';
import { RadioCards } from '../../../components/RadioCards.tsx';
import { NumberListField } from '../../form/NumberListField.tsx';
import type { SavedMachine } from './use-machine-form.ts';

// While it is typed, any number may be missing; the schema says so when the form is saved.
type TypedSpindle =
  | { readonly kind: 'range'; readonly minRpm: number | undefined; readonly maxRpm: number | undefined }
  | { readonly kind: 'dial'; readonly positionsRpm: readonly (number | undefined)[] };

const cards = [
  { value: 'range', label: 'Any speed in a range', detail: 'Set by the controller' },
  { value: 'dial', label: 'A dial', detail: 'A router with marked positions' },
];

/** The other kind, as far as what was typed tells: the ends of the dial are the ends of the range. */
const turnedInto = (kind: string, spindle: TypedSpindle): TypedSpindle => {
  if (kind === 'dial' && spindle.kind === 'range')
    return { kind: 'dial', positionsRpm: [spindle.minRpm, spindle.maxRpm] };
  if (kind === 'range' && spindle.kind === 'dial')
    return { kind: 'range', minRpm: spindle.positionsRpm[0], maxRpm: spindle.positionsRpm.at(-1) };
  return spindle;
};

export function SpindleField({ saved, hint }: { readonly saved: SavedMachine; readonly hint?: string }) {
  const { errorAt } = saved;
  return (
    <Controller
      control={saved.form.control}
      name="spindle"
      render={({ field }) => {
        const spindle: TypedSpindle = field.value;
        const change = (next: TypedSpindle) => field.onChange(next as Spindle);
        return (
          <div className="space-y-4 sm:col-span-full">
            <RadioCards
              legend="Spindle speed"
              name="spindle.kind"
              cards={cards}
              value={spindle.kind}
              error={errorAt('spindle')}
              onChange={(event) => change(turnedInto(event.target.value, spindle))}
            />
            {spindle.kind === 'range' ? (
              <div className="grid items-start gap-4 sm:grid-cols-2">
                <NumberField
                  label="Slowest spindle speed"
                  quantity="rpm"
                  name="spindle.minRpm"
                  hint={hint}
                  value={spindle.minRpm}
                  error={errorAt('spindle.minRpm')}
                  onChange={(minRpm) => change({ ...spindle, minRpm })}
                />
                <NumberField
                  label="Fastest spindle speed"
                  quantity="rpm"
                  name="spindle.maxRpm"
                  hint={hint}
                  value={spindle.maxRpm}
                  error={errorAt('spindle.maxRpm')}
                  onChange={(maxRpm) => change({ ...spindle, maxRpm })}
                />
              </div>
            ) : (
              <>
                {hint !== undefined && <p className="text-sm text-ink-soft">{hint}</p>}
                <NumberListField
                  path="spindle.positionsRpm"
                  what="Dial position"
                  quantity="rpm"
                  value={spindle.positionsRpm}
                  onChange={(positionsRpm) => change({ kind: 'dial', positionsRpm })}
                  errorAt={errorAt}
                  most={20}
                />
              </>
            )}
          </div>
        );
      }}
    />
  );
}
