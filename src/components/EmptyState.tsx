import type { ReactNode } from 'react';

interface EmptyStateProps {
  readonly title: string;
  readonly children: ReactNode;
  /** What to do first. */
  readonly action?: ReactNode;
}

/** An empty page is a sheet with nothing on it yet: it says what to do first. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <section className="my-6 max-w-2xl border border-ink bg-paper p-1">
      <div className="border border-rule p-6 md:p-8">
        <h2 className="text-xl leading-7">{title}</h2>
        <div className="mt-2 max-w-prose text-ink-soft">{children}</div>
        {action !== undefined && <div className="mt-6 flex flex-wrap gap-3">{action}</div>}
      </div>
    </section>
  );
}
