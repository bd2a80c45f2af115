import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Point } from '#shared/drawing/types.ts';
import { convexHull } from './convex-hull.ts';
import { extentsAsDrawn, turnedExtents } from './turned-extents.ts';
import { roomiestTurn, turnsThatFit, turnToFit } from './turns-that-fit.ts';

// Whole micrometres: finer than any drawing, coarse enough that no case stands on the edge of rounding.
const coordinate = fc.integer({ min: -500_000, max: 500_000 }).map((micrometres) => micrometres / 1000);
const onGrid = fc.integer({ min: -5, max: 5 });
const points = fc.oneof(
  fc.array(fc.record({ x: coordinate, y: coordinate }), { minLength: 1, maxLength: 25 }),
  fc.array(fc.record({ x: onGrid, y: onGrid }), { minLength: 1, maxLength: 25 }),
);
const rectangle = (widthMm: number, heightMm: number): Point[] => [
  { x: 0, y: 0 },
  { x: widthMm, y: 0 },
  { x: widthMm, y: heightMm },
  { x: 0, y: heightMm },
];
const rad = (degrees: number): number => (degrees * Math.PI) / 180;

describe('convex hull', () => {
  it('keeps the corners of a square, without the points inside or on its edges', () => {
    const hull = convexHull([...rectangle(10, 10), { x: 5, y: 5 }, { x: 5, y: 0 }, { x: 0, y: 0 }]);
    expect(hull).toHaveLength(4);
    expect(hull).toEqual(expect.arrayContaining(rectangle(10, 10)));
  });

  it('has every point on its inner side and turns one way at every corner', () => {
    fc.assert(
      fc.property(points, (all) => {
        const hull = convexHull(all);
        if (hull.length < 3) return;
        hull.forEach((from, at) => {
          const to = hull[(at + 1) % hull.length]!;
          for (const point of all) {
            const side = (to.x - from.x) * (point.y - from.y) - (to.y - from.y) * (point.x - from.x);
            expect(side).toBeGreaterThanOrEqual(-1e-6);
          }
        });
      }),
    );
  });

  it('reaches as far as its points in every direction', () => {
    fc.assert(
      fc.property(points, fc.double({ min: 0, max: 7, noNaN: true }), (all, angleRad) => {
        const ofHull = turnedExtents(convexHull(all), angleRad);
        const ofAll = turnedExtents(all, angleRad);
        expect(ofHull.widthMm).toBeCloseTo(ofAll.widthMm, 9);
        expect(ofHull.heightMm).toBeCloseTo(ofAll.heightMm, 9);
      }),
    );
  });
});

describe('turned extents', () => {
  it('of a square of 100 turned by 45 degrees are its diagonal', () => {
    const { widthMm, heightMm } = turnedExtents(rectangle(100, 100), rad(45));
    expect(widthMm).toBeCloseTo(100 * Math.SQRT2, 9);
    expect(heightMm).toBeCloseTo(100 * Math.SQRT2, 9);
  });

  it('turns anticlockwise as seen on a page with y down', () => {
    // A long bar falling to the right at 30 degrees lies flat once turned anticlockwise by 30.
    const bar = [
      { x: 0, y: 0 },
      { x: 100 * Math.cos(rad(30)), y: 100 * Math.sin(rad(30)) },
    ];
    const { widthMm, heightMm } = turnedExtents(bar, rad(30));
    expect(widthMm).toBeCloseTo(100, 9);
    expect(heightMm).toBeCloseTo(0, 9);
  });

  it('as drawn are those at no turn', () => {
    fc.assert(
      fc.property(points, (all) => {
        expect(extentsAsDrawn(all).widthMm).toBeCloseTo(turnedExtents(all, 0).widthMm, 9);
        expect(extentsAsDrawn(all).heightMm).toBeCloseTo(turnedExtents(all, 0).heightMm, 9);
      }),
    );
  });
});

describe('turns that fit', () => {
  const bedSide = fc.double({ min: 1, max: 1200, noNaN: true });

  it('agree with trying many angles one by one', () => {
    fc.assert(
      fc.property(points, bedSide, bedSide, (all, widthMm, heightMm) => {
        const hull = convexHull(all);
        const ranges = turnsThatFit(hull, widthMm, heightMm, 0);
        for (let step = 0; step < 180; step += 1) {
          const angleRad = rad(step + 0.37);
          const extents = turnedExtents(all, angleRad);
          const room = Math.min(widthMm - extents.widthMm, heightMm - extents.heightMm);
          if (Math.abs(room) < 1e-6) continue;
          const listed = ranges.some((range) => range.fromRad <= angleRad && angleRad <= range.toRad);
          expect(listed, `turn of ${step + 0.37} degrees, room ${room}`).toBe(room > 0);
        }
      }),
      { numRuns: 200 },
    );
  });

  it('leave no more room at any tried angle than at the roomiest turn, whose room is real', () => {
    fc.assert(
      fc.property(points, bedSide, bedSide, (all, widthMm, heightMm) => {
        const roomAt = (angleRad: number): number => {
          const extents = turnedExtents(all, angleRad);
          return Math.min(widthMm - extents.widthMm, heightMm - extents.heightMm);
        };
        const best = roomiestTurn(convexHull(all), widthMm, heightMm);
        expect(roomAt(best.turnRad)).toBeCloseTo(best.roomMm, 6);
        for (let step = 0; step < 360; step += 1) {
          expect(roomAt(rad(step / 2))).toBeLessThanOrEqual(best.roomMm + 1e-6);
        }
      }),
      { numRuns: 200 },
    );
  });

  it('prefer as drawn, then a quarter turn, and give null when no turn fits', () => {
    expect(turnToFit(rectangle(100, 40), 100, 40)).toBe(0);
    expect(turnToFit(rectangle(40, 100), 100, 40)).toBe(90);
    expect(turnToFit(rectangle(100, 40), 100.5, 39.98)).toBeNull();
    expect(turnToFit([], 10, 10)).toBe(0);
    expect(turnToFit(rectangle(1, 1), -5, 10)).toBeNull();
  });

  it('take a side that is over by no more than the tolerance of 0.01 mm', () => {
    expect(turnToFit(rectangle(100.0099, 40), 100, 40)).toBe(0);
    expect(turnToFit(rectangle(100.02, 40), 100, 40)).toBeNull();
  });

  it('are not misled by two corners in nearly the same place (found by a property test)', () => {
    const sliver = convexHull([
      { x: 5e-324, y: 420 },
      { x: 0, y: 0 },
      { x: 0, y: 420 },
    ]);
    expect(turnToFit(sliver, 60, 60)).toBeNull();
    expect(roomiestTurn(sliver, 60, 60).roomMm).toBeCloseTo(60 - 420 / Math.SQRT2, 9);
  });

  it('always give a turn at which the outline really fits', () => {
    fc.assert(
      fc.property(points, bedSide, bedSide, (all, widthMm, heightMm) => {
        const turnDeg = turnToFit(convexHull(all), widthMm, heightMm);
        if (turnDeg === null) return;
        const extents = turnedExtents(all, rad(turnDeg));
        expect(extents.widthMm).toBeLessThanOrEqual(widthMm + 0.01 + 1e-6);
        expect(extents.heightMm).toBeLessThanOrEqual(heightMm + 0.01 + 1e-6);
      }),
    );
  });
});
