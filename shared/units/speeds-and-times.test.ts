import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatDuration, parseDuration } from './duration.ts';
import { formatFeed, parseFeed } from './feed.ts';
import { formatRpm, parseRpm } from './spindle-speed.ts';

const feedOf = (text: string, system: 'mm' | 'in'): number => {
  const reading = parseFeed(text, system);
  if (!reading.ok) throw new Error(`${text}: ${reading.message}`);
  return reading.mmPerMin;
};
const timeOf = (text: string): number => {
  const reading = parseDuration(text);
  if (!reading.ok) throw new Error(`${text}: ${reading.message}`);
  return reading.timeS;
};

describe('feeds', () => {
  it.each([
    ['1200', 'mm', 1200],
    ['1200 mm/min', 'in', 1200],
    ['1.2 m/min', 'mm', 1200],
    ['20 mm/s', 'mm', 1200],
    ['100', 'in', 2540],
    ['100 ipm', 'mm', 2540],
    ['100 in / min', 'mm', 2540],
  ] as const)('%s in a form in %s is %d mm/min', (text, system, mmPerMin) => {
    expect(feedOf(text, system)).toBeCloseTo(mmPerMin, 9);
  });
  it('shows thousands parted by a narrow no-break space, inches to a tenth', () => {
    expect(formatFeed(1200, 'mm')).toBe('1\u202f200 mm/min');
    expect(formatFeed(1200, 'in')).toBe('47.2 in/min');
  });
  it('is read back within its rounding', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 60_000, noNaN: true }), (feed) => {
        expect(Math.abs(feedOf(formatFeed(feed, 'mm'), 'in') - feed)).toBeLessThanOrEqual(0.5000001);
        expect(Math.abs(feedOf(formatFeed(feed, 'in'), 'mm') - feed)).toBeLessThanOrEqual(0.05001 * 25.4);
      }),
    );
  });
  it('refuses a unit of length', () => {
    expect(parseFeed('1200 mm', 'mm')).toMatchObject({ ok: false });
    expect(parseFeed('', 'mm')).toMatchObject({ ok: false });
  });
});

describe('spindle speeds', () => {
  it.each(['18000', '18 000 rpm', '18\u202f000 rpm', '18,000 rev/min'])('%j is 18 000 rpm', (text) => {
    expect(parseRpm(text)).toMatchObject({ ok: true, rpm: 18_000 });
  });
  it('is shown grouped and read back', () => {
    expect(formatRpm(18_000)).toBe('18\u202f000 rpm');
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 120_000 }), (rpm) => {
        expect(parseRpm(formatRpm(rpm))).toMatchObject({ ok: true, rpm });
      }),
    );
  });
  it('refuses what is not a speed', () => {
    expect(parseRpm('fast')).toMatchObject({ ok: false });
    expect(parseRpm('300 m/min')).toMatchObject({ ok: false });
  });
});

describe('run times', () => {
  it.each([
    ['52', 3120],
    ['52 min', 3120],
    ['1:08', 4080],
    ['1 h 08', 4080],
    ['1h8m', 4080],
    ['1 hour 8 minutes', 4080],
    ['1.5 h', 5400],
    ['1:08:30', 4110],
    ['45 s', 45],
    ['2 min 30 s', 150],
    ['1 h 30 s', 3630],
  ])('%s is %d s', (text, timeS) => {
    expect(timeOf(text)).toBe(timeS);
  });
  it.each(['', 'an hour', '1:75', '-5', 'min', '1 h 2 h'])('%j is refused', (text) => {
    expect(parseDuration(text)).toMatchObject({ ok: false });
  });
  it.each([
    [45, '45 s'],
    [59.7, '1 min'],
    [3120, '52 min'],
    [3599, '1 h 00'],
    [4080, '1 h 08'],
    [36_060, '10 h 01'],
  ])('%d s is shown as %s', (timeS, text) => {
    expect(formatDuration(timeS)).toBe(text);
  });
  it('is read back within its rounding', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 172_800, noNaN: true }), (timeS) => {
        expect(Math.abs(timeOf(formatDuration(timeS)) - timeS)).toBeLessThanOrEqual(timeS < 59.5 ? 0.5 : 30);
      }),
    );
  });
});
