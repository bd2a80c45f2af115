import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Finding } from '#shared/api/findings.ts';
import { findingLevels, hazardousMaterials, materialFamilies } from '#shared/api/vocabulary.ts';
import { chipLoadRange, depthOfCutCapMm, diameterBandsMm } from '#shared/cutting/practice-ranges.ts';
import { fitPractice } from '#shared/fit/practice.ts';
import type { SettingsContext } from './rule.ts';
import { checkSettings, settingsRules } from './rules.ts';

/** 6 mm, two flutes, MDF: 18 000 · 2 · 0.1 = 3600 mm/min (C; any machining text), a chip load well within its range. */
const good: SettingsContext = {
  bit: { diameterMm: 6, flutes: 2, kind: 'up-cut' },
  materialId: 'mdf',
  stockThicknessMm: 18,
  settings: { spindleRpm: 18_000, feedMmPerMin: 3600, plungeMmPerMin: 600, depthOfCutMm: 3, stepoverMm: 2.4 },
};
const withSettings = (change: Partial<SettingsContext['settings']>, more: Partial<SettingsContext> = {}) => ({
  ...good,
  ...more,
  settings: { ...good.settings, ...change },
});
const found = (ruleId: string, context: SettingsContext): Finding | undefined =>
  checkSettings(context).find((finding) => finding.ruleId === ruleId);
const gravity = (finding: Finding | undefined) =>
  finding === undefined ? -1 : findingLevels.indexOf(finding.level);
/** The feed that gives a chip load with 18 000 rev/min and two flutes: vf = n z fz (C). */
const feedFor = (chipLoadMm: number) => 18_000 * 2 * chipLoadMm;
const just = 0.001;

it('good settings have no findings', () => expect(checkSettings(good)).toEqual([]));

it('rules have ids of their own', () => {
  expect(new Set(settingsRules.map(({ id }) => id)).size).toBe(settingsRules.length);
});

describe('chip load', () => {
  const { leastMm, mostMm } = chipLoadRange('mdf', good.bit);
  it.each([
    ['just below the top', mostMm * (1 - just), undefined],
    ['just above the top', mostMm * (1 + just), 'caution'],
    ['just below twice the top', mostMm * 2 * (1 - just), 'caution'],
    ['just above twice the top', mostMm * 2 * (1 + just), 'do-not-cut'],
    ['just above the bottom', leastMm * (1 + just), undefined],
    ['just below the bottom', leastMm * (1 - just), 'caution'],
    ['just above a third of the bottom', (leastMm / 3) * (1 + just), 'caution'],
    ['just below a third of the bottom', (leastMm / 3) * (1 - just), 'caution'],
  ])('%s', (_what, chipLoadMm, level) => {
    expect(found('chip-load', withSettings({ feedMmPerMin: feedFor(chipLoadMm) }))?.level).toBe(level);
  });

  it.each(materialFamilies)('rubbing in %s is stopped only where it melts or welds', (materialId) => {
    const least = chipLoadRange(materialId, good.bit).leastMm;
    const level = (chipLoadMm: number) =>
      found('chip-load', withSettings({ feedMmPerMin: feedFor(chipLoadMm) }, { materialId }))?.level;
    const melts = ['acrylic', 'soft-plastic', 'aluminium'].includes(materialId);
    expect(level((least / 3) * (1 + just))).toBe('caution');
    expect(level((least / 3) * (1 - just))).toBe(melts ? 'do-not-cut' : 'caution');
  });

  // P: common practice, no published source.
  it.each([
    ['just inside the bottom', 0.002 * (1 + just), undefined],
    ['just outside the bottom', 0.002 * (1 - just), 'caution'],
    ['just inside the top', 0.02 * (1 - just), undefined],
    ['just outside the top', 0.02 * (1 + just), 'caution'],
  ])('a bit of 1 mm has a band of its own: %s', (_what, chipLoadMm, level) => {
    const bit = { ...good.bit, diameterMm: 1 };
    const context = withSettings({ feedMmPerMin: feedFor(chipLoadMm), depthOfCutMm: 0.2 }, { bit });
    expect(found('chip-load', context)?.level).toBe(level);
  });

  it('a surfacing bit may skim with a quarter of the chip of another bit of its width (P)', () => {
    const wide = { diameterMm: 25, flutes: 2 };
    const least = chipLoadRange('mdf', { ...wide, kind: 'straight' }).leastMm;
    const level = (kind: 'surfacing' | 'straight', chipLoadMm: number) =>
      found('chip-load', withSettings({ feedMmPerMin: feedFor(chipLoadMm) }, { bit: { ...wide, kind } }))
        ?.level;
    expect(level('surfacing', (least / 4) * (1 + just))).toBeUndefined();
    expect(level('surfacing', (least / 4) * (1 - just))).toBe('caution');
    expect(level('straight', (least / 4) * (1 + just))).toBe('caution');
  });

  it('is that of the feed really cut with: an override counts, both ways', () => {
    const level = (feedMmPerMin: number, overridePercent: number) =>
      found('chip-load', withSettings({ feedMmPerMin }, { overridePercent }));
    expect(level(feedFor(mostMm), 100)).toBeUndefined();
    expect(level(feedFor(mostMm), 101)?.level).toBe('caution');
    expect(level(feedFor(mostMm), 201)?.level).toBe('do-not-cut');
    expect(level(feedFor(mostMm * 2), 50)).toBeUndefined();
    const slowed = level(feedFor(leastMm), 50);
    expect(slowed?.sentence).toContain('with an override of 50 %');
    expect(slowed?.advice).toContain('or more, override included');
    expect(slowed?.figures).toContainEqual({ name: 'chip load', value: leastMm / 2, unit: 'mm' });
  });

  it('too low is rubbing, and in dust a fire; the advice mends it', () => {
    const low = found('chip-load', withSettings({ feedMmPerMin: 300 }));
    expect(low?.sentence).toMatch(/rubs.*fire/);
    // 300 / (18 000 · 2) = 0.00833 (C)
    expect(low?.figures).toContainEqual({ name: 'chip load', value: 300 / 36_000, unit: 'mm' });
    expect(low?.sentence).toContain('0.0083 mm a tooth');
    const mended = withSettings({ feedMmPerMin: feedFor(leastMm) });
    expect(low?.advice.replaceAll('\u202f', ' ')).toContain('1 440 mm/min');
    expect(found('chip-load', mended)).toBeUndefined();
  });

  it('says that its limits have no published source', () => {
    expect(found('chip-load', withSettings({ feedMmPerMin: 300 }))?.source).toBe(
      'common practice, no published source',
    );
  });
});

