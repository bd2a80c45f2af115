import type { ReactNode } from 'react';

interface FieldGroupProps {
  readonly legend: string;
  readonly hint?: ReactNode;
  /** How many fields may stand side by side where there is room. */
  readonly columns?: 2 | 4;
  readonly children: ReactNode;
}

const grids = { 2: 'sm:grid-cols-2', 4: 'sm:grid-cols-2 lg:grid-cols-4' } as const;

export function FieldGroup({ legend, hint, columns = 2, children }: FieldGroupProps) {
  return (
    <fieldset className="min-w-0 border-t border-ink pt-3">
      <legend className="float-left mb-3 w-full text-lg leading-7 font-bold">
        {legend}
        {hint !== undefined && (
          <span className="block text-[0.9375rem] leading-6 font-normal text-ink-soft">{hint}</span>
        )}
      </legend>
      <div className={`clear-both grid items-start gap-4 ${grids[columns]}`}>{children}</div>
    </fieldset>
  );
}
