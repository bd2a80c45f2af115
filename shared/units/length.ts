import { fixed, trimmed } from './figures.ts';
import { readNumberText } from './number-text.ts';
import { MM_PER_INCH, type UnitSystem } from './system.ts';

export type LengthReading =
  | { readonly ok: true; readonly mm: number; readonly typed: string }
  | { readonly ok: false; readonly message: string };

const mmPerUnit: Readonly<Record<string, number>> = {
  mm: 1,
  millimetre: 1,
  millimetres: 1,
  millimeter: 1,
  millimeters: 1,
  cm: 10,
  centimetre: 10,
  centimetres: 10,
  centimeter: 10,
  centimeters: 10,
  m: 1000,
  in: MM_PER_INCH,
  'in.': MM_PER_INCH,
  inch: MM_PER_INCH,
  inches: MM_PER_INCH,
  '"': MM_PER_INCH,
};

/**
 * Reads a length typed in either system; a bare number is in the given one. `typed` is the text as
 * it was typed, to be kept beside the number. A bare fraction among millimetres is refused: whoever
 * types `1/4` almost always means inches, and 0.25 mm in its place would be a quiet mistake.
 */
export const parseLength = (text: string, system: UnitSystem): LengthReading => {
  const typed = text.trim();
  if (typed === '') return { ok: false, message: 'Type a length, such as 6.35 mm or 1/4 in' };
  const number = readNumberText(typed, 'A length');
  if (!number.ok) return number;
  if (number.unitText === '' && number.isFraction && system === 'mm') {
    return { ok: false, message: `Say which unit ${typed} is in: ${typed} in, or the length in mm` };
  }
  const scale = mmPerUnit[number.unitText === '' ? system : number.unitText];
  if (scale === undefined) {
    return { ok: false, message: `The unit "${number.unitText}" is not known: use mm, cm or in` };
  }
  return { ok: true, mm: number.value * scale, typed };
};

export interface LengthFormat {
  /** Decimals in millimetres, 1 unless told; inches get two more, being coarser. */
  readonly digits?: number;
  /** Drop zeros at the end: `3 mm`, `3.175 mm`. */
  readonly trim?: boolean;
  /** False shows inches as decimals only. */
  readonly fractions?: boolean;
}

const FRACTION_WITHIN_IN = 0.001;

/** Inches as a reduced fraction when they lie within 0.001 in of a 64th, else null. */
const inchFraction = (inches: number): string | null => {
  const sixtyFourths = Math.round(Math.abs(inches) * 64);
  if (Math.abs(Math.abs(inches) - sixtyFourths / 64) > FRACTION_WITHIN_IN) return null;
  // A small length is never shown as nothing.
  if (sixtyFourths === 0) return inches === 0 ? '0' : null;
  const sign = inches < 0 ? '\u2212' : '';
  const whole = Math.floor(sixtyFourths / 64);
  let numerator = sixtyFourths % 64;
  let denominator = 64;
  if (numerator === 0) return `${sign}${whole}`;
  while (numerator % 2 === 0) {
    numerator /= 2;
    denominator /= 2;
  }
  return `${sign}${whole === 0 ? '' : `${whole} `}${numerator}/${denominator}`;
};

/** A length without its unit, for the figures of a table whose head names the unit. */
export const formatLengthBare = (mm: number, system: UnitSystem, format: LengthFormat = {}): string => {
  const { digits = 1, trim = false, fractions = true } = format;
  const figure = trim ? trimmed : fixed;
  if (system === 'mm') return figure(mm, digits);
  const inches = mm / MM_PER_INCH;
  return (fractions ? inchFraction(inches) : null) ?? figure(inches, digits + 2);
};

/** A length with its unit: `240.0 mm`; in inches a fraction near a 64th (`23/32 in`), else decimals. */
export const formatLength = (mm: number, system: UnitSystem, format: LengthFormat = {}): string =>
  `${formatLengthBare(mm, system, format)} ${system}`;

/** Two or three sides with one unit: `240.0 × 110.0 mm`. */
export const formatSize = (
  sidesMm: readonly number[],
  system: UnitSystem,
  format: LengthFormat = {},
): string => `${sidesMm.map((mm) => formatLengthBare(mm, system, format)).join(' × ')} ${system}`;