describe('depth of cut', () => {
  const capMm = depthOfCutCapMm('mdf', good.bit);
  it.each([
    ['just below the cap', capMm * (1 - just), undefined],
    ['just above the cap', capMm * (1 + just), 'caution'],
    ['just below twice the cap', 2 * capMm * (1 - just), 'caution'],
    ['just above twice the cap', 2 * capMm * (1 + just), 'do-not-cut'],
  ])('%s', (_what, depthOfCutMm, level) => {
    expect(found('depth-of-cut', withSettings({ depthOfCutMm }))?.level).toBe(level);
  });
});

describe('deeper than the stock', () => {
  const overcut = fitPractice.overcutMm.value;
  const spoilboard = fitPractice.spoilboardMm.value;
  it.each([
    ['just within the overcut', 18 + overcut - just, undefined],
    ['just past the overcut', 18 + overcut + just, 'caution'],
    ['just within the spoilboard', 18 + spoilboard - just, 'caution'],
    ['just into the bed', 18 + spoilboard + just, 'do-not-cut'],
  ])('%s', (_what, depthOfCutMm, level) => {
    expect(found('deeper-than-stock', withSettings({ depthOfCutMm }))?.level).toBe(level);
  });
});

describe('the mark on the bit', () => {
  const spindle = (spindleRpm: number, bitMaxRpm?: number) =>
    found('spindle-over-mark', withSettings({ spindleRpm }, { bitMaxRpm }))?.level;
  it('is the limit itself', () => {
    expect(spindle(18_000, 18_000)).toBeUndefined();
    expect(spindle(18_001, 18_000)).toBe('do-not-cut');
  });
  it('that nobody knows of finds nothing', () => expect(spindle(120_000)).toBeUndefined());
});

describe('hazardous material', () => {
  it.each(hazardousMaterials)('%s is never to be cut, and nothing else is said', (materialId) => {
    const findings = checkSettings({ ...good, materialId });
    expect(findings).toMatchObject([{ ruleId: 'hazardous-material', level: 'do-not-cut' }]);
    expect(findings[0]?.source).not.toBe('');
    expect(findings[0]?.advice).not.toBe('');
  });
  it.each(materialFamilies)('%s is not one', (materialId) =>
    expect(found('hazardous-material', { ...good, materialId })).toBeUndefined(),
  );
  it('PVC: hydrogen chloride, ceiling 5 ppm (OSHA, S2)', () => {
    const finding = found('hazardous-material', { ...good, materialId: 'pvc' });
    expect(finding?.sentence).toMatch(/hydrogen chloride.*5 ppm/);
    expect(finding?.source).toContain('OSHA');
  });
  it('treated timber: not for food or children, never burnt (EPA, S2)', () => {
    const finding = found('hazardous-material', { ...good, materialId: 'treated-timber' });
    expect(finding?.advice).toMatch(/food.*children.*never burn/);
    expect(finding?.source).toContain('EPA');
  });
});

