import { readDrawing } from '#shared/drawing/read.ts';
import type { Drawing, DrawingRefusal } from '#shared/drawing/types.ts';

/** A page on which one user unit is one millimetre. */
export function page(
  content: string,
  attributes = 'width="100mm" height="100mm" viewBox="0 0 100 100"',
): string {
  return `<svg xmlns="http://www.w3.org/2000/svg" ${attributes}>${content}</svg>`;
}

export function read(svgText: string, millimetresPerUnit?: number): Drawing {
  const result = readDrawing(svgText, millimetresPerUnit === undefined ? {} : { millimetresPerUnit });
  if (!result.ok) throw new Error(`refused: ${result.refusal.message}`);
  return result.drawing;
}

export function readPath(pathData: string): Drawing {
  return read(page(`<path d="${pathData}"/>`));
}

export function refusalOf(svgText: string): DrawingRefusal {
  const result = readDrawing(svgText);
  if (result.ok) throw new Error('the file was read');
  return result.refusal;
}

/** Bounds as [minX, minY, maxX, maxY] in mm. */
export function boundsOf({ boundsMm }: Drawing): number[] {
  return [boundsMm.minX, boundsMm.minY, boundsMm.maxX, boundsMm.maxY];
}

/** Largest difference between two lists of numbers. */
export function furthest(left: readonly number[], right: readonly number[]): number {
  if (left.length !== right.length) return Number.POSITIVE_INFINITY;
  return Math.max(...left.map((value, index) => Math.abs(value - (right[index] ?? Number.NaN))));
}
