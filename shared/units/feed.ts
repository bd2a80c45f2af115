import { fixed, grouped } from './figures.ts';
import { readNumberText } from './number-text.ts';
import { MM_PER_INCH, type UnitSystem } from './system.ts';

export type FeedReading =
  | { readonly ok: true; readonly mmPerMin: number; readonly typed: string }
  | { readonly ok: false; readonly message: string };

const mmPerMinPerUnit: Readonly<Record<string, number>> = {
  'mm/min': 1,
  'm/min': 1000,
  'mm/s': 60,
  'in/min': MM_PER_INCH,
  'in/s': 60 * MM_PER_INCH,
};
const otherNames: Readonly<Record<string, string>> = {
  ipm: 'in/min',
  '"/min': 'in/min',
  'mm/sec': 'mm/s',
  'in/sec': 'in/s',
};

/** The unit of feeds in a system. */
export const feedUnit = (system: UnitSystem): 'mm/min' | 'in/min' => (system === 'mm' ? 'mm/min' : 'in/min');

/** Reads a feed or plunge rate typed in either system; a bare number is in the given one. */
export const parseFeed = (text: string, system: UnitSystem): FeedReading => {
  const typed = text.trim();
  if (typed === '') return { ok: false, message: 'Type a feed, such as 1200 mm/min or 47 in/min' };
  const number = readNumberText(typed, 'A feed');
  if (!number.ok) return number;
  const named = number.unitText.replaceAll(' ', '');
  const unit = named === '' ? feedUnit(system) : (otherNames[named] ?? named);
  const scale = mmPerMinPerUnit[unit];
  if (scale === undefined) {
    return { ok: false, message: `The unit "${number.unitText}" is not known: use mm/min or in/min` };
  }
  return { ok: true, mmPerMin: number.value * scale, typed };
};

/** A feed without its unit: whole mm/min, or in/min to a tenth. */
export const formatFeedBare = (mmPerMin: number, system: UnitSystem): string =>
  grouped(system === 'mm' ? fixed(mmPerMin, 0) : fixed(mmPerMin / MM_PER_INCH, 1));

/** A feed with its unit: `1 200 mm/min`, `47.2 in/min`. */
export const formatFeed = (mmPerMin: number, system: UnitSystem): string =>
  `${formatFeedBare(mmPerMin, system)} ${feedUnit(system)}`;
