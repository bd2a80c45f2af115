import { Link } from 'react-router-dom';

export interface FacetLine {
  readonly value: string;
  readonly label: string;
  readonly count: number;
  readonly isChosen: boolean;
  /** With this value, or without it when it is chosen. */
  readonly href: string;
}

interface FacetLinksProps {
  readonly label: string;
  readonly lines: readonly FacetLine[];
}

/** One choice among the values of a facet, with how many designs each would leave. */
export function FacetLinks({ label, lines }: FacetLinksProps) {
  if (lines.length === 0) return null;
  return (
    <nav aria-label={label}>
      <h2 className="label-narrow mb-1 text-ink-soft">{label}</h2>
      <ul>
        {lines.map(({ value, label: words, count, isChosen, href }) => (
          <li key={value}>
            <Link
              to={href}
              preventScrollReset
              aria-current={isChosen ? 'true' : undefined}
              className={`group flex min-h-7 items-center gap-2.5 hover:text-layout aria-[current]:font-semibold ${count === 0 && !isChosen ? 'text-ink-soft' : ''}`}
            >
              <span
                aria-hidden="true"
                className="grid size-4 shrink-0 place-items-center border border-ink bg-paper group-hover:border-layout"
              >
                {isChosen && <span className="size-2 bg-layout" />}
              </span>
              <span className="min-w-0 flex-1">{words}</span>
              <span className="figures text-sm font-normal text-ink-soft">{count}</span>
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