describe('the table of ranges', () => {
  const diameters = [0.5, 1, 2, 3.175, 4, 6.35, 7, 8, 11, 25];
  it.each(materialFamilies)('of %s grows with the diameter and is never empty', (family) => {
    const ranges = diameters.map((diameterMm) => chipLoadRange(family, { diameterMm, kind: 'up-cut' }));
    for (const { leastMm, mostMm } of ranges) expect(mostMm).toBeGreaterThan(2 * leastMm);
    for (const end of ['leastMm', 'mostMm'] as const) {
      const values = ranges.map((range) => range[end]);
      expect(values).toEqual([...values].sort((a, b) => a - b));
    }
    const caps = diameters.map((diameterMm) => depthOfCutCapMm(family, { diameterMm, kind: 'straight' }));
    expect(caps).toEqual([...caps].sort((a, b) => a - b));
  });
  it('changes just past the end of a band', () => {
    for (const upToMm of diameterBandsMm.slice(0, -1)) {
      const at = (diameterMm: number) => chipLoadRange('mdf', { diameterMm, kind: 'up-cut' }).mostMm;
      expect(at(upToMm + 0.001)).toBeGreaterThan(at(upToMm));
      expect(at(upToMm)).toBe(at(upToMm - 0.5));
    }
  });
});

describe('a finding never weakens when the value moves further past its limit', () => {
  const context = fc.record({
    bit: fc.record({
      diameterMm: fc.double({ min: 0.5, max: 60, noNaN: true }),
      flutes: fc.integer({ min: 1, max: 6 }),
      kind: fc.constantFrom('up-cut', 'v-bit', 'surfacing', 'ball-nose'),
    }),
    bitMaxRpm: fc.option(fc.integer({ min: 5000, max: 40_000 }), { nil: undefined }),
    materialId: fc.constantFrom(...materialFamilies, ...hazardousMaterials),
    stockThicknessMm: fc.double({ min: 0.5, max: 60, noNaN: true }),
    settings: fc.record({
      spindleRpm: fc.integer({ min: 1000, max: 60_000 }),
      feedMmPerMin: fc.double({ min: 1, max: 20_000, noNaN: true }),
      plungeMmPerMin: fc.constant(400),
      depthOfCutMm: fc.double({ min: 0.05, max: 90, noNaN: true }),
      stepoverMm: fc.constant(0.4),
    }),
  }) as fc.Arbitrary<SettingsContext>;
  const further = fc.double({ min: 1, max: 20, noNaN: true });

  const neverWeaker = (
    ruleId: string,
    move: (context: SettingsContext, by: number) => Partial<SettingsContext['settings']>,
    applies: (finding: Finding) => boolean = () => true,
  ) =>
    fc.assert(
      fc.property(context, further, (given, by) => {
        const before = found(ruleId, given);
        fc.pre(before !== undefined && applies(before));
        const after = found(ruleId, { ...given, settings: { ...given.settings, ...move(given, by) } });
        expect(gravity(after)).toBeGreaterThanOrEqual(gravity(before));
      }),
      { numRuns: 300 },
    );
  const isLow = ({ advice }: Finding) => advice.includes('or more');

  it('chip load upwards', () =>
    neverWeaker(
      'chip-load',
      ({ settings }, by) => ({ feedMmPerMin: settings.feedMmPerMin * by }),
      (finding) => !isLow(finding),
    ));
  it('chip load downwards', () =>
    neverWeaker('chip-load', ({ settings }, by) => ({ feedMmPerMin: settings.feedMmPerMin / by }), isLow));
  it('depth of cut', () =>
    neverWeaker('depth-of-cut', ({ settings }, by) => ({ depthOfCutMm: settings.depthOfCutMm * by })));
  it('depth past the stock', () =>
    neverWeaker('deeper-than-stock', ({ settings }, by) => ({ depthOfCutMm: settings.depthOfCutMm * by })));
  it('spindle speed', () =>
    neverWeaker('spindle-over-mark', ({ settings }, by) => ({ spindleRpm: settings.spindleRpm * by })));
  it('hazardous material, whatever the settings', () =>
    neverWeaker('hazardous-material', (_context, by) => ({ feedMmPerMin: by, depthOfCutMm: by })));

  it('and every finding is a whole one, gravest first', () => {
    fc.assert(
      fc.property(context, (given) => {
        const findings = checkSettings(given);
        expect(findings.map(gravity)).toEqual(findings.map(gravity).sort((a, b) => b - a));
        for (const { sentence, advice, source, figures } of findings) {
          expect(sentence).toMatch(/^\S.*\.$/);
          expect(advice).toMatch(/^\S.*\.$/);
          expect(source).not.toBe('');
          for (const { value } of figures) expect(Number.isFinite(value)).toBe(true);
        }
      }),
    );
  });
});
