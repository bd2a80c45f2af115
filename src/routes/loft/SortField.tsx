import { ChevronDown } from 'lucide-react';
import { useId } from 'react';
import type { Sort } from '#shared/api/vocabulary.ts';
import { sortLabels } from '../../words/labels.ts';
import { optionsOf } from '../../words/options.ts';
import type { Filters } from './filters.ts';

interface SortFieldProps {
  readonly filters: Filters;
  readonly onChange: (sort: Sort | null) => void;
}

/** Best match needs words to match; without them the newest come first. */
export function SortField({ filters, onChange }: SortFieldProps) {
  const id = useId();
  const usual: Sort = filters.q === '' ? 'newest' : 'match';
  const options = optionsOf(sortLabels).filter(({ value }) => value !== 'match' || filters.q !== '');
  const inUse = options.some(({ value }) => value === filters.sort) ? filters.sort : usual;
  return (
    <div className="relative flex items-center">
      <label htmlFor={id} className="sr-only">
        Order
      </label>
      <select
        id={id}
        value={inUse ?? usual}
        onChange={(event) => {
          const sort = options.find(({ value }) => value === event.target.value)?.value ?? usual;
          onChange(sort === usual ? null : sort);
        }}
        className="field-sizing-content min-h-8 appearance-none border border-ink bg-paper py-0.5 pr-8 pl-2.5 text-sm"
      >
        {options.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </select>
      <ChevronDown
        size={14}
        strokeWidth={1.75}
        aria-hidden="true"
        className="pointer-events-none absolute right-2.5"
      />
    </div>
  );
}
