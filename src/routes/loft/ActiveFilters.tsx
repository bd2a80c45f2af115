import { X } from 'lucide-react';
import { Link } from 'react-router-dom';
import type { Chip } from './chips.ts';
import type { Filters } from './filters.ts';

interface ActiveFiltersProps {
  readonly chips: readonly Chip[];
  readonly hrefWith: (change: Partial<Filters>) => string;
}

/** What the list leaves out, each to be taken away. */
export function ActiveFilters({ chips, hrefWith }: ActiveFiltersProps) {
  if (chips.length === 0) return null;
  return (
    <ul aria-label="Filters that are set" className="flex flex-wrap items-center gap-2">
      {chips.map(({ words, without }) => (
        <li key={words} className="min-w-0">
          <Link
            to={hrefWith(without)}
            preventScrollReset
            aria-label={`Take away the filter ${words}`}
            className="flex min-h-8 items-center gap-1.5 border border-ink bg-paper py-0.5 pr-1.5 pl-2.5 text-sm hover:border-layout hover:text-layout"
          >
            <span className="min-w-0 wrap-anywhere">{words}</span>
            <X size={14} strokeWidth={1.75} aria-hidden="true" className="shrink-0" />
          </Link>
        </li>
      ))}
      {chips.length > 1 && (
        <li>
          <Link to="/" className="px-1 text-sm text-layout underline underline-offset-4">
            Clear all
          </Link>
        </li>
      )}
    </ul>
  );
}
