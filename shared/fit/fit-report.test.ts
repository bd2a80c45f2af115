import { describe, expect, it } from 'vitest';
import { fitReport as fitReportSchema } from '#shared/api/fit.ts';
import type { FitBit, FitInput, FitMachine } from './fit-input.ts';
import { fitReport } from './fit-report.ts';

const machine: FitMachine = {
  bedXMm: 300,
  bedYMm: 180,
  marginMm: { left: 4, right: 4, front: 4, back: 4 },
  clampStripMm: 0,
  zTravelMm: 45,
  openingMm: 60,
  maxFeedMmPerMin: 2000,
  maxPlungeMmPerMin: 600,
  spindle: { kind: 'range', minRpm: 8000, maxRpm: 24_000 },
  colletsMm: [3.175, 6],
};
const bit = (more: Partial<FitBit> = {}): FitBit => ({
  name: 'Eighth',
  kind: 'up-cut',
  diameterMm: 3.175,
  shankMm: 3.175,
  flutes: 2,
  cuttingLengthMm: 20,
  canPlunge: true,
  ...more,
});
const rectangle = (widthMm: number, heightMm: number) => [
  { x: 0, y: 0 },
  { x: widthMm, y: 0 },
  { x: widthMm, y: heightMm },
  { x: 0, y: heightMm },
];
const cut = {
  bit: { diameterMm: 3.175, flutes: 2, kind: 'up-cut' },
  settings: {
    spindleRpm: 18_000,
    feedMmPerMin: 1200,
    plungeMmPerMin: 400,
    depthOfCutMm: 1.5,
    stepoverMm: 1.2,
  },
  stockThicknessMm: 12,
} as const;
const ask = (more: Partial<FitInput> = {}) =>
  fitReport({ hullMm: rectangle(240, 110), ...cut, machine, bits: [bit()], ...more });
const check = (id: string, more: Partial<FitInput> = {}) => {
  const found = ask(more).checks.find((each) => each.id === id);
  if (found === undefined) throw new Error(`no check ${id}`);
  return found;
};
const machineWith = (more: Partial<FitMachine>): FitMachine => ({ ...machine, ...more });

describe('the report', () => {
  it('fits when every check does, and keeps to the contract', () => {
    const report = ask();
    expect(report).toMatchObject({ verdict: 'fits', turnDeg: 0 });
    expect(report.sentence).toBe('Fits your bed as drawn, and the rest of your bench suits it.');
    expect(report.checks.map(({ result }) => result)).toEqual(report.checks.map(() => 'fits'));
    expect(fitReportSchema.parse(report)).toEqual(report);
  });

  it('says plainly that a design nobody has cut fits the bed', () => {
    const report = ask({ bit: undefined, settings: undefined, stockThicknessMm: undefined });
    expect(report.verdict).toBe('notKnown');
    expect(report.sentence).toMatch(/^Fits your bed as drawn; nobody has shared a cut of it/);
    expect(report.checks.filter(({ result }) => result !== 'notKnown').map(({ id }) => id)).toEqual(['bed']);
  });

  it('names the bed first when it is too small, though all else fits', () => {
    const report = ask({ hullMm: rectangle(400, 110) });
    expect(report).toMatchObject({ verdict: 'doesNotFit', turnDeg: null });
    expect(report.sentence).toMatch(/^Does not fit your bed: it needs 403.18 × 113.18 mm .* 292 × 172 mm/);
  });

  it('gives how it lies and the worst of the rest in one sentence', () => {
    const used = { ...cut.bit, diameterMm: 3 };
    const report = ask({
      hullMm: rectangle(110, 240),
      bit: used,
      bits: [bit({ diameterMm: 2.5 }), bit({ diameterMm: 2 })],
    });
    expect(report).toMatchObject({ verdict: 'fitsIf', turnDeg: 90 });
    expect(report.sentence).toMatch(
      /^Fits your bed turned 90°, but you have no 3 mm bit: the largest you own that enters every slot is 2.5 mm; .*\.$/,
    );
  });

  it('puts what does not fit before what fits on a condition, and counts the rest', () => {
    const report = ask({
      bits: [bit({ kind: 'down-cut' })],
      machine: machineWith({
        zTravelMm: 10,
        openingMm: 30,
        spindle: { kind: 'range', minRpm: 1000, maxRpm: 9000 },
      }),
    });
    expect(report.verdict).toBe('doesNotFit');
    expect(report.sentence).toMatch(/^Fits your bed as drawn, but your Z travel of 10 mm is too short/);
    expect(report.sentence).toMatch(/4 more checks need a look\.$/);
  });

  it('speaks inches when asked, with the figures still in mm', () => {
    const inches = check('bed', { units: 'in' });
    expect(inches.sentence).toContain('1/8 in bit');
    expect(inches).toMatchObject({ need: '243.18 × 113.18', unit: 'mm' });
  });
});

