import { describe, expect, it } from 'vitest';
import { chordCount, flattenOutline } from '#shared/drawing/flatten.ts';
import { viewBoxTransform } from '#shared/drawing/preserve-aspect-ratio.ts';
import type { Outline } from '#shared/drawing/types.ts';
import { boundsOf, furthest, page, read, readPath } from './support.ts';

/** Labels: S1 seen in a primary copy, S2 in a secondary one, M from memory, C computed from the formula. */
const EXACT_MM = 1e-6;

describe('units: 1 in = 25.4 mm = 96 px = 72 pt = 6 pc = 101.6 Q (CSS Values and Units, S2)', () => {
  it.each([
    ['1in', 'in', 25.4, true],
    ['25.4mm', 'mm', 25.4, true],
    ['2.54cm', 'cm', 25.4, true],
    ['72pt', 'pt', 25.4, true],
    ['6pc', 'pc', 25.4, true],
    ['101.6Q', 'q', 25.4, true],
    ['96px', 'px', 25.4, false],
    ['96', 'px', 25.4, false],
  ])('%s is %s and 25.4 mm wide', (width, source, expectedMm, confirmed) => {
    const drawing = read(
      page('<rect width="10" height="10"/>', `width="${width}" height="${width}" viewBox="0 0 10 10"`),
    );
    expect(drawing.widthMm).toBeCloseTo(expectedMm, 9);
    expect(drawing.units).toMatchObject({ source, confirmed });
  });
});

describe('paths', () => {
  it.each([
    // SVG 2, implementation notes B.2, S1: radii too small are scaled by √Λ: r 50
    ['arc scaled up', 'M0,0 A10,10 0 0 1 100,0', [0, -50, 100, 0], EXACT_MM],
    // W3C figure arcs01, S1; bounds C; approximations of arcs by cubics give 64.826
    [
      'arcs with corrected radii',
      'M600,350 l 50,-25 a25,25 -30 0,1 50,-25 l 50,-25 a25,50 -30 0,1 50,-25 l 50,-25 a25,75 -30 0,1 50,-25 l 50,-25 a25,100 -30 0,1 50,-25 l 50,-25',
      [600, 64.836785, 1050, 350],
      1e-5,
    ],
    // W3C figure arcs01, S1/C
    ['large pie wedge', 'M300,200 h-150 a150,150 0 1,0 150,-150 z', [150, 50, 450, 350], EXACT_MM],
    ['small pie wedge', 'M275,175 v-150 a150,150 0 0,0 -150,150 z', [125, 25, 275, 175], EXACT_MM],
    // SVG 2, Paths; path M, bounds C
    ['cubic chain', 'M100,200 C100,100 250,100 250,200 S400,300 400,200', [100, 125, 400, 275], EXACT_MM],
    ['quadratic chain', 'M200,300 Q400,50 600,300 T1000,300', [200, 175, 1000, 425], EXACT_MM],
    // Calculus, C
    ['cubic extrema', 'M110,150 C25,190 210,250 210,30', [87.664533, 30, 210, 188.862346], EXACT_MM],
    // SVG path grammar, C
    ['compressed arc flags', 'M2 12a50.5 50.5 0 0020 0 1 1 0 00-1-1', [2, 11, 22, 13], EXACT_MM],
  ])('%s', (_name, pathData, expected, toleranceMm) => {
    expect(furthest(boundsOf(readPath(pathData)), expected)).toBeLessThan(toleranceMm);
  });

  it('the top of the last of these arcs by its own formula (SVG 2 B.2.5, C)', () => {
    // Radii 25 and 100 turned −30°, chord (50, −25) about y 162.5: the half ellipse reaches √Λ·√(25²·sin² + 100²·cos²).
    const cos = Math.cos(Math.PI / 6);
    const lambda = (25 * cos + 12.5 * 0.5) ** 2 / 25 ** 2 + (25 * 0.5 - 12.5 * cos) ** 2 / 100 ** 2;
    const top = 162.5 - Math.sqrt(lambda) * Math.hypot(25 * 0.5, 100 * cos);
    expect(Math.abs(readPath('M875,175 a25,100 -30 0,1 50,-25').boundsMm.minY - top)).toBeLessThan(1e-9);
  });

  it.each([
    // W3C figure arcs01, S1/C: two straight sides of 150 and three quarters, or one, of a circle
    ['M300,200 h-150 a150,150 0 1,0 150,-150 z', 300 + 225 * Math.PI],
    ['M275,175 v-150 a150,150 0 0,0 -150,150 z', 300 + 75 * Math.PI],
    // Length of a half circle of radius 50, C
    ['M0,0 A10,10 0 0 1 100,0', 50 * Math.PI],
  ])('length of %s', (pathData, expectedMm) => {
    expect(Math.abs(readPath(pathData).lengthMm / expectedMm - 1)).toBeLessThan(1e-9);
  });

  it.each([
    // x(t) = 2t(1−t)·0.001 − 0.232·t² turns back at t = 0.001/0.234; C: way there and back, twice the turn and 0.232
    ['M0 0Q0.001 0 -0.232 0', 0.232 + (2 * 0.001 ** 2) / 0.234],
    // the same the other way round
    ['M-0.232 0Q0.001 0 0 0', 0.232 + (2 * 0.001 ** 2) / 0.234],
  ])('a curve that turns back right at its end: %s', (pathData, expectedMm) => {
    expect(Math.abs(readPath(pathData).lengthMm / expectedMm - 1)).toBeLessThan(1e-6);
  });

  it('a circle by four cubics errs outward only, at most 2.7253e-4 r (Riškus 2006, S2, C)', () => {
    const k = (4 * (Math.SQRT2 - 1)) / 3;
    const quarter = readPath(`M100 0 C100 ${100 * k} ${100 * k} 100 0 100`).shapes[0]?.outlines[0] as Outline;
    const radii = flattenOutline(quarter, 1e-6).map(({ x, y }) => Math.hypot(x, y) / 100 - 1);
    expect(Math.max(...radii)).toBeGreaterThan(2.7252e-4);
    expect(Math.max(...radii)).toBeLessThan(2.7254e-4);
    expect(Math.min(...radii)).toBeGreaterThan(-1e-12);
  });

  it('a circle of r 10 takes 158 chords for an error of 0.002: ⌈2π / (2 acos(1 − e/r))⌉ (C)', () => {
    const circle = read(page('<circle cx="20" cy="20" r="10"/>')).shapes[0]?.outlines[0];
    const arc = circle?.segments[0];
    expect(arc && chordCount(arc, 0.002)).toBe(158);
    expect(circle && flattenOutline(circle, 0.002).length).toBe(158);
  });
});

