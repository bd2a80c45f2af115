import type { MeasuredSize } from '#shared/api/cuts.ts';

/** How near a ratio must be to that of two units: wider than any cut is off, narrower than units lie apart. */
const NEAR = 0.08;
const MM_PER_INCH = 25.4;
const MM_PER_CM = 10;

const near = (ratio: number, expected: number): boolean => Math.abs(ratio / expected - 1) <= NEAR;
/** Thousandths of a millimetre are enough to say a size. */
const told = (sizeMm: number): string => String(Number(sizeMm.toFixed(3)));

/**
 * The question that a measured size raises when it looks as if one of the two sizes was written in inches or
 * centimetres: their ratio is within 8 % of 25.4 or 10, one way or the other. Both sizes in mm; null when they
 * look like the same unit.
 */
export function questionOfUnit({ drawnMm, measuredMm }: MeasuredSize): string | null {
  const ratio = measuredMm / drawnMm;
  const asked = `${measuredMm} measured for ${drawnMm} drawn: is `;
  const or = ', or say sizesAreMm';
  if (near(ratio, 1 / MM_PER_INCH))
    return `${asked}that inches? Write ${told(measuredMm * MM_PER_INCH)}${or}`;
  if (near(ratio, 1 / MM_PER_CM))
    return `${asked}that centimetres? Write ${told(measuredMm * MM_PER_CM)}${or}`;
  if (near(ratio, MM_PER_INCH))
    return `${asked}the drawn size in inches? Write ${told(drawnMm * MM_PER_INCH)} drawn${or}`;
  if (near(ratio, MM_PER_CM))
    return `${asked}the drawn size in centimetres? Write ${told(drawnMm * MM_PER_CM)} drawn${or}`;
  return null;
}
