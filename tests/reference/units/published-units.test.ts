import { describe, expect, it } from 'vitest';
import { formatLength, parseLength } from '#shared/units/length.ts';
import { MM_PER_INCH } from '#shared/units/system.ts';

const rows = [
  { typed: '1 in', mm: 25.4, source: 'CSS Values and Units, absolute lengths', label: 'S2' },
  { typed: '23/32 in', mm: 18.25625, source: '23/32 × 25.4', label: 'C' },
  { typed: '0.688 in', mm: 17.4752, source: 'PS 1, least 23/32 in panel, × 25.4', label: 'S1' },
  { typed: '0.750 in', mm: 19.05, source: 'PS 1, greatest 23/32 in panel, × 25.4', label: 'S1' },
  { typed: '1/8 in', mm: 3.175, source: 'shanks, ISO 286-2', label: 'M' },
  { typed: '1/4 in', mm: 6.35, source: 'shanks, ISO 286-2', label: 'M' },
];

describe('lengths against published values', () => {
  it.each(rows)('$typed is $mm mm ($source, $label)', ({ typed, mm }) => {
    const reading = parseLength(typed, 'mm');
    expect(reading.ok && reading.mm).toBeCloseTo(mm, 10);
  });

  it('1 in = 101.6 Q (CSS Values and Units, S2)', () => {
    // A Q is a quarter of a millimetre, so 101.6 of them are an inch.
    expect(101.6 / 4).toBeCloseTo(MM_PER_INCH, 12);
  });

  it('1/4 in is not shown as 6 mm, nor 6 mm as 1/4 in (shanks, ISO 286-2, M)', () => {
    expect(formatLength(6.35, 'mm', { digits: 3, trim: true })).toBe('6.35 mm');
    expect(formatLength(6, 'in')).toBe('0.236 in');
  });
});
