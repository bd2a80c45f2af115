import { useEffect, useRef } from 'react';

export interface FieldProblem {
  readonly path: string;
  readonly label: string;
  readonly message: string;
}

interface ErrorSummaryProps {
  readonly problems: readonly FieldProblem[];
  /** Puts the cursor into the field, such as react-hook-form's setFocus. */
  readonly onGoTo?: (path: string) => void;
}

/** Everything that has to be changed, at once, at the head of the form; it takes the focus when it comes. */
export function ErrorSummary({ problems, onGoTo }: ErrorSummaryProps) {
  const summary = useRef<HTMLDivElement>(null);
  const isShown = problems.length > 0;
  useEffect(() => {
    if (isShown) summary.current?.focus();
  }, [isShown]);
  if (!isShown) return null;
  return (
    <div ref={summary} role="alert" tabIndex={-1} className="border-2 border-brick bg-paper p-4">
      <p className="font-bold text-brick">
        {problems.length === 1 ? 'One thing to change' : `${problems.length} things to change`}
      </p>
      <ul className="mt-2 space-y-1">
        {problems.map(({ path, label, message }) => (
          <li key={`${path} ${message}`}>
            {onGoTo === undefined ? (
              <strong>{label}</strong>
            ) : (
              <button
                type="button"
                onClick={() => onGoTo(path)}
                className="font-semibold text-layout underline underline-offset-4"
              >
                {label}
              </button>
            )}
            : {message}
          </li>
        ))}
      </ul>
    </div>
  );
}
