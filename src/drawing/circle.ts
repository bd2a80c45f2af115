import type { ShapeGeometry } from '#shared/api/drawings.ts';

interface Circle {
  readonly xMm: number;
  readonly yMm: number;
  readonly radiusMm: number;
}

/** The circle a shape is, told by its box and length: as long as π times its width and as high as wide. */
export const circleOf = (shape: Pick<ShapeGeometry, 'closed' | 'boundsMm' | 'lengthMm'>): Circle | null => {
  const { minX, minY, maxX, maxY } = shape.boundsMm;
  const [widthMm, heightMm] = [maxX - minX, maxY - minY];
  const near = (value: number, target: number) => Math.abs(value - target) <= 0.005 * target;
  if (!shape.closed || widthMm <= 0) return null;
  if (!near(heightMm, widthMm) || !near(shape.lengthMm, Math.PI * widthMm)) return null;
  return { xMm: (minX + maxX) / 2, yMm: (minY + maxY) / 2, radiusMm: widthMm / 2 };
};
