import { formatFeed } from '#shared/units/feed.ts';
import { formatLength, formatSize } from '#shared/units/length.ts';
import type { UnitSystem } from '#shared/units/system.ts';

/** How the sentences of a fit report show figures in a member's units. */
export interface Wording {
  /** A bit, shank or collet: `3.175 mm`, `1/8 in`. */
  readonly diameter: (mm: number) => string;
  /** Any other length, fine enough to show why a limit was missed. */
  readonly length: (mm: number) => string;
  readonly size: (widthMm: number, heightMm: number) => string;
  readonly feed: (mmPerMin: number) => string;
}

const fine = { digits: 2, trim: true, fractions: false } as const;

export const wordingIn = (units: UnitSystem): Wording => ({
  diameter: (mm) => formatLength(mm, units, { digits: 3, trim: true }),
  length: (mm) => formatLength(mm, units, { digits: 2, trim: true }),
  size: (widthMm, heightMm) => formatSize([widthMm, heightMm], units, fine),
  feed: (mmPerMin) => formatFeed(mmPerMin, units),
});

/** `3.175 mm`, `6 mm and 8 mm`, `3 mm, 6 mm and 8 mm`. */
export const listed = (parts: readonly string[], joiner = 'and'): string =>
  parts.length < 2 ? parts.join('') : `${parts.slice(0, -1).join(', ')} ${joiner} ${parts.at(-1) ?? ''}`;

/** Two sides as a figure of a check, in mm whatever the member's units. */
export const sidesMm = (widthMm: number, heightMm: number): string =>
  formatSize([widthMm, heightMm], 'mm', fine).replace(/ mm$/, '');

/** Drops the noise of double arithmetic from a figure of a check. */
export const figure = (value: number): number => Math.round(value * 1e6) / 1e6;
