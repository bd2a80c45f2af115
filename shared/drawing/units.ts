import { type FontSizes, INITIAL_FONT } from './font-size.ts';
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

/** True for the units that follow a font's size or shape. */
export function isFontUnit(unit: string): boolean {
  return unit === 'em' || unit === 'rem' || unit === 'ex' || unit === 'ch';
}

/**
 * A length in CSS pixels, which are user units where no viewBox intervenes; a percentage is taken of
 * `percentOfPx`. ex and ch need the font itself: half an em stands in for them (CSS Values and Units,
 * the fallback). Undefined for a unit that is not known.
 */
export function lengthPx(
  { value, unit }: WrittenLength,
  percentOfPx: number,
  font: FontSizes = INITIAL_FONT,
): number | undefined {
  if (unit === '' || unit === 'px') return value;
  if (unit === '%') return (value / 100) * percentOfPx;
  if (unit === 'em') return value * font.sizePx;
  if (unit === 'rem') return value * font.rootSizePx;
  if (unit === 'ex' || unit === 'ch') return (value * font.sizePx) / 2;
  const mm = MM_PER_UNIT.get(unit);
  return mm === undefined ? undefined : (value * mm) / MM_PER_PX;
}
