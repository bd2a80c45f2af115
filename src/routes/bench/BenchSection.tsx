import { Plus } from 'lucide-react';
import { type ReactNode, useId } from 'react';
import { LinkButton } from '../../components/LinkButton.tsx';

interface BenchSectionProps {
  readonly title: string;
  readonly count: number;
  readonly addHref: string;
  /** Such as "Add a bit". */
  readonly does: string;
  /** Shown in place of the list: what this is for and what to do first. */
  readonly empty: ReactNode;
  readonly children: ReactNode;
}

/** One part of the bench: its heading, how to add to it, and what lies there. */
export function BenchSection({ title, count, addHref, does, empty, children }: BenchSectionProps) {
  const id = useId();
  return (
    <section aria-labelledby={id}>
      <div className="flex flex-wrap items-end justify-between gap-3 border-b-2 border-ink pb-2">
        <h2 id={id} className="text-xl leading-7">
          {title} <span className="figures text-base font-normal text-ink-soft">{count}</span>
        </h2>
        <LinkButton look="line" to={addHref}>
          <Plus size={18} strokeWidth={1.5} aria-hidden="true" />
          {does}
        </LinkButton>
      </div>
      {count === 0 ? <p className="max-w-prose py-4 text-ink-soft">{empty}</p> : children}
    </section>
  );
}
