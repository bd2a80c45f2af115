import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type SettingsUsed, sameSettings } from './same-settings.ts';

const used = (more: Partial<SettingsUsed['bit'] & SettingsUsed['settings']> = {}): SettingsUsed => {
  const { diameterMm, flutes, spindleRpm, feedMmPerMin, depthOfCutMm } = {
    diameterMm: 6.35,
    flutes: 2,
    spindleRpm: 18_000,
    feedMmPerMin: 1800,
    depthOfCutMm: 3,
    ...more,
  };
  return { bit: { diameterMm, flutes }, settings: { spindleRpm, feedMmPerMin, depthOfCutMm } };
};

describe('same settings', () => {
  it.each([
    [{ feedMmPerMin: 1800 * 1.15 }, true],
    [{ feedMmPerMin: 1800 * 1.16 }, false],
    [{ depthOfCutMm: 3 / 1.15 }, true],
    [{ depthOfCutMm: 3 / 1.16 }, false],
    [{ diameterMm: 6.37 }, true],
    [{ diameterMm: 6 }, false],
    [{ flutes: 1, feedMmPerMin: 900 }, false],
    // Half the speed at half the feed is the same chip.
    [{ spindleRpm: 9000, feedMmPerMin: 900 }, true],
  ])('%j beside the settings: %s', (more, same) => {
    expect(sameSettings(used(), used(more))).toBe(same);
  });

  it('compares the feed that was really cut with: an override counts', () => {
    // 1800 at 200 % is 3600 (C).
    expect(sameSettings({ ...used(), overridePercent: 200 }, used())).toBe(false);
    expect(sameSettings({ ...used(), overridePercent: 200 }, used({ feedMmPerMin: 3600 }))).toBe(true);
    expect(sameSettings({ ...used(), overridePercent: null }, { ...used(), overridePercent: 100 })).toBe(
      true,
    );
  });

  it('answers alike both ways round', () => {
    const settings = fc.record({
      feedMmPerMin: fc.integer({ min: 1500, max: 2200 }),
      depthOfCutMm: fc.integer({ min: 25, max: 36 }).map((tenths) => tenths / 10),
    });
    fc.assert(
      fc.property(settings, settings, (a, b) => {
        expect(sameSettings(used(a), used(b))).toBe(sameSettings(used(b), used(a)));
      }),
    );
  });
});
