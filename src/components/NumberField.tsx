import { type Ref, useId, useState } from 'react';
import { plainQuantity, type Quantity, quantities } from '../units/quantities.ts';
import { useUnits } from '../units/units-context.tsx';
import { describedBy, FieldFrame, type FieldWords, inputLook } from './FieldFrame.tsx';

interface NumberFieldProps extends FieldWords {
  /** What is measured; or `{ unit }` for a number that has one unit only. */
  readonly quantity: Quantity | { readonly unit: string };
  /** In mm, mm/min, rpm, s or the given unit; NaN while what is typed cannot be read. */
  readonly value: number | undefined;
  /** The text as it was typed, when it was kept beside the number. */
  readonly typed?: string | undefined;
  readonly onChange: (value: number | undefined, typed: string) => void;
  readonly onBlur?: () => void;
  readonly name?: string;
  readonly ref?: Ref<HTMLInputElement>;
  readonly disabled?: boolean;
  readonly placeholder?: string;
}

const nearly = (left: number, right: number) => Math.abs(left - right) <= 1e-9 * Math.max(1, Math.abs(right));

/** Takes a number in either unit system (`1/4"`, `6.35mm`, `0.25 in`) and keeps the text as typed. */
export function NumberField(props: NumberFieldProps) {
  const { quantity, value, typed, onChange, onBlur, name, ref, disabled, placeholder, hint } = props;
  const id = useId();
  const { system } = useUnits();
  const words = typeof quantity === 'string' ? quantities[quantity] : plainQuantity(quantity.unit);

  const textFor = (next: number | undefined): string => {
    if (next === undefined || Number.isNaN(next)) return typed ?? '';
    const reading = words.read(typed ?? '', system);
    return typed !== undefined && reading.ok && nearly(reading.value, next)
      ? typed
      : words.show(next, system);
  };
  const [text, setText] = useState(() => textFor(value));
  const [known, setKnown] = useState({ value, system });
  const [wasLeft, setWasLeft] = useState(false);
  if (!Object.is(known.value, value)) {
    // The form changed the value: a draft came back, or it was reset.
    setKnown({ value, system });
    setText(textFor(value));
  } else if (known.system !== system) {
    // A bare number means something else in the other units; a text that names its unit stays.
    setKnown({ value, system });
    const reading = words.read(text, system);
    if (value !== undefined && !Number.isNaN(value) && !(reading.ok && nearly(reading.value, value))) {
      setText(words.show(value, system));
    }
  }

  const reading = text.trim() === '' ? null : words.read(text, system);
  const change = (next: string) => {
    const read = next.trim() === '' ? null : words.read(next, system);
    const nextValue = read === null ? undefined : read.ok ? read.value : Number.NaN;
    setText(next);
    setKnown({ value: nextValue, system });
    onChange(nextValue, next.trim());
  };
  const isPlain = /^[\d\s.]*$/.test(text);
  const unit = words.unit(system);
  const error = wasLeft && reading?.ok === false ? reading.message : props.error;
  const frame: FieldWords = {
    label: props.label,
    hint,
    error,
    ...(props.isOptional === undefined ? {} : { isOptional: props.isOptional }),
  };
  return (
    <FieldFrame id={id} {...frame}>
      <div className="relative">
        <input
          id={id}
          ref={ref}
          name={name}
          disabled={disabled}
          placeholder={placeholder}
          value={text}
          onChange={(event) => change(event.target.value)}
          onBlur={() => {
            setWasLeft(true);
            onBlur?.();
          }}
          type="text"
          // Fractions and units need the whole keyboard; plain numbers do not.
          inputMode={quantity === 'length' || quantity === 'time' ? 'text' : 'decimal'}
          autoComplete="off"
          spellCheck={false}
          aria-invalid={error !== undefined}
          aria-describedby={[describedBy(id, frame), `${id}-unit`].filter(Boolean).join(' ')}
          className={`${inputLook} figures pr-24`}
        />
        <span
          id={`${id}-unit`}
          className="figures pointer-events-none absolute inset-y-0 right-3 flex items-center text-sm text-ink-soft"
        >
          {reading?.ok === true && !isPlain ? `= ${words.say(reading.value, system)}` : unit}
        </span>
      </div>
    </FieldFrame>
  );
}
