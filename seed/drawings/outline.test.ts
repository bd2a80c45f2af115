import SVGPathCommander from 'svg-path-commander';
import { describe, expect, it } from 'vitest';
import { arcTo, close, curveTo, filleted, lineTo, move, scalloped, slot, wrapped } from './outline.ts';
import { pathData } from './path-data.ts';

const asMm = (mm: number) => Number(mm.toFixed(6)) + 0;
const lengthMm = (d: string) => SVGPathCommander.getTotalLength(d);
const drawn = (steps: Parameters<typeof pathData>[0]) => pathData(steps, asMm, false);

describe('outlines of the demo drawings', () => {
  it('round the corners of a square by tangent arcs', () => {
    const d = drawn(
      filleted([
        [0, 0, 5],
        [40, 0, 5],
        [40, 40, 5],
        [0, 40, 5],
      ]),
    );
    // Four straights of 30 and one full circle of radius 5 (C).
    expect(lengthMm(d)).toBeCloseTo(120 + 10 * Math.PI, 3);
    expect(d.match(/ 0 0 1 /g)).toHaveLength(4);
  });

  it('turn the other way at a corner that points into the part', () => {
    const d = drawn(
      filleted([
        [0, 0],
        [40, 0],
        [40, 20],
        [20, 20, 4],
        [20, 40],
        [0, 40],
      ]),
    );
    expect(d).toContain('A4 4 0 0 0 20 24');
  });

  it('make a slot of two straights and two half rounds', () => {
    // 2 · 30 + 2π · 4 (C).
    expect(lengthMm(drawn(slot(10, 10, 10, 40, 8)))).toBeCloseTo(60 + 8 * Math.PI, 3);
  });

  it('wrap two rounds by their outer tangents', () => {
    const d = drawn(wrapped({ xMm: 0, yMm: 0, radiusMm: 20 }, { xMm: 50, yMm: 0, radiusMm: 5 }));
    const box = SVGPathCommander.getPathBBox(d);
    expect([box.x, box.x2]).toEqual([expect.closeTo(-20, 3), expect.closeTo(55, 3)]);
    // An open belt: 2 √(d² − (R−r)²) + (π + 2β) R + (π − 2β) r, sin β = (R − r)/d (C).
    const beta = Math.asin(15 / 50);
    const belt = 2 * Math.sqrt(50 ** 2 - 15 ** 2) + (Math.PI + 2 * beta) * 20 + (Math.PI - 2 * beta) * 5;
    expect(lengthMm(d)).toBeCloseTo(belt, 3);
  });

  it('keep a scalloped wheel inside its rim and touching it at the lobes', () => {
    const d = drawn(scalloped({ xMm: 45, yMm: 45, radiusMm: 45 }, 8, { radiusMm: 9, awayMm: 50 }));
    const box = SVGPathCommander.getPathBBox(d);
    expect([box.x, box.y, box.x2, box.y2].map((value) => Math.round(value * 1000) + 0)).toEqual([
      0, 0, 90000, 90000,
    ]);
  });

  it('say the same relative and absolute, without drift', () => {
    const coarse = (mm: number) => Number((mm / 3).toFixed(2)) + 0;
    const steps = [
      move(1, 1),
      ...Array.from({ length: 200 }, (_, index) => lineTo(1 + index * 1.0001, 1 + (index % 7))),
      arcTo(5, true, 210, 11),
      curveTo(220, 20, 100, 90, 1, 60),
      close,
      move(7, 7),
      lineTo(8, 9),
      close,
    ];
    const absolute = new SVGPathCommander(pathData(steps, coarse, false)).toAbsolute().segments;
    const relative = new SVGPathCommander(pathData(steps, coarse, true), { round: 'off' }).toAbsolute()
      .segments;
    expect(relative).toHaveLength(absolute.length);
    const distances = relative.flatMap((segment, index) =>
      segment.map((value, at) =>
        typeof value === 'number' ? Math.abs(value - Number(absolute[index]?.[at])) : 0,
      ),
    );
    expect(Math.max(...distances)).toBeLessThan(1e-6);
  });
});
