import type { Machine } from '#shared/api/bench.ts';
import { SelectField } from '../../components/SelectField.tsx';
import { materialLabels, outcomeLabels } from '../../words/labels.ts';
import { optionsOf } from '../../words/options.ts';
import { type LogFilters, logFiltersFrom } from './log-filters.ts';

interface LogFilterBarProps {
  readonly filters: LogFilters;
  readonly machines: readonly Machine[];
  readonly onChange: (filters: LogFilters) => void;
}

const whoseChoices = [
  { value: 'mine', label: 'Mine' },
  { value: 'club', label: 'The club’s' },
] as const;

/** Whose cuts, in what, with what outcome, on which of my machines. */
export function LogFilterBar({ filters, machines, onChange }: LogFilterBarProps) {
  const change = (name: keyof LogFilters, value: string) => {
    const params = new URLSearchParams();
    for (const [key, each] of Object.entries({ ...filters, [name]: value === '' ? null : value })) {
      if (each !== null) params.set(key, each);
    }
    onChange(logFiltersFrom(params));
  };
  return (
    <div className="grid items-end gap-4 sm:grid-cols-2 lg:grid-cols-[auto_repeat(3,minmax(0,14rem))]">
      <fieldset className="flex">
        <legend className="mb-1 text-sm leading-5 font-semibold">Whose cuts</legend>
        {whoseChoices.map(({ value, label }) => (
          <label
            key={value}
            className="flex min-h-10 flex-1 cursor-pointer items-center justify-center border border-ink bg-paper px-4 py-1.5 not-first:-ml-px whitespace-nowrap has-checked:bg-ink has-checked:font-semibold has-checked:text-paper has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-layout"
          >
            <input
              type="radio"
              name="whose"
              value={value}
              checked={filters.whose === value}
              onChange={() => change('whose', value)}
              className="sr-only"
            />
            {label}
          </label>
        ))}
      </fieldset>
      <SelectField
        label="Material"
        value={filters.material ?? ''}
        placeholder="Any material"
        options={optionsOf(materialLabels)}
        onChange={(event) => change('material', event.target.value)}
      />
      <SelectField
        label="Outcome"
        value={filters.outcome ?? ''}
        placeholder="Any outcome"
        options={optionsOf(outcomeLabels)}
        onChange={(event) => change('outcome', event.target.value)}
      />
      {filters.whose === 'mine' && machines.length > 0 && (
        <SelectField
          label="Machine"
          value={filters.machineId ?? ''}
          placeholder="Any of my machines"
          options={machines.map(({ id, name }) => ({ value: id, label: name }))}
          onChange={(event) => change('machineId', event.target.value)}
        />
      )}
    </div>
  );
}
