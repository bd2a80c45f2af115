import { describe, expect, it } from 'vitest';
import { fitsBed } from '#shared/fit/fits-bed.ts';
import { turnsThatFit } from '#shared/geometry/turns-that-fit.ts';

const rectangle = (lengthMm: number, widthMm: number) => [
  { x: 0, y: 0 },
  { x: lengthMm, y: 0 },
  { x: lengthMm, y: widthMm },
  { x: 0, y: widthMm },
];

/** Turns at which a rectangle fits, by trying each thousandth of a degree: textbook box of a turned rectangle. */
const scan = (lengthMm: number, widthMm: number, roomXMm: number, roomYMm: number) => {
  const fitting: number[] = [];
  for (let step = 0; step < 90_000; step += 1) {
    const angle = ((step / 1000) * Math.PI) / 180;
    const acrossMm = lengthMm * Math.cos(angle) + widthMm * Math.sin(angle);
    const upMm = lengthMm * Math.sin(angle) + widthMm * Math.cos(angle);
    if (acrossMm <= roomXMm && upMm <= roomYMm) fitting.push(step / 1000);
  }
  return { firstDeg: fitting[0], lastDeg: fitting.at(-1), count: fitting.length };
};

describe('the marking batten, 306 × 16, on a bed of 300 × 180 with 4 mm margins', () => {
  const margin = { left: 4, right: 4, front: 4, back: 4 };
  const bed = { bedXMm: 300, bedYMm: 180, marginMm: margin, clampStripMm: 0 };

  it('fits neither as drawn nor turned 90°, but turned about 25° (scan of angles, C)', () => {
    const scanned = scan(306, 16, 292, 172);
    expect(scanned.count).toBeGreaterThan(0);
    const { fits, turnDeg } = fitsBed(rectangle(306, 16), undefined, bed);
    expect(fits).toBe(true);
    expect(turnDeg).toBeGreaterThan(scanned.firstDeg!);
    expect(turnDeg).toBeLessThan(scanned.lastDeg!);
    expect(Math.abs(turnDeg! - 25)).toBeLessThanOrEqual(1.5);
  });

  it.each([
    [306, 16, 292, 172],
    [306 + 3.175, 16 + 3.175, 292, 172],
    [306, 16, 272, 172],
    [200, 40, 150, 190],
  ])('%d × %d in %d × %d fits over the turns that a scan finds (C)', (length, width, roomX, roomY) => {
    const scanned = scan(length, width, roomX, roomY);
    const ranges = turnsThatFit(rectangle(length, width), roomX, roomY, 0)
      .map(({ fromRad, toRad }) => ({ fromDeg: (fromRad * 180) / Math.PI, toDeg: (toRad * 180) / Math.PI }))
      .filter(({ fromDeg }) => fromDeg < 90);
    expect(ranges.length === 0).toBe(scanned.count === 0);
    const [range] = ranges;
    if (range === undefined) return;
    expect(Math.abs(range.fromDeg - scanned.firstDeg!)).toBeLessThanOrEqual(0.001);
    expect(Math.abs(range.toDeg - scanned.lastDeg!)).toBeLessThanOrEqual(0.001);
  });
});
