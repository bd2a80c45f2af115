import { DRAWING_LIMITS } from './limits.ts';
import type { Drawing, ScaleReading } from './types.ts';
import { MM_PER_PX } from './units.ts';

const READINGS = [
  { name: 'mm', mmPerPx: 1 },
  { name: '96 an inch', mmPerPx: MM_PER_PX },
  { name: '90 an inch', mmPerPx: 25.4 / 90 },
  { name: '72 an inch', mmPerPx: 25.4 / 72 },
] as const;

/**
 * The ways in which a file without physical units may have been meant, each with the size of the
 * geometry that results. `widthMm` and `heightMm` are the sizes at 96 an inch, the first reading.
 */
export function scaleReadings(pxPerUnit: number, widthMm: number, heightMm: number): ScaleReading[] {
  return READINGS.map(({ name, mmPerPx }) => {
    const factor = mmPerPx / MM_PER_PX;
    return {
      name,
      millimetresPerUnit: pxPerUnit * mmPerPx,
      widthMm: widthMm * factor,
      heightMm: heightMm * factor,
    };
  });
}

/** A scale worked out from a measured size, or why there is none. */
export type StatedScale =
  | { readonly ok: true; readonly millimetresPerUnit: number }
  | { readonly ok: false; readonly message: string };

/**
 * The scale that makes the whole drawing as wide (or high) as the member measured, in mm.
 * Give the result to `readDrawing` as `millimetresPerUnit`.
 */
export function scaleFromMeasuredSize(
  drawing: Pick<Drawing, 'units' | 'widthMm' | 'heightMm'>,
  measuredMm: number,
  side: 'width' | 'height' = 'width',
): StatedScale {
  const readMm = side === 'width' ? drawing.widthMm : drawing.heightMm;
  if (!(measuredMm > 0) || measuredMm > 2 * DRAWING_LIMITS.coordinateMm) {
    return { ok: false, message: `State a ${side} above 0 mm, as measured on the whole drawing.` };
  }
  if (!(readMm > 0)) {
    return {
      ok: false,
      message: `The drawing has no ${side}, so its scale cannot follow from one: state the other size.`,
    };
  }
  return { ok: true, millimetresPerUnit: (drawing.units.millimetresPerUnit.x * measuredMm) / readMm };
}
