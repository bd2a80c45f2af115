import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { segmentBounds } from './bounds.ts';
import { flattenOutline, segmentPoint } from './flatten.ts';
import { outlinesLength, segmentLength } from './length.ts';
import { readDrawing } from './read.ts';
import type { Drawing, Outline, Segment } from './types.ts';

const coordinate = fc
  .double({ min: -200, max: 200, noNaN: true })
  .map((value) => Math.round(value * 1000) / 1000);
const pair = fc.tuple(coordinate, coordinate).map((two) => two.join(' '));
const radius = fc.integer({ min: 1, max: 90 });
const command = fc.oneof(
  pair.map((to) => `L${to}`),
  coordinate.map((x) => `H${x}`),
  fc.tuple(pair, pair, pair).map((points) => `C${points.join(' ')}`),
  fc.tuple(pair, pair).map((points) => `S${points.join(' ')}`),
  fc.tuple(pair, pair).map((points) => `Q${points.join(' ')}`),
  pair.map((to) => `T${to}`),
  fc
    .tuple(radius, radius, fc.integer({ min: -90, max: 90 }), fc.boolean(), fc.boolean(), pair)
    .map(
      ([rx, ry, turn, large, sweep, to]) => `A${rx} ${ry} ${turn} ${Number(large)} ${Number(sweep)} ${to}`,
    ),
);
const pathData = fc
  .tuple(pair, fc.array(command, { minLength: 1, maxLength: 8 }), fc.boolean())
  .map(([start, commands, close]) => `M${start}l3 4${commands.join('')}${close ? 'Z' : ''}`);

function read(
  d: string,
  transform = '',
  page = 'width="100mm" height="100mm" viewBox="0 0 100 100"',
): Drawing {
  const result = readDrawing(`<svg ${page}><g transform="${transform}"><path d="${d}"/></g></svg>`);
  if (!result.ok) throw new Error(result.refusal.message);
  return result.drawing;
}

const sides = ({ boundsMm: { minX, minY, maxX, maxY } }: Pick<Drawing, 'boundsMm'>) => [
  minX,
  minY,
  maxX,
  maxY,
];

function expectNear(actual: number[], expected: number[], toleranceMm = 1e-6): void {
  for (const [index, value] of actual.entries())
    expect(Math.abs(value - expected[index]!)).toBeLessThan(toleranceMm);
}

function reversedSegment(segment: Segment): Segment {
  const ends = { from: segment.to, to: segment.from };
  if (segment.kind === 'cubic')
    return { ...segment, ...ends, control1: segment.control2, control2: segment.control1 };
  if (segment.kind !== 'arc') return { ...segment, ...ends };
  const startAngleRad = segment.startAngleRad + segment.sweepAngleRad;
  return { ...segment, ...ends, startAngleRad, sweepAngleRad: -segment.sweepAngleRad };
}

const segmentsOf = (drawing: Drawing) =>
  drawing.shapes.flatMap((shape) => shape.outlines.flatMap((one) => one.segments));
const RUNS = { numRuns: 150 };

