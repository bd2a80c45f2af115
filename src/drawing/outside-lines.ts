import type { BoundsMm } from './turned.ts';

export interface DrawnLines {
  /** Outlines that lie inside no other: drawn thick, and the shape of the part. */
  readonly outside: string;
  /** Everything within: drawn thin. */
  readonly inside: string;
}

/** How many numbers a command takes, and which of them are the end point. */
const argumentCounts: Readonly<Record<string, number>> = {
  M: 2,
  L: 2,
  H: 1,
  V: 1,
  C: 6,
  S: 4,
  Q: 4,
  T: 2,
  A: 7,
};
const number = /[-+]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?/gi;

/** Box of a subpath in absolute commands, from end and control points; null for anything else. */
const boxOf = (subpath: string): BoundsMm | null => {
  const box = { minX: Infinity, minY: Infinity, maxX: -Infinity, maxY: -Infinity };
  const take = (x: number | undefined, y: number | undefined) => {
    if (x !== undefined) [box.minX, box.maxX] = [Math.min(box.minX, x), Math.max(box.maxX, x)];
    if (y !== undefined) [box.minY, box.maxY] = [Math.min(box.minY, y), Math.max(box.maxY, y)];
  };
  for (const [, command = '', rest = ''] of subpath.matchAll(/([a-z])([^a-df-z]*)/gi)) {
    if (command === 'Z' || command === 'z') continue;
    const count = argumentCounts[command];
    if (count === undefined) return null;
    const values = (rest.match(number) ?? []).map(Number);
    for (let at = 0; at + count <= values.length; at += count) {
      const args = values.slice(at, at + count);
      if (command === 'H') take(args[0], undefined);
      else if (command === 'V') take(undefined, args[0]);
      else if (command === 'A') take(args[5], args[6]);
      else for (let pair = 0; pair < count; pair += 2) take(args[pair], args[pair + 1]);
    }
  }
  return box.minX <= box.maxX && box.minY <= box.maxY ? box : null;
};

const holds = (outer: BoundsMm, inner: BoundsMm): boolean =>
  outer.minX <= inner.minX &&
  outer.minY <= inner.minY &&
  outer.maxX >= inner.maxX &&
  outer.maxY >= inner.maxY;
const areaMm2 = (box: BoundsMm): number => (box.maxX - box.minX) * (box.maxY - box.minY);

/**
 * Parts the outlines of a simplified drawing into those that lie inside no other and the rest, by their
 * boxes. It decides the weight of lines on a card, nothing else: boxes are near enough for that.
 */
export const outsideLines = (pathData: string): DrawnLines => {
  const subpaths = (pathData.match(/[Mm][^Mm]*/g) ?? []).map((text) => ({ text, box: boxOf(text) }));
  const outsideBoxes: BoundsMm[] = [];
  const outside: string[] = [];
  const inside: string[] = [];
  const bySize = subpaths
    .map((subpath) => ({ ...subpath, size: subpath.box === null ? Infinity : areaMm2(subpath.box) }))
    .sort((left, right) => right.size - left.size);
  for (const { text, box } of bySize) {
    const isInside = box !== null && outsideBoxes.some((outer) => holds(outer, box));
    (isInside ? inside : outside).push(text);
    if (!isInside && box !== null) outsideBoxes.push(box);
  }
  return { outside: outside.join(''), inside: inside.join('') };
};
