import { formatFeed } from '#shared/units/feed.ts';
import { trimmed } from '#shared/units/figures.ts';
import { formatLength } from '#shared/units/length.ts';
import { formatRpm } from '#shared/units/spindle-speed.ts';
import { useUnits } from '../../units/units-context.tsx';

/** A figure of a finding with its unit, in the member's unit system where it is a length or a feed. */
export const useSayFigure = (): ((value: number, unit: string) => string) => {
  const { system } = useUnits();
  return (value, unit) => {
    if (unit === 'mm') return formatLength(value, system, { digits: 3, trim: true });
    if (unit === 'mm/min') return formatFeed(value, system);
    if (unit === 'rev/min') return formatRpm(value);
    return `${trimmed(value, 3)} ${unit}`.trim();
  };
};