describe('preserveAspectRatio: viewport 21 × 10, viewBox 11 13 3 2 (W3C bug 29751, SVG 2 Coordinates, S1)', () => {
  const rows: [string, number, number, number, number][] = [
    ['none', 7, 5, -77, -65],
    ['xMinYMin meet', 5, 5, -55, -65],
    ['xMidYMid meet', 5, 5, -52, -65],
    ['xMaxYMax meet', 5, 5, -49, -65],
    ['xMinYMin slice', 7, 7, -77, -91],
    ['xMidYMid slice', 7, 7, -77, -93],
    ['xMaxYMax slice', 7, 7, -77, -95],
  ];
  it.each(rows)('%s', (value, scaleX, scaleY, moveX, moveY) => {
    const { a, b, c, d, e, f } = viewBoxTransform({ x: 11, y: 13, width: 3, height: 2 }, 21, 10, value);
    expect(furthest([a, b, c, d, e, f], [scaleX, 0, 0, scaleY, moveX, moveY])).toBeLessThan(1e-9);
  });

  it.each(rows)('%s, through a whole file', (value, scaleX, scaleY, moveX, moveY) => {
    const attributes = `width="21mm" height="10mm" viewBox="11 13 3 2" preserveAspectRatio="${value}"`;
    const drawing = read(page('<rect x="11" y="13" width="3" height="2"/>', attributes));
    const expected = [11 * scaleX + moveX, 13 * scaleY + moveY, 14 * scaleX + moveX, 15 * scaleY + moveY];
    expect(furthest(boundsOf(drawing), expected)).toBeLessThan(EXACT_MM);
    expect(drawing.warnings.some(({ code }) => code === 'non-uniform-scale')).toBe(value === 'none');
  });
});

it('12 cm × 5.25 cm with viewBox 0 0 1200 400: 0.1 mm a unit, moved down 6.25 mm (W3C figure arcs01, S1/C)', () => {
  const attributes = 'width="12cm" height="5.25cm" viewBox="0 0 1200 400"';
  const drawing = read(page('<rect width="1200" height="400"/>', attributes));
  expect(drawing.units.millimetresPerUnit.x).toBeCloseTo(0.1, 12);
  expect(furthest(boundsOf(drawing), [0, 6.25, 120, 46.25])).toBeLessThan(EXACT_MM);
});
