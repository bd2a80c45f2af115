import type { Matrix } from './matrix.ts';

/** A box in user units, as in `viewBox`. */
export interface ViewBox {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

const FRACTION: Readonly<Record<string, number>> = { Min: 0, Mid: 0.5, Max: 1 };
const GRAMMAR = /^(?:defer\s+)?(?:(none)|x(Min|Mid|Max)Y(Min|Mid|Max))(?:\s+(meet|slice))?$/;

/**
 * The map from a viewBox into a viewport of the given size at 0,0 (SVG 2, Coordinates, the algorithm
 * for the equivalent transform). Anything but the grammar counts as xMidYMid meet, as SVG says.
 */
export function viewBoxTransform(
  viewBox: ViewBox,
  viewportWidth: number,
  viewportHeight: number,
  preserveAspectRatio: string | undefined,
): Matrix {
  const match = GRAMMAR.exec((preserveAspectRatio ?? '').trim());
  let scaleX = viewportWidth / viewBox.width;
  let scaleY = viewportHeight / viewBox.height;
  if (match?.[1] !== 'none') {
    const scale = match?.[4] === 'slice' ? Math.max(scaleX, scaleY) : Math.min(scaleX, scaleY);
    scaleX = scale;
    scaleY = scale;
  }
  const alignX = FRACTION[match?.[2] ?? 'Mid'] ?? 0.5;
  const alignY = FRACTION[match?.[3] ?? 'Mid'] ?? 0.5;
  const spareX = viewportWidth - viewBox.width * scaleX;
  const spareY = viewportHeight - viewBox.height * scaleY;
  return {
    a: scaleX,
    b: 0,
    c: 0,
    d: scaleY,
    e: -viewBox.x * scaleX + (match?.[1] === 'none' ? 0 : spareX * alignX),
    f: -viewBox.y * scaleY + (match?.[1] === 'none' ? 0 : spareY * alignY),
  };
}
