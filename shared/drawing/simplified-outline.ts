import { flattenOutline } from './flatten.ts';
import { simplifyPoints } from './simplify-points.ts';
import type { Drawing, Point } from './types.ts';

interface Ring {
  readonly closed: boolean;
  readonly points: readonly Point[];
  readonly sizeMm: number;
}

/** Finest and coarsest tolerance, as parts of the drawing's longer side. */
const FINEST = 1 / 1000;
const COARSEST = 1 / 40;

/**
 * The whole drawing as one short path data string in page millimetres, for cards: the finest tolerance
 * at which all outlines fit into `maxBytes`; when even the coarsest is too long, the largest outlines
 * are kept and the smaller ones left out.
 */
export function simplifiedOutline(
  drawing: Pick<Drawing, 'shapes' | 'widthMm' | 'heightMm'>,
  maxBytes = 4096,
): string {
  const sideMm = Math.max(drawing.widthMm, drawing.heightMm);
  let toleranceMm = sideMm * FINEST;
  let rings = drawing.shapes
    .flatMap((shape) => shape.outlines)
    .map((outline): Ring => {
      const points = flattenOutline(outline, Math.max(toleranceMm, 1e-6));
      return { closed: outline.closed, points, sizeMm: extent(points) };
    })
    .sort((a, b) => b.sizeMm - a.sizeMm);
  for (;;) {
    const tolerance = toleranceMm;
    rings = rings.map((ring) => ({ ...ring, points: simplifyPoints(ring.points, ring.closed, tolerance) }));
    const isCoarsest = toleranceMm * 1.5 > sideMm * COARSEST;
    const text = writeRings(rings, tolerance, maxBytes);
    if (isCoarsest || text.isWhole) return text.pathData;
    toleranceMm *= 1.5;
  }
}

/** Half the outline's bounding rectangle's edge: large outlines come first, thin ones too. */
function extent(points: readonly Point[]): number {
  let minX = Number.POSITIVE_INFINITY;
  let maxX = Number.NEGATIVE_INFINITY;
  let minY = Number.POSITIVE_INFINITY;
  let maxY = Number.NEGATIVE_INFINITY;
  for (const { x, y } of points) {
    minX = Math.min(minX, x);
    maxX = Math.max(maxX, x);
    minY = Math.min(minY, y);
    maxY = Math.max(maxY, y);
  }
  return points.length === 0 ? 0 : maxX - minX + maxY - minY;
}

/** Writes rings until the next would pass `maxBytes`; every character is one byte. */
function writeRings(
  rings: readonly Ring[],
  toleranceMm: number,
  maxBytes: number,
): { pathData: string; isWhole: boolean } {
  const decimals = Math.min(4, Math.max(0, Math.ceil(-Math.log10(Math.max(toleranceMm, 1e-6) / 2))));
  let pathData = '';
  let isWhole = true;
  for (const ring of rings) {
    const text = ringText(ring, decimals);
    if (pathData.length + text.length <= maxBytes) pathData += text;
    else isWhole = false;
  }
  return { pathData, isWhole };
}

/** Relative lines in whole steps, so that rounding does not add up along the ring. */
function ringText({ closed, points }: Ring, decimals: number): string {
  const steps = 10 ** decimals;
  let atX = 0;
  let atY = 0;
  let text = '';
  for (const point of points) {
    const x = Math.round(point.x * steps);
    const y = Math.round(point.y * steps);
    if (text !== '' && x === atX && y === atY) continue;
    const dx = String((x - atX) / steps);
    const dy = String((y - atY) / steps);
    const pair = `${dx}${dy.startsWith('-') ? '' : ' '}${dy}`;
    if (text === '') text = `M${pair}l`;
    else text += text.endsWith('l') || pair.startsWith('-') ? pair : ` ${pair}`;
    atX = x;
    atY = y;
  }
  // A ring that fell together to one point would be drawn as nothing.
  if (text.endsWith('l')) return '';
  return closed ? `${text}z` : text;
}