describe('the bed', () => {
  it('is widened by the radius of the bit on each side, and fits to a hundredth', () => {
    const room = { hullMm: rectangle(292 - 3.175, 172 - 3.175) };
    expect(check('bed', room).result).toBe('fits');
    expect(check('bed', { hullMm: rectangle(292 - 3.155, 172 - 3.175) }).result).toBe('doesNotFit');
    expect(check('bed', { hullMm: rectangle(292, 172), bit: undefined }).result).toBe('fits');
  });
  it('loses the clamp strip', () => {
    expect(check('bed', { machine: machineWith({ clampStripMm: 70 }) }).result).toBe('doesNotFit');
  });
  it('tells from which to which turn a long part will do', () => {
    const { sentence } = check('bed', { hullMm: rectangle(306, 16), bit: undefined });
    expect(sentence).toMatch(
      /^Fits your bed only turned 26° anticlockwise: .* any turn from 20.6° to 31.2° will do\.$/,
    );
  });
});

describe('the stock', () => {
  it('is left out when the member names none', () => {
    expect(ask().checks.some(({ id }) => id.startsWith('stock'))).toBe(false);
  });
  it('holds the part turned, but not one too long', () => {
    expect(check('stock', { stock: { lengthMm: 120, widthMm: 250, thicknessMm: 12 } }).sentence).toContain(
      'turned 90°',
    );
    expect(check('stock', { stock: { lengthMm: 240, widthMm: 120, thicknessMm: 12 } }).result).toBe(
      'doesNotFit',
    );
  });
  it('of another thickness fits if depths are set from it', () => {
    const stock = { lengthMm: 300, widthMm: 150, thicknessMm: 12 };
    expect(check('stock-thickness', { stock: { ...stock, thicknessMm: 12.3 } }).result).toBe('fits');
    expect(check('stock-thickness', { stock: { ...stock, thicknessMm: 11.5 } })).toMatchObject({
      result: 'fitsIf',
      have: 11.5,
      need: 12,
    });
    expect(check('cutting-length', { stock: { ...stock, thicknessMm: 19.8 } })).toMatchObject({
      result: 'doesNotFit',
      need: 20.1,
    });
  });
});

describe('Z', () => {
  // 12 mm of stock, 0.3 over: 12.3 deep; 15 above it clears clamps of 10 by 5 (all P).
  it.each([
    [27.3, 'fits'],
    [27.2, 'fitsIf'],
    [17.3, 'fitsIf'],
    [17.2, 'doesNotFit'],
  ])('travel of %d mm: %s', (zTravelMm, result) => {
    expect(check('z-travel', { machine: machineWith({ zTravelMm, openingMm: 50 }) })).toMatchObject({
      result,
      need: 27.3,
    });
  });
  // 12 of spoilboard, 12 of stock, 20 of flutes and 2 more: 46.
  it.each([
    [46, 'fits'],
    [45.9, 'fitsIf'],
    [37, 'fitsIf'],
    [36.9, 'doesNotFit'],
  ])('opening of %d mm: %s', (openingMm, result) => {
    expect(check('opening', { machine: machineWith({ openingMm }) })).toMatchObject({ result, need: 46 });
  });
  it('says how much to lay under the stock when the tip does not come down', () => {
    // Tip at 120 − 45 − 22 = 53 above the bed, bottom of the cut at 12 + 12 − 12.3 = 11.7.
    const found = check('reach', { machine: machineWith({ openingMm: 120 }) });
    expect(found).toMatchObject({ result: 'fitsIf', have: 53, need: 11.7 });
    expect(found.sentence).toContain('41.3 mm short');
    expect(found.sentence).toContain('common practice');
  });
  it('is not known without a thickness', () => {
    for (const id of ['z-travel', 'opening', 'reach', 'cutting-length']) {
      expect(check(id, { stockThicknessMm: undefined }).result).toBe('notKnown');
    }
    expect(check('z-travel', { stockThicknessMm: undefined, depthMm: 5 }).result).toBe('fits');
  });
});

