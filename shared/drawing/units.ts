import { TextCursor } from './text-cursor.ts';

/** Millimetres in one CSS pixel: 1 in = 25.4 mm = 96 px (CSS Values and Units, absolute lengths). */
export const MM_PER_PX = 25.4 / 96;

/** Millimetres in one of each absolute unit of CSS. */
export const MM_PER_UNIT: ReadonlyMap<string, number> = new Map([
  ['mm', 1],
  ['cm', 10],
  ['in', 25.4],
  ['pt', 25.4 / 72],
  ['pc', 25.4 / 6],
  ['q', 25.4 / 101.6],
  ['px', MM_PER_PX],
]);

/** Font-relative units have no font here: the initial 16 px, and half of it for ex and ch. */
const PX_PER_FONT_UNIT: ReadonlyMap<string, number> = new Map([
  ['em', 16],
  ['rem', 16],
  ['ex', 8],
  ['ch', 8],
]);

/** A length as written: `unit` is lower case, empty for a bare number, '%' for a percentage. */
export interface WrittenLength {
  readonly value: number;
  readonly unit: string;
}

/** Reads `12.5mm`, `30%`, `7`; undefined for anything else, `auto` included. */
export function parseLength(text: string | undefined): WrittenLength | undefined {
  if (text === undefined) return undefined;
  const cursor = new TextCursor(text.trim());
  const value = cursor.number();
  if (!Number.isFinite(value)) return undefined;
  const unit = cursor.text.slice(cursor.index).trim().toLowerCase();
  return /^([a-z]*|%)$/.test(unit) ? { value, unit } : undefined;
}

/** True for the units whose size is fixed without a screen: mm, cm, in, pt, pc, Q. */
export function isPhysicalUnit(unit: string): boolean {
  return unit !== 'px' && MM_PER_UNIT.has(unit);
}

/**
 * A length in CSS pixels, which are user units where no viewBox intervenes; a percentage is taken of
 * `percentOfPx`. Undefined for a unit that is not known.
 */
export function lengthPx(length: WrittenLength, percentOfPx: number): number | undefined {
  if (length.unit === '') return length.value;
  if (length.unit === '%') return (length.value / 100) * percentOfPx;
  const mm = MM_PER_UNIT.get(length.unit);
  if (mm !== undefined) return length.unit === 'px' ? length.value : (length.value * mm) / MM_PER_PX;
  const fontPx = PX_PER_FONT_UNIT.get(length.unit);
  return fontPx === undefined ? undefined : length.value * fontPx;
}
