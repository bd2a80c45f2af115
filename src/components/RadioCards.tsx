import { type ComponentProps, type ReactNode, useId } from 'react';
import { errorId, FieldError } from './FieldFrame.tsx';

interface RadioCard {
  readonly value: string;
  readonly label: string;
  readonly detail?: ReactNode;
}

interface RadioCardsProps extends Omit<ComponentProps<'input'>, 'id' | 'type' | 'value' | 'defaultValue'> {
  readonly legend: string;
  readonly cards: readonly RadioCard[];
  /** Left out when a form library holds the value. */
  readonly value?: string;
  readonly error?: string | undefined;
}

/** A choice among few, each with a line that explains it. */
export function RadioCards({ legend, cards, value, error, ...input }: RadioCardsProps) {
  const id = useId();
  return (
    <fieldset aria-describedby={error === undefined ? undefined : errorId(id)}>
      <legend className="mb-1 text-sm leading-5 font-semibold">{legend}</legend>
      <div className="grid gap-2 sm:grid-cols-[repeat(auto-fit,minmax(12rem,1fr))]">
        {cards.map((card) => (
          <label
            key={card.value}
            className="flex gap-3 border border-ink bg-paper p-3 hover:bg-film has-checked:outline-2 has-checked:-outline-offset-2 has-checked:outline-layout has-focus-visible:outline-2 has-focus-visible:outline-offset-2"
          >
            <input
              type="radio"
              className="mt-1 size-4 shrink-0 appearance-none rounded-full border border-ink bg-paper checked:border-[5px] checked:border-layout focus-visible:outline-none"
              {...input}
              value={card.value}
              {...(value === undefined ? {} : { checked: value === card.value })}
            />
            <span className="min-w-0">
              <span className="block font-semibold">{card.label}</span>
              {card.detail !== undefined && (
                <span className="block text-sm leading-5 text-ink-soft">{card.detail}</span>
              )}
            </span>
          </label>
        ))}
      </div>
      <FieldError id={id} message={error} />
    </fieldset>
  );
}
