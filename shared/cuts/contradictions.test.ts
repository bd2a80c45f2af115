import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { questionOfUnit } from './another-unit.ts';
import { bitOverBed, contradictionsOfCut } from './contradictions.ts';

const circumstances = {
  machine: { name: 'Shed router', bedXMm: 300, bedYMm: 180 },
  bit: { diameterMm: 6 },
  bitPath: 'bit.diameterMm',
  today: '2026-11-30',
};
const settings = { stepoverMm: 2 };
const pathsOf = (cut: object, change: object = {}) =>
  contradictionsOfCut({ settings, ...cut }, { ...circumstances, ...change }).map(({ path }) => path);

describe('a size that looks like another unit', () => {
  // 1 in = 25.4 mm exactly (international yard and pound agreement of 1959); 1 cm = 10 mm.
  it.each([
    [19.05, 0.75, /^0\.75 measured for 19\.05 drawn: is that inches\? Write 19\.05, or say sizesAreMm$/],
    [19.05, 0.76, /inches\? Write 19\.304,/],
    [0.75, 19.05, /drawn size in inches\? Write 19\.05 drawn/],
    [50, 5.01, /centimetres\? Write 50\.1,/],
    [5, 50, /drawn size in centimetres\? Write 50 drawn/],
  ])('%f drawn and %f measured is asked about', (drawnMm, measuredMm, sentence) => {
    expect(questionOfUnit({ drawnMm, measuredMm })).toMatch(sentence);
  });

  it('is asked about within 8 % of the ratio, and not beyond', () => {
    for (const ratio of [25.4, 10, 1 / 25.4, 1 / 10]) {
      expect(questionOfUnit({ drawnMm: 100, measuredMm: 100 * ratio * 1.079 })).not.toBeNull();
      expect(questionOfUnit({ drawnMm: 100, measuredMm: 100 * ratio * 0.921 })).not.toBeNull();
      expect(questionOfUnit({ drawnMm: 100, measuredMm: 100 * ratio * 1.081 })).toBeNull();
      expect(questionOfUnit({ drawnMm: 100, measuredMm: 100 * ratio * 0.919 })).toBeNull();
    }
  });

  it('is never a size that came out within half of what was drawn', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 5000, noNaN: true }),
        fc.double({ min: 0.5, max: 2, noNaN: true }),
        (drawnMm, ratio) => {
          expect(questionOfUnit({ drawnMm, measuredMm: drawnMm * ratio })).toBeNull();
        },
      ),
    );
  });
});

describe('what contradicts itself', () => {
  it('is nothing in a sound record', () => {
    expect(pathsOf({ wentWrong: ['tear-out', 'burning'], cutOn: '2026-11-30' })).toEqual([]);
  });

  it('is a bit wider than the shorter side of the bed', () => {
    expect(pathsOf({}, { bit: { diameterMm: 180 } })).toEqual([]);
    expect(pathsOf({}, { bit: { diameterMm: 180.1 } })).toEqual(['bit.diameterMm']);
    expect(bitOverBed(254, circumstances.machine, 'x')[0]?.message).toContain('180 mm');
  });

  it('is a stepover wider than the bit', () => {
    expect(pathsOf({ settings: { stepoverMm: 6 } })).toEqual([]);
    expect(pathsOf({ settings: { stepoverMm: 6.01 } })).toEqual(['settings.stepoverMm']);
  });

  it('is a thing named twice', () => {
    expect(pathsOf({ wentWrong: ['jammed', 'burning', 'jammed'] })).toEqual(['wentWrong.2']);
  });

  it('is a date to come, or before the year 2000', () => {
    expect(pathsOf({ cutOn: '2026-12-01' })).toEqual(['cutOn']);
    expect(pathsOf({ cutOn: '1999-12-31' })).toEqual(['cutOn']);
    expect(pathsOf({ cutOn: '2000-01-01' })).toEqual([]);
  });

  it('is a size in another unit, unless the member says that it is none', () => {
    const measured = [
      { drawnMm: 12, measuredMm: 12.1 },
      { drawnMm: 25.4, measuredMm: 1 },
    ];
    expect(pathsOf({ measured })).toEqual(['measured.1.measuredMm']);
    expect(pathsOf({ measured, sizesAreMm: true })).toEqual([]);
  });

  it('is told all at once', () => {
    expect(
      pathsOf(
        { settings: { stepoverMm: 300 }, wentWrong: ['other', 'other'], cutOn: '2027-01-01' },
        { bit: { diameterMm: 200 } },
      ),
    ).toEqual(['bit.diameterMm', 'settings.stepoverMm', 'wentWrong.1', 'cutOn']);
  });
});
