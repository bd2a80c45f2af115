import type { ReactNode } from 'react';

interface StepProps {
  readonly id: string;
  readonly number: number;
  readonly title: string;
  readonly hint: string;
  readonly isDone: boolean;
  readonly children: ReactNode;
}

/** A step of the sheet, numbered with a balloon as parts are on a drawing. */
export function Step({ id, number, title, hint, isDone, children }: StepProps) {
  return (
    <section
      id={id}
      tabIndex={-1}
      aria-labelledby={`${id}-head`}
      className="scroll-mt-24 border-t-2 border-ink pt-5 focus:outline-none"
    >
      <div className="flex items-center gap-4">
        <span
          aria-hidden="true"
          className={`figures grid size-9 shrink-0 place-items-center rounded-full border-2 text-base font-bold ${isDone ? 'border-pine bg-pine text-paper' : 'border-ink bg-paper'}`}
        >
          {isDone ? '✓' : number}
        </span>
        <h2 id={`${id}-head`} className="text-xl leading-7">
          {title}
          {isDone && <span className="sr-only">, done</span>}
        </h2>
      </div>
      <div className="min-w-0 max-md:mt-2 md:pl-13">
        <p className="mb-5 max-w-prose text-ink-soft">{hint}</p>
        {children}
      </div>
    </section>
  );
}
