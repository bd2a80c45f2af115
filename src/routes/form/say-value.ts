import { formatFeed } from '#shared/units/feed.ts';
import { trimmed } from '#shared/units/figures.ts';
import { formatLength } from '#shared/units/length.ts';
import { formatRpm } from '#shared/units/spindle-speed.ts';
import type { UnitSystem } from '#shared/units/system.ts';

const sayNumber = (path: string, value: number, system: UnitSystem): string => {
  if (/MmPerMin$/.test(path)) return formatFeed(value, system);
  if (/Rpm(\.|$)/i.test(path)) return formatRpm(value);
  if (/PerS2$/.test(path)) return `${trimmed(value, 1)} mm/s²`;
  if (/PowerW$/.test(path)) return `${trimmed(value, 0)} W`;
  if (/Mm(\.|$)/.test(path)) return formatLength(value, system, { digits: 3, trim: true });
  return trimmed(value, 3);
};

/** A value of the bench in words, its unit read from the name of its field. */
export const sayValue = (path: string, value: unknown, system: UnitSystem): string => {
  if (value === undefined || value === null || value === '') return 'nothing';
  if (typeof value === 'number') return sayNumber(path, value, system);
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (Array.isArray(value)) return value.map((item) => sayValue(path, item, system)).join(', ');
  return String(value);
};
