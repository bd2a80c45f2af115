import { Plus, X } from 'lucide-react';
import { Button } from '../../components/Button.tsx';
import { NumberField } from '../../components/NumberField.tsx';
import type { Quantity } from '../../units/quantities.ts';

interface NumberListFieldProps {
  /** Path of the list in its form; a field of it is `path.0`. */
  readonly path: string;
  /** One of them, such as "Dial position". */
  readonly what: string;
  readonly quantity: Quantity;
  readonly value: readonly (number | undefined)[];
  readonly onChange: (value: readonly (number | undefined)[]) => void;
  readonly errorAt: (path: string) => string | undefined;
  readonly most: number;
}

/** A list of numbers, each in a field of its own, numbered as on a dial. */
export function NumberListField(props: NumberListFieldProps) {
  const { path, what, quantity, value, onChange, errorAt, most } = props;
  const listError = errorAt(path);
  return (
    <div className="space-y-3">
      <ol className="grid items-start gap-x-4 gap-y-3 sm:grid-cols-2 lg:grid-cols-3">
        {value.map((number, place) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: the place on the dial is what a field is
          <li key={place} className="flex min-w-0 items-start gap-1">
            <div className="min-w-0 flex-1">
              <NumberField
                label={`${what} ${place + 1}`}
                quantity={quantity}
                name={`${path}.${place}`}
                value={number}
                error={errorAt(`${path}.${place}`)}
                onChange={(next) => onChange(value.map((old, at) => (at === place ? next : old)))}
              />
            </div>
            <Button
              look="quiet"
              className="mt-6"
              aria-label={`Remove ${what.toLowerCase()} ${place + 1}`}
              onClick={() => onChange(value.filter((_, at) => at !== place))}
            >
              <X size={18} strokeWidth={1.5} aria-hidden="true" />
            </Button>
          </li>
        ))}
      </ol>
      {listError !== undefined && <p className="text-sm font-semibold text-brick">✕ {listError}</p>}
      {value.length < most && (
        <Button name={value.length === 0 ? path : undefined} onClick={() => onChange([...value, undefined])}>
          <Plus size={18} strokeWidth={1.5} aria-hidden="true" />
          {what}
        </Button>
      )}
    </div>
  );
}
