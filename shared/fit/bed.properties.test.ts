import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { FitBed, FitInput } from './fit-input.ts';
import { fitReport } from './fit-report.ts';
import { fitsBed, liesOnBed } from './fits-bed.ts';

// Whole micrometres: finer than any drawing, coarse enough that no case stands on the edge of rounding.
const coordinate = fc.integer({ min: 0, max: 420_000 }).map((micrometres) => micrometres / 1000);
const part = fc.array(fc.record({ x: coordinate, y: coordinate }), { minLength: 1, maxLength: 12 });
const longPart = fc
  .record({ length: fc.integer({ min: 100, max: 420 }), width: fc.integer({ min: 5, max: 60 }) })
  .map(({ length, width }) => [
    { x: 0, y: 0 },
    { x: length, y: 0 },
    { x: length, y: width },
    { x: 0, y: width },
  ]);
const hullMm = fc.oneof(part, longPart);
const margin = fc.integer({ min: 0, max: 12 });
const bed: fc.Arbitrary<FitBed> = fc.record({
  bedXMm: fc.integer({ min: 60, max: 420 }),
  bedYMm: fc.integer({ min: 60, max: 420 }),
  marginMm: fc.record({ left: margin, right: margin, front: margin, back: margin }),
  clampStripMm: margin,
});
const bitMm = fc.option(fc.constantFrom(1, 3.175, 6.35), { nil: undefined });

/** The same bed seen from its left side: the roles of X and Y, and of their margins, change over. */
const seenFromTheSide = ({ bedXMm, bedYMm, marginMm, clampStripMm }: FitBed): FitBed => ({
  bedXMm: bedYMm,
  bedYMm: bedXMm,
  marginMm: {
    left: marginMm.front + clampStripMm,
    right: marginMm.back,
    front: marginMm.right,
    back: marginMm.left,
  },
  clampStripMm: 0,
});
const quarterTurned = (points: readonly { x: number; y: number }[]) =>
  points.map(({ x, y }) => ({ x: y, y: -x }));

describe('fitting a bed', () => {
  it('turns with the drawing: a quarter turn swaps the roles of the bed', () => {
    fc.assert(
      fc.property(hullMm, bitMm, bed, (points, bit, on) => {
        const straight = fitsBed(points, bit, on);
        const turned = fitsBed(quarterTurned(points), bit, seenFromTheSide(on));
        expect(turned.fits).toBe(straight.fits);
        expect(turned.overMm).toBeCloseTo(straight.overMm, 6);
        expect(turned.turnDeg === 0).toBe(straight.turnDeg === 0);
        // On the same bed what lay as drawn now lies a quarter turned, unless it fits both ways.
        const onTheSame = fitsBed(quarterTurned(points), bit, on);
        expect(onTheSame.fits).toBe(straight.fits);
        if (straight.turnDeg === 90) expect(onTheSame.turnDeg).toBe(0);
      }),
      { numRuns: 500 },
    );
  });

  it('never gets worse with more bed', () => {
    const more = fc.integer({ min: 0, max: 80 });
    fc.assert(
      fc.property(hullMm, bitMm, bed, more, more, (points, bit, small, moreX, moreY) => {
        const large = { ...small, bedXMm: small.bedXMm + moreX, bedYMm: small.bedYMm + moreY };
        const onSmall = fitsBed(points, bit, small);
        const onLarge = fitsBed(points, bit, large);
        if (onSmall.fits) expect(onLarge.fits).toBe(true);
        expect(onLarge.overMm).toBeLessThanOrEqual(onSmall.overMm + 1e-6);
      }),
      { numRuns: 500 },
    );
  });

  it('is no easier with a wider bit', () => {
    fc.assert(
      fc.property(hullMm, bed, (points, on) => {
        if (fitsBed(points, 6.35, on).fits) expect(fitsBed(points, 3.175, on).fits).toBe(true);
      }),
    );
  });

  it('has one answer: short and long way agree, and what is over is what is missing', () => {
    fc.assert(
      fc.property(hullMm, bitMm, bed, (points, bit, on) => {
        const { fits, turnDeg, overMm } = fitsBed(points, bit, on);
        expect(liesOnBed(points, bit, on)).toBe(fits);
        expect(turnDeg !== null).toBe(fits);
        if (fits) return;
        expect(overMm).toBeGreaterThan(0.0099);
        const wider = (byMm: number) => ({ ...on, bedXMm: on.bedXMm + byMm, bedYMm: on.bedYMm + byMm });
        expect(fitsBed(points, bit, wider(overMm)).fits).toBe(true);
        expect(fitsBed(points, bit, wider(overMm - 0.02)).fits).toBe(false);
      }),
      { numRuns: 500 },
    );
  });

  it('decides the report: a bed that does not fit is the verdict, one that grows never worsens it', () => {
    const rest: Omit<FitInput, 'hullMm' | 'machine'> = { bits: [] };
    const machine = {
      zTravelMm: 60,
      openingMm: 80,
      maxFeedMmPerMin: 3000,
      maxPlungeMmPerMin: 900,
      spindle: { kind: 'range' as const, minRpm: 8000, maxRpm: 24_000 },
      colletsMm: [6.35],
    };
    fc.assert(
      fc.property(hullMm, bed, (points, on) => {
        const report = fitReport({ ...rest, hullMm: points, machine: { ...machine, ...on } });
        const { fits, turnDeg } = fitsBed(points, undefined, on);
        expect(report.verdict).toBe(fits ? 'notKnown' : 'doesNotFit');
        expect(report.turnDeg).toBe(turnDeg);
        expect(report.sentence.startsWith(fits ? 'Fits your bed' : 'Does not fit your bed')).toBe(true);
      }),
    );
  });
});
