import { type ComponentProps, type ReactNode, useId } from 'react';
import { errorId, FieldError } from './FieldFrame.tsx';

interface CheckFieldProps extends Omit<ComponentProps<'input'>, 'id' | 'type'> {
  readonly label: ReactNode;
  readonly error?: string | undefined;
  /** A count at the end of the line, as in a filter. */
  readonly count?: number;
}

/** A square that is filled when it holds. */
export function CheckField({ label, error, count, ...input }: CheckFieldProps) {
  const id = useId();
  return (
    <div>
      <div className="flex items-start gap-2.5">
        <input
          id={id}
          type="checkbox"
          aria-invalid={error !== undefined}
          aria-describedby={error === undefined ? undefined : errorId(id)}
          className="mt-1 size-4 shrink-0 appearance-none border border-ink bg-paper checked:border-4 checked:border-paper checked:bg-layout checked:outline checked:outline-ink focus-visible:outline-2 focus-visible:outline-layout"
          {...input}
        />
        <label htmlFor={id} className="min-w-0 flex-1 leading-6">
          {label}
        </label>
        {count !== undefined && <span className="figures text-sm leading-6 text-ink-soft">{count}</span>}
      </div>
      <FieldError id={id} message={error} />
    </div>
  );
}
