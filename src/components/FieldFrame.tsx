import type { ReactNode } from 'react';

export interface FieldWords {
  readonly label: string;
  readonly hint?: ReactNode;
  /** What to change. */
  readonly error?: string | undefined;
  /** Said beside the label of a field that may stay empty. */
  readonly isOptional?: boolean;
}

interface FieldFrameProps extends FieldWords {
  readonly id: string;
  readonly children: ReactNode;
}

const hintId = (id: string): string => `${id}-hint`;
export const errorId = (id: string): string => `${id}-error`;

/** The ids that describe a field, for aria-describedby. */
export const describedBy = (id: string, words: FieldWords): string | undefined =>
  [words.hint === undefined ? null : hintId(id), words.error === undefined ? null : errorId(id)]
    .filter((part) => part !== null)
    .join(' ') || undefined;

/** The look of everything that is typed into or chosen from. */
export const inputLook =
  'min-h-10 w-full min-w-0 border border-ink bg-paper px-3 py-1.5 leading-6 placeholder:text-ink-soft disabled:border-rule disabled:text-ink-soft aria-invalid:border-2 aria-invalid:border-brick';

export function FieldError({ id, message }: { readonly id: string; readonly message: string | undefined }) {
  if (message === undefined) return null;
  return (
    <p id={errorId(id)} className="mt-1 text-sm leading-5 font-semibold text-brick">
      <span aria-hidden="true">✕ </span>
      {message}
    </p>
  );
}

/** Label above, hint below, and what to change when it is wrong. */
export function FieldFrame({ id, label, hint, error, isOptional = false, children }: FieldFrameProps) {
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="mb-1 block text-sm leading-5 font-semibold">
        {label}
        {isOptional && <span className="font-normal text-ink-soft"> (may stay empty)</span>}
      </label>
      {children}
      {hint !== undefined && (
        <p id={hintId(id)} className="mt-1 text-sm leading-5 text-ink-soft">
          {hint}
        </p>
      )}
      <FieldError id={id} message={error} />
    </div>
  );
}
