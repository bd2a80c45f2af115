import type { DrawingShape } from './types.ts';

/**
 * Shapes that lie on an earlier one, told by a signature that does not depend on start or direction:
 * bounds, length, number of segments and the sums of x, y and x·y over their points, to 1e-4 mm.
 */
export function doubledShapes(shapes: readonly DrawingShape[]): DrawingShape[] {
  const seen = new Set<string>();
  return shapes.filter((shape) => {
    const signature = signatureOf(shape);
    if (seen.has(signature)) return true;
    seen.add(signature);
    return false;
  });
}

function signatureOf({ boundsMm, lengthMm, outlines }: DrawingShape): string {
  let count = 0;
  let sumX = 0;
  let sumXy = 0;
  const middleX = (boundsMm.minX + boundsMm.maxX) / 2;
  const middleY = (boundsMm.minY + boundsMm.maxY) / 2;
  for (const { closed, segments } of outlines) {
    for (const { from } of segments) {
      count++;
      sumX += from.x - middleX;
      sumXy += (from.x - middleX) * (from.y - middleY);
    }
    const last = segments.at(-1);
    if (closed || !last) continue;
    sumX += last.to.x - middleX;
    sumXy += (last.to.x - middleX) * (last.to.y - middleY);
  }
  const sizes = [boundsMm.minX, boundsMm.minY, boundsMm.maxX, boundsMm.maxY, lengthMm, sumX, sumXy];
  return `${count} ${sizes.map((size) => Math.round(size * 1e4)).join(' ')}`;
}
