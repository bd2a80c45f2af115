import { describe, expect, it } from 'vitest';
import { fingerPanel, insideCorners } from './finger-joint.ts';

const plain = { startsOut: true, parts: 1 };
const panel = {
  xMm: 0,
  yMm: 0,
  widthMm: 90,
  heightMm: 50,
  sheetMm: 6,
  top: plain,
  right: plain,
  left: plain,
};

/** Shoelace formula. */
const areaMm2 = (points: readonly (readonly [number, number])[]) =>
  Math.abs(
    points.reduce((sum, [x, y], index) => {
      const [nextX, nextY] = points[(index + 1) % points.length]!;
      return sum + x * nextY - nextX * y;
    }, 0) / 2,
  );

describe('finger joints', () => {
  it('take out the even parts of an edge that starts out', () => {
    const points = fingerPanel({ ...panel, bottom: { startsOut: true, parts: 9 } });
    // Nine parts of 10: four notches of 10 × 6 (C).
    expect(areaMm2(points)).toBeCloseTo(90 * 50 - 4 * 60, 9);
    expect(insideCorners(points)).toHaveLength(8);
  });

  it('take out the odd parts of the edge that mates with it', () => {
    const points = fingerPanel({ ...panel, bottom: { startsOut: false, parts: 9 } });
    expect(areaMm2(points)).toBeCloseTo(90 * 50 - 5 * 60, 9);
    // The two notches at the ends are open at one side.
    expect(insideCorners(points)).toHaveLength(8);
  });
});
