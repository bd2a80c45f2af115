import type { FitCheck, FitReport } from '#shared/api/fit.ts';
import { formatFeed } from '#shared/units/feed.ts';
import { formatLength } from '#shared/units/length.ts';
import { formatRpm } from '#shared/units/spindle-speed.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { useUnits } from '../units/units-context.tsx';
import { fitCheckLabel, fitLabels } from '../words/labels.ts';
import { FitMark } from './FitMark.tsx';

const figure = (value: number | string, unit: string, system: UnitSystem): string => {
  if (typeof value === 'string') return unit === '' ? value : `${value} ${unit}`;
  if (unit === 'mm') return formatLength(value, system, { digits: 3, trim: true });
  if (unit === 'mm/min') return formatFeed(value, system);
  if (unit === 'rpm' || unit === 'rev/min') return formatRpm(value);
  return `${value} ${unit}`.trimEnd();
};

const figuresOf = ({ id, have, need, unit }: FitCheck, system: UnitSystem): string => {
  // Heights above the bed, where lower is better: "needs" and "has" would read the wrong way round.
  if (id === 'reach' && have !== null && need !== null) {
    return `bottom at ${figure(need, unit, system)}, tip down to ${figure(have, unit, system)}`;
  }
  return [
    need === null ? null : `needs ${figure(need, unit, system)}`,
    have === null ? null : `has ${figure(have, unit, system)}`,
  ]
    .filter((part) => part !== null)
    .join(', ');
};

interface FitListProps {
  readonly report: FitReport;
  /** For whom it is, such as the name of the machine. */
  readonly forWhom: string;
}

/** The fit report: the verdict in a sentence, then check by check with its numbers. */
export function FitList({ report, forWhom }: FitListProps) {
  const { system } = useUnits();
  return (
    <section aria-label={`Fit report, ${forWhom}`}>
      <p className="label-narrow text-ink-soft">Fit report, {forWhom}</p>
      <h2 className="mt-1 mb-4 text-xl leading-7">{report.sentence}</h2>
      <ul className="border-b border-rule">
        {report.checks.map((check) => (
          <li
            key={check.id}
            className="grid grid-cols-[12px_1fr] gap-x-3 border-t border-rule py-2 sm:grid-cols-[12px_6.5rem_1fr]"
          >
            <span className="pt-1.5">
              <FitMark result={check.result} />
            </span>
            <span className="font-semibold">
              {fitCheckLabel(check.id)}
              <span className="sr-only">: {fitLabels[check.result]}</span>
            </span>
            <span className="col-start-2 min-w-0 sm:col-start-3">
              <span className="figures block text-[0.8125rem] leading-6">{figuresOf(check, system)}</span>
              <span className="block text-sm leading-5 text-ink-soft">{check.sentence}</span>
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}
