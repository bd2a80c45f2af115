import { formatDuration, parseDuration } from '#shared/units/duration.ts';
import { feedUnit, formatFeed, formatFeedBare, parseFeed } from '#shared/units/feed.ts';
import { trimmed } from '#shared/units/figures.ts';
import { formatLengthBare, parseLength } from '#shared/units/length.ts';
import { readNumberText } from '#shared/units/number-text.ts';
import { formatRpm, formatRpmBare, parseRpm } from '#shared/units/spindle-speed.ts';
import { MM_PER_INCH, type UnitSystem } from '#shared/units/system.ts';

type QuantityReading =
  | { readonly ok: true; readonly value: number }
  | { readonly ok: false; readonly message: string };

export interface QuantityWords {
  readonly unit: (system: UnitSystem) => string;
  readonly read: (text: string, system: UnitSystem) => QuantityReading;
  /** Without its unit, as it would be typed. */
  readonly show: (value: number, system: UnitSystem) => string;
  /** With its unit, to say how a text was read. */
  readonly say: (value: number, system: UnitSystem) => string;
}

/** A fraction only where it is exact: what stands in a field is read back. */
const typedLength = (mm: number, system: UnitSystem): string => {
  const sixtyFourths = (mm / MM_PER_INCH) * 64;
  const fractions = Math.abs(sixtyFourths - Math.round(sixtyFourths)) < 1e-6;
  return formatLengthBare(mm, system, { digits: 3, trim: true, fractions });
};

const length: QuantityWords = {
  unit: (system) => system,
  read: (text, system) => {
    const reading = parseLength(text, system);
    return reading.ok ? { ok: true, value: reading.mm } : reading;
  },
  show: typedLength,
  say: (mm, system) => `${typedLength(mm, system)} ${system}`,
};

const feed: QuantityWords = {
  unit: feedUnit,
  read: (text, system) => {
    const reading = parseFeed(text, system);
    return reading.ok ? { ok: true, value: reading.mmPerMin } : reading;
  },
  show: formatFeedBare,
  say: formatFeed,
};

const rpm: QuantityWords = {
  unit: () => 'rpm',
  read: (text) => {
    const reading = parseRpm(text);
    return reading.ok ? { ok: true, value: reading.rpm } : reading;
  },
  show: formatRpmBare,
  say: formatRpm,
};

const time: QuantityWords = {
  unit: () => 'min',
  read: (text) => {
    const reading = parseDuration(text);
    return reading.ok ? { ok: true, value: reading.timeS } : reading;
  },
  show: (timeS) => formatDuration(timeS).replace(/ min$/, ''),
  say: formatDuration,
};

/** A number in one fixed unit, such as W, mm/s², ° or none. */
export const plainQuantity = (unit: string): QuantityWords => ({
  unit: () => unit,
  read: (text) => {
    const reading = readNumberText(text, 'This');
    if (!reading.ok) return reading;
    if (reading.unitText !== '' && reading.unitText.toLowerCase() !== unit.toLowerCase()) {
      return { ok: false, message: unit === '' ? 'Type a number alone' : `Type the number in ${unit}` };
    }
    return { ok: true, value: reading.value };
  },
  show: (value) => trimmed(value, 4),
  say: (value) => `${trimmed(value, 4)} ${unit}`.trimEnd(),
});

export type Quantity = 'length' | 'feed' | 'rpm' | 'time';
export const quantities: Readonly<Record<Quantity, QuantityWords>> = { length, feed, rpm, time };
