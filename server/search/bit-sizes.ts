import type { FacetCount, SearchDocument } from './document.ts';

/** Bits within this of each other are the same size: 1/8 in is 3.175 mm and is also sold as 3.17. */
const sameSizeMm = 0.02 + 1e-9;

export const isSameSize = (aMm: number, bMm: number): boolean => Math.abs(aMm - bMm) <= sameSizeMm;

/** Bit sizes with the number of documents that each would find; near sizes stand under the most frequent. */
export function countBitSizes(documents: readonly SearchDocument[]): FacetCount[] {
  const written = new Map<number, number>();
  for (const { bitMms } of documents) {
    for (const mm of new Set(bitMms)) written.set(mm, (written.get(mm) ?? 0) + 1);
  }
  const counts = new Map<number, number>();
  for (const [mm] of [...written].sort((a, b) => b[1] - a[1] || a[0] - b[0])) {
    if (![...counts.keys()].some((size) => isSameSize(size, mm))) counts.set(mm, 0);
  }
  const sizesNear = new Map([...written.keys()].map((mm) => [mm, nearSizes(counts, mm)]));
  for (const { bitMms } of documents) {
    const [first] = bitMms;
    // Most designs were cut with one bit, and a search may pass over 100 000 of them.
    const sizes =
      bitMms.length === 1 && first !== undefined ? sizesNear.get(first) : allNear(bitMms, sizesNear);
    for (const size of sizes ?? []) counts.set(size, (counts.get(size) ?? 0) + 1);
  }
  return [...counts].sort((a, b) => a[0] - b[0]).map(([mm, count]) => ({ value: String(mm), count }));
}

const allNear = (bitMms: readonly number[], sizesNear: Map<number, number[]>): Set<number> =>
  new Set(bitMms.flatMap((mm) => sizesNear.get(mm) ?? []));

const nearSizes = (sizes: Map<number, number>, mm: number): number[] =>
  [...sizes.keys()].filter((size) => isSameSize(size, mm));