describe('bounds and length', () => {
  it('move with the drawing', () => {
    fc.assert(
      fc.property(pathData, coordinate, coordinate, (d, x, y) => {
        const still = read(d);
        const moved = read(d, `translate(${x} ${y})`);
        const [minX, minY, maxX, maxY] = sides(still) as [number, number, number, number];
        expectNear(sides(moved), [minX + x, minY + y, maxX + x, maxY + y]);
        expect(moved.lengthMm / still.lengthMm).toBeCloseTo(1, 6);
      }),
      RUNS,
    );
  });

  it('turn with the drawing by quarters', () => {
    fc.assert(
      fc.property(pathData, fc.integer({ min: -3, max: 3 }), (d, quarters) => {
        const still = read(d);
        let expected = sides(still) as [number, number, number, number];
        for (let turn = 0; turn < ((quarters % 4) + 4) % 4; turn++) {
          const [minX, minY, maxX, maxY] = expected;
          expected = [-maxY, minX, -minY, maxX];
        }
        const turned = read(d, `rotate(${quarters * 90})`);
        expectNear(sides(turned), expected);
        expect(turned.lengthMm / still.lengthMm).toBeCloseTo(1, 6);
      }),
      RUNS,
    );
  });

  it('grow with the scale, mirrored too', () => {
    fc.assert(
      fc.property(
        pathData,
        fc.double({ min: 0.05, max: 20, noNaN: true }),
        fc.boolean(),
        (d, scale, mirror) => {
          const still = read(d);
          const [minX, minY, maxX, maxY] = sides(still).map((side) => side * scale) as [
            number,
            number,
            number,
            number,
          ];
          const scaled = read(d, `scale(${mirror ? -scale : scale} ${scale})`);
          expectNear(sides(scaled), mirror ? [-maxX, minY, -minX, maxY] : [minX, minY, maxX, maxY], 1e-5);
          expect(scaled.lengthMm / still.lengthMm / scale).toBeCloseTo(1, 6);
        },
      ),
      RUNS,
    );
  });

  it('are the same in every unit of the page', () => {
    const pages = [
      ['10cm'],
      ['3.9370078740157480315in'],
      ['283.46456692913385827pt'],
      ['23.622047244094488189pc'],
      ['400Q'],
    ];
    fc.assert(
      fc.property(pathData, fc.constantFrom(...pages), (d, [size]) => {
        const inMm = read(d);
        const inOther = read(d, '', `width="${size}" height="${size}" viewBox="0 0 100 100"`);
        expectNear(sides(inOther), sides(inMm));
        expect(inOther.lengthMm / inMm.lengthMm).toBeCloseTo(1, 9);
      }),
      RUNS,
    );
  });

  it('do not depend on the direction', () => {
    fc.assert(
      fc.property(pathData, (d) => {
        for (const segment of segmentsOf(read(d))) {
          const back = reversedSegment(segment);
          expectNear(
            sides({ boundsMm: segmentBounds(back) }),
            sides({ boundsMm: segmentBounds(segment) }),
            1e-9,
          );
          expect(Math.abs(segmentLength(back) - segmentLength(segment))).toBeLessThan(
            1e-6 * segmentLength(segment) + 1e-12,
          );
        }
      }),
      RUNS,
    );
  });

  it('hold every point of the curve and touch it on each side; the length is that of many short chords', () => {
    fc.assert(
      fc.property(pathData, (d) => {
        for (const segment of segmentsOf(read(d))) {
          const bounds = segmentBounds(segment);
          const points = Array.from({ length: 2001 }, (_, index) => segmentPoint(segment, index / 2000));
          const xs = points.map(({ x }) => x);
          const ys = points.map(({ y }) => y);
          const sampled = [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)];
          const exact = sides({ boundsMm: bounds });
          // Samples lie inside; between two of them a curve of this size rises by less than 1e-3 mm.
          expectNear(exact, sampled, 1e-3);
          expect(exact[0]!).toBeLessThan(sampled[0]! + 1e-9);
          expect(exact[3]!).toBeGreaterThan(sampled[3]! - 1e-9);
          let chords = 0;
          for (let i = 1; i < points.length; i++)
            chords += Math.hypot(xs[i]! - xs[i - 1]!, ys[i]! - ys[i - 1]!);
          expect(segmentLength(segment)).toBeGreaterThan(chords * (1 - 1e-7) - 1e-9);
          expect(segmentLength(segment)).toBeLessThan(chords * (1 + 1e-5) + 1e-9);
        }
      }),
      { numRuns: 40 },
    );
  });

  it('chords stay within the error asked for', () => {
    fc.assert(
      fc.property(pathData, fc.constantFrom(0.5, 0.05), (d, errorMm) => {
        for (const segment of segmentsOf(read(d))) {
          const outline: Outline = { closed: false, segments: [segment] };
          const points = flattenOutline(outline, errorMm);
          for (let i = 1; i < points.length; i++) {
            const middle = segmentPoint(segment, (i - 0.5) / (points.length - 1));
            const a = points[i - 1]!;
            const b = points[i]!;
            const chord = Math.hypot(b.x - a.x, b.y - a.y);
            const area = Math.abs((b.x - a.x) * (middle.y - a.y) - (b.y - a.y) * (middle.x - a.x));
            if (chord > 0) expect(area / chord).toBeLessThan(errorMm * (1 + 1e-6));
          }
        }
      }),
      { numRuns: 60 },
    );
  });
});

describe('length of curves with a known length', () => {
  const lengthOf = (d: string) => outlinesLength(read(d).shapes[0]!.outlines);

  it.each([
    // A parabola y = x² from 0 to a: ½·(a·√(1+4a²) + asinh(2a)/2), calculus.
    ['M0 0Q50 0 100 10000', 0.5 * (100 * Math.sqrt(1 + 4 * 1e4) + Math.asinh(200) / 2)],
    // Collinear control points: the pen goes past the end and back, 2·reach − chord.
    ['M0 0Q100 0 0 0', 100],
    // A semicubical parabola y = x^1.5 as a cubic (t², t³): (13√13 − 8)/27 at t = 1, with its cusp at the start.
    ['M0 0C0 0 33.333333333333336 0 100 100', (100 * (13 * Math.sqrt(13) - 8)) / 27],
  ])('%s', (d, expectedMm) => {
    expect(Math.abs(lengthOf(d) / expectedMm - 1)).toBeLessThan(1e-6);
  });

  it('an ellipse: Ramanujan’s second formula, itself within 1e-6 for 2 : 1', () => {
    const h = 1 / 9;
    const expected = Math.PI * 30 * (1 + (3 * h) / (10 + Math.sqrt(4 - 3 * h)));
    const result = readDrawing(
      '<svg width="9mm" height="9mm" viewBox="0 0 9 9"><ellipse rx="20" ry="10"/></svg>',
    );
    expect(result.ok && Math.abs(result.drawing.lengthMm / expected - 1)).toBeLessThan(1e-6);
  });
});