describe('the bit', () => {
  it.each([
    ['the same within 0.02 mm', [bit({ diameterMm: 3.19 })], 'fits'],
    ['of another kind', [bit({ kind: 'down-cut' })], 'fitsIf'],
    ['smaller', [bit({ diameterMm: 3 })], 'fitsIf'],
    ['larger', [bit({ diameterMm: 3.2 })], 'doesNotFit'],
    ['less than half as large', [bit({ diameterMm: 1.5 })], 'doesNotFit'],
    ['of another shape', [bit({ kind: 'ball-nose' })], 'doesNotFit'],
    ['in an empty drawer', [], 'notKnown'],
  ] as const)('%s', (_what, bits, result) => {
    expect(check('bit', { bits }).result).toBe(result);
  });
  it('is the one that can be used, not the nearest on paper', () => {
    const short = bit({ name: 'Short', cuttingLengthMm: 8 });
    const long = bit({ name: 'Long', cuttingLengthMm: 15 });
    const longer = bit({ name: 'Longer', cuttingLengthMm: 30 });
    expect(check('bit', { bits: [short, longer, long] }).sentence).toContain('(Long)');
    expect(check('cutting-length', { bits: [short] })).toMatchObject({
      result: 'doesNotFit',
      have: 8,
      need: 12.3,
    });
  });
  it('with a 1/4 in shank goes in no 6 mm collet', () => {
    expect(check('shank', { bits: [bit({ shankMm: 6.35 })] })).toMatchObject({
      result: 'doesNotFit',
      have: '3.175 and 6',
      need: 6.35,
    });
    expect(check('shank', { bits: [bit({ shankMm: 6 })] }).result).toBe('fits');
  });
  it('leaves what hangs on it not known when there is none to use', () => {
    expect(check('shank', { bits: [] }).result).toBe('notKnown');
    expect(ask({ bits: [] }).sentence).toMatch(/^Fits your bed as drawn, but your bit drawer is empty/);
  });
});

describe('spindle, feed and plunge', () => {
  it('name the dial position nearest to the shared speed, and the feed that keeps the chip', () => {
    const dial = machineWith({ spindle: { kind: 'dial', positionsRpm: [10_000, 15_000, 20_000, 27_000] } });
    expect(check('spindle', { machine: dial }).sentence).toContain('20\u202f000 rpm (dial position 3)');
    // 1200 mm/min at 18 000 is as much a tooth as 1333.3 at 20 000.
    expect(check('feed', { machine: dial })).toMatchObject({ result: 'fitsIf', need: 1333.333333 });
    expect(check('plunge', { machine: dial })).toMatchObject({ result: 'fitsIf', need: 444.444444 });
    const exact = machineWith({ spindle: { kind: 'dial', positionsRpm: [10_000, 18_300] } });
    expect(check('spindle', { machine: exact }).result).toBe('fits');
  });
  it('keep within the spindle and the mark on the bit', () => {
    const slow = machineWith({ spindle: { kind: 'range', minRpm: 3000, maxRpm: 12_000 } });
    expect(check('spindle', { machine: slow }).sentence).toContain('12\u202f000 rpm');
    expect(check('spindle', { bits: [bit({ maxRpm: 15_000 })] }).sentence).toContain('mark on your bit');
    const fast = machineWith({ spindle: { kind: 'range', minRpm: 16_000, maxRpm: 30_000 } });
    expect(check('spindle', { machine: fast, bits: [bit({ maxRpm: 15_000 })] }).result).toBe('doesNotFit');
  });
  it('halve the feed for a bit of half the flutes', () => {
    expect(check('feed', { bits: [bit({ flutes: 1 })] })).toMatchObject({ result: 'fitsIf', need: 600 });
  });
  it('do not raise the feed for a bit of more flutes, but say that the chip is thinner', () => {
    const found = check('feed', { bits: [bit({ flutes: 3 })] });
    expect(found).toMatchObject({ result: 'fitsIf', need: 1200 });
    expect(found.sentence).toContain('thinner chip');
  });
  it('slow the spindle when the machine cannot feed so fast, as far as it goes', () => {
    const at = (maxFeedMmPerMin: number) => check('feed', { machine: machineWith({ maxFeedMmPerMin }) });
    expect(at(800).sentence).toContain('about 12\u202f000 rpm');
    expect(at(400).sentence).toContain('rubbing');
    expect(at(400).result).toBe('fitsIf');
  });
  it('ramp a bit that cannot plunge, and cap the plunge at the machine', () => {
    expect(check('plunge', { bits: [bit({ canPlunge: false })] }).sentence).toContain('ramp');
    expect(check('plunge', { machine: machineWith({ maxPlungeMmPerMin: 300 }) }).result).toBe('fitsIf');
  });
});

describe('the run time', () => {
  it('is checked only against a limit', () => {
    expect(ask({ runTimeS: 3120 }).checks.some(({ id }) => id === 'run-time')).toBe(false);
    expect(check('run-time', { runTimeS: 3120, runTimeLimitS: 3600 }).result).toBe('fits');
    expect(check('run-time', { runTimeS: 4080, runTimeLimitS: 3600 }).sentence).toContain('1 h 08');
    expect(check('run-time', { runTimeLimitS: 3600 }).result).toBe('notKnown');
  });
});
