import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatLength, formatLengthBare, formatSize, parseLength } from './length.ts';
import type { UnitSystem } from './system.ts';

const mmOf = (text: string, system: UnitSystem = 'mm'): number => {
  const reading = parseLength(text, system);
  if (!reading.ok) throw new Error(`${text}: ${reading.message}`);
  return reading.mm;
};

describe('reading a length', () => {
  it.each([
    ['6.35', 'mm', 6.35],
    ['6,35', 'mm', 6.35],
    ['6.35mm', 'in', 6.35],
    ['6.35 mm', 'mm', 6.35],
    ['2.5 cm', 'mm', 25],
    ['1 200 mm', 'mm', 1200],
    ['1/4"', 'mm', 6.35],
    ['1/4”', 'mm', 6.35],
    ['¼ in', 'mm', 6.35],
    ['0.25 in', 'mm', 6.35],
    ['.25', 'in', 6.35],
    ['0,125 inch', 'mm', 3.175],
    ['1/8', 'in', 3.175],
    ['23/32 in', 'mm', 18.25625],
    ['1 1/4"', 'mm', 31.75],
    ['1-1/4 in', 'mm', 31.75],
    ['1½"', 'mm', 38.1],
    [' 12 ', 'in', 304.8],
  ] as const)('%s in a form in %s is %d mm', (text, system, mm) => {
    expect(mmOf(text, system)).toBeCloseTo(mm, 9);
  });

  it('keeps what was typed beside the number', () => {
    expect(parseLength('  23/32 in ', 'mm')).toMatchObject({ ok: true, typed: '23/32 in' });
  });

  it.each([
    ['', 'Type a length'],
    ['wide', 'begin with a number'],
    ['-3 mm', 'below zero'],
    ['1/0 in', 'must not be 0'],
    ['1 5/4 in', 'less than 1'],
    ['1/4', 'Say which unit'],
    ['6 ells', '"ells" is not known'],
    ['6.3.5 mm', 'not known'],
    ['1,000 mm', 'could be 1.000 or 1000'],
    ['1e3 mm', 'not known'],
  ])('%j is refused and told why', (text, why) => {
    const reading = parseLength(text, 'mm');
    expect(reading.ok).toBe(false);
    expect(!reading.ok && reading.message).toContain(why);
  });
});

describe('showing a length', () => {
  it.each([
    [240, 'mm', {}, '240.0 mm'],
    [3, 'mm', { digits: 3, trim: true }, '3 mm'],
    [3.175, 'mm', { digits: 3, trim: true }, '3.175 mm'],
    [113.175, 'mm', { digits: 2 }, '113.18 mm'],
    [-0.04, 'mm', {}, '0.0 mm'],
    [-5, 'mm', {}, '\u22125.0 mm'],
    [18.25625, 'in', {}, '23/32 in'],
    [31.75, 'in', {}, '1 1/4 in'],
    [254, 'in', {}, '10 in'],
    [0, 'in', {}, '0 in'],
    [10, 'in', {}, '0.394 in'],
    [6.35, 'in', { fractions: false }, '0.250 in'],
    [0.02, 'in', { digits: 2 }, '0.0008 in'],
  ] as const)('%d mm in %s with %j is %s', (mm, system, format, text) => {
    expect(formatLength(mm, system, format)).toBe(text);
  });

  it('gives the figure alone for a table, and sides with one unit', () => {
    expect(formatLengthBare(18.25625, 'in')).toBe('23/32');
    expect(formatSize([240, 110], 'mm')).toBe('240.0 × 110.0 mm');
  });

  it('is read back within the rounding it was shown with', () => {
    const length = fc.double({ min: 0, max: 10_000, noNaN: true });
    fc.assert(
      fc.property(length, fc.integer({ min: 0, max: 4 }), fc.boolean(), (mm, digits, trim) => {
        const shown = formatLength(mm, 'mm', { digits, trim });
        expect(Math.abs(mmOf(shown, 'in') - mm)).toBeLessThanOrEqual(0.5000001 * 10 ** -digits);
      }),
    );
    fc.assert(
      fc.property(length, (mm) => {
        // A fraction stands for at most 0.001 in, three decimals for at most 0.0005 in.
        const bound = 0.0010001 * 25.4;
        expect(Math.abs(mmOf(formatLength(mm, 'in')) - mm)).toBeLessThanOrEqual(bound);
        expect(Math.abs(mmOf(formatLengthBare(mm, 'in'), 'in') - mm)).toBeLessThanOrEqual(bound);
      }),
    );
  });

  it('means the same whichever system it is typed in, once its unit is named', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 400, noNaN: true }), (inches) => {
        const text = inches.toFixed(4);
        expect(mmOf(text, 'in')).toBe(mmOf(`${text} in`, 'mm'));
        expect(mmOf(text, 'in')).toBeCloseTo(25.4 * mmOf(text, 'mm'), 6);
      }),
    );
  });
});
