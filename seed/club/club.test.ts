import { describe, expect, it } from 'vitest';
import { sheets } from '#seed/drawings/all.ts';
import { bits } from './bits.ts';
import { cuts } from './cuts.ts';
import { designs } from './designs.ts';
import { remixes, revisions } from './lineage.ts';
import { machines } from './machines.ts';
import { members } from './people.ts';
import type { CutTold, MemberKey, SeedMachine } from './types.ts';

interface NamedCut {
  readonly label: string;
  readonly design: string;
  readonly member: MemberKey;
  readonly cut: CutTold;
}

const allCuts: readonly NamedCut[] = [
  ...designs.flatMap(({ key, owner, cut }) =>
    cut ? [{ label: `first cut of ${key}`, design: key, member: owner, cut }] : [],
  ),
  ...cuts.map((cut) => ({
    label: `${cut.design} by ${cut.member} on ${cut.cutOn}`,
    design: cut.design,
    member: cut.member,
    cut,
  })),
];

const ascending = (values: readonly string[]) => [...values].sort();

/** Turns the box of the part by whole degrees: a plain search, so that it owes nothing to the fit report. */
function fitsSomehow(widthMm: number, heightMm: number, machine: SeedMachine): boolean {
  const { left, right, front, back } = machine.marginMm;
  const roomX = machine.bedXMm - left - right;
  const roomY = machine.bedYMm - front - back - machine.clampStripMm;
  return Array.from({ length: 91 }, (_, degrees) => (degrees * Math.PI) / 180).some(
    (turn) =>
      widthMm * Math.cos(turn) + heightMm * Math.sin(turn) <= roomX &&
      widthMm * Math.sin(turn) + heightMm * Math.cos(turn) <= roomY,
  );
}

describe('the members', () => {
  it('are those of the contract, with a role each, and three more', () => {
    expect(members.slice(0, 4).map(({ email, role }) => [email, role])).toEqual([
      ['ada@millrace.example', 'administrator'],
      ['moss@millrace.example', 'moderator'],
      ['wren@millrace.example', 'member'],
      ['tarn@millrace.example', 'member'],
    ]);
    expect(new Set(members.map(({ email }) => email)).size).toBe(7);
    expect(members.slice(4).every(({ role }) => role === 'member')).toBe(true);
  });

  it('have a machine and bits each, no name twice', () => {
    for (const { key } of members) {
      expect(machines.some(({ owner }) => owner === key)).toBe(true);
      expect(bits.filter(({ owner }) => owner === key).length).toBeGreaterThanOrEqual(3);
    }
    for (const bench of [machines, bits]) {
      expect(new Set(bench.map(({ owner, name }) => `${owner} ${name}`)).size).toBe(bench.length);
    }
  });

  it('can clamp every bit in one of their collets', () => {
    for (const bit of bits) {
      const collets = machines
        .filter(({ owner }) => owner === bit.owner)
        .flatMap(({ colletsMm }) => colletsMm);
      expect(collets, `${bit.owner}: ${bit.name}`).toContain(bit.shankMm);
    }
  });
});

describe('the designs', () => {
  it('have one drawing each, and each drawing its design', () => {
    const drawn = [...designs, ...remixes].map(({ key }) => key).concat(revisions.map(({ sheet }) => sheet));
    expect(ascending(drawn)).toEqual(ascending(sheets.map(({ key }) => key)));
  });

  it('stand in the order they were published, over 18 months before 2026-12-01', () => {
    const dates = designs.map(({ publishedAt }) => publishedAt);
    expect(dates).toEqual(ascending(dates));
    expect(dates.every((date) => new Date(date).toISOString() === date.replace('Z', '.000Z'))).toBe(true);
    expect(dates.at(0)! >= '2025-06-01').toBe(true);
    expect(dates.at(-1)! < '2026-12-01').toBe(true);
  });

  it('use the kinds and licences of the contract', () => {
    const kinds = [
      'bit-trays',
      'hold-downs',
      'jigs-and-stops',
      'gauges',
      'shop-storage',
      'dust-and-safety',
      'boxes',
      'signs-and-lettering',
      'other',
    ];
    const licences = [
      'CC0-1.0',
      'CC-BY-4.0',
      'CC-BY-SA-4.0',
      'CC-BY-NC-4.0',
      'CC-BY-NC-SA-4.0',
      'CC-BY-ND-4.0',
      'CERN-OHL-P-2.0',
    ];
    expect(ascending([...new Set(designs.map(({ kind }) => kind))])).toEqual(ascending(kinds));
    expect(ascending([...new Set(designs.map(({ licence }) => licence))])).toEqual(ascending(licences));
    expect(designs.every(({ owner }) => members.some(({ key }) => key === owner))).toBe(true);
    expect(designs.every(({ tags }) => tags.length >= 2)).toBe(true);
  });

  it('leave three or four uncut and state a scale exactly where the file has no physical unit', () => {
    expect(designs.filter(({ cut }) => !cut).length).toBeGreaterThanOrEqual(3);
    expect(designs.filter(({ cut }) => !cut).length).toBeLessThanOrEqual(4);
    const withoutUnit = sheets
      .filter(({ unit }) => unit === 'px' || unit === 'bare-90')
      .map(({ key }) => key);
    const stated = designs.filter(({ scale }) => scale).map(({ key }) => key);
    expect(ascending(stated)).toEqual(ascending(withoutUnit));
  });
});

describe.each(allCuts)('$label', ({ design, member, cut }) => {
  const machine = machines.find(({ owner, name }) => owner === member && name === cut.machine);
  const bit = bits.find(
    ({ owner, diameterMm, flutes, kind }) =>
      owner === member &&
      diameterMm === cut.bit.diameterMm &&
      flutes === cut.bit.flutes &&
      kind === cut.bit.kind,
  );
  const sheet = sheets.find(({ key }) => key === design);

  it('is on a machine and with a bit of that member, the part within the bed', () => {
    if (!machine || !bit || !sheet) throw new Error('no such machine, bit or drawing');
    expect(bit.cuttingLengthMm).toBeGreaterThanOrEqual(cut.stockThicknessMm + 0.3);
    expect(
      fitsSomehow(sheet.widthMm + cut.bit.diameterMm, sheet.heightMm + cut.bit.diameterMm, machine),
    ).toBe(true);
  });

  it('has settings that the machine can run and a hobby member would', () => {
    if (!machine || !bit) throw new Error('no such machine or bit');
    const { spindleRpm, feedMmPerMin, plungeMmPerMin, depthOfCutMm, stepoverMm } = cut.settings;
    if (machine.spindle.kind === 'dial') expect(machine.spindle.positionsRpm).toContain(spindleRpm);
    else {
      expect(spindleRpm).toBeGreaterThanOrEqual(machine.spindle.minRpm);
      expect(spindleRpm).toBeLessThanOrEqual(machine.spindle.maxRpm);
    }
    expect(spindleRpm).toBeLessThanOrEqual(bit.maxRpm ?? Number.POSITIVE_INFINITY);
    expect(feedMmPerMin).toBeLessThanOrEqual(machine.maxFeedMmPerMin);
    expect(plungeMmPerMin).toBeLessThanOrEqual(machine.maxPlungeMmPerMin);
    expect(depthOfCutMm).toBeLessThanOrEqual(bit.diameterMm);
    expect(stepoverMm).toBeLessThanOrEqual(bit.diameterMm / 2);
    // P: between a hundredth and an eighth of a millimetre a tooth, whether it went well or not.
    const chipLoadMm = feedMmPerMin / (spindleRpm * bit.flutes);
    expect(chipLoadMm).toBeGreaterThan(0.01);
    expect(chipLoadMm).toBeLessThan(0.125);
  });
});

describe('the cut records', () => {
  it('are about forty, in order, each after its design was published', () => {
    expect(cuts.length).toBeGreaterThanOrEqual(40);
    expect(cuts.map(({ cutOn }) => cutOn)).toEqual(ascending(cuts.map(({ cutOn }) => cutOn)));
    for (const { design, cutOn, inService } of cuts) {
      const published = designs.find(({ key }) => key === design)?.publishedAt ?? '9999';
      expect(cutOn > published.slice(0, 10), `${design} ${cutOn}`).toBe(true);
      expect(cutOn < '2026-12-01').toBe(true);
      expect(inService === undefined || inService.notedOn > cutOn).toBe(true);
    }
  });

  it('say what went wrong wherever they failed', () => {
    const failed = cuts.filter(({ outcome }) => outcome === 'failed');
    expect(failed.length).toBeGreaterThanOrEqual(12);
    expect(failed.filter(({ wentWrong }) => !wentWrong?.length)).toEqual([]);
    expect(cuts.filter(({ outcome, wentWrong }) => outcome === 'clean' && wentWrong)).toEqual([]);
  });

  it('tell of every hazard once at least, and of two members or more for a dozen designs', () => {
    const told = new Set(cuts.flatMap(({ wentWrong }) => wentWrong ?? []));
    for (const hazard of ['part-came-loose', 'bit-broke', 'fire-or-smoke', 'unexpected-motion'] as const) {
      expect(told.has(hazard)).toBe(true);
    }
    const uncut = new Set(designs.filter(({ cut }) => !cut).map(({ key }) => key));
    expect(cuts.filter(({ design }) => uncut.has(design))).toEqual([]);
    const wellCut = designs.filter(
      ({ key }) => new Set(cuts.filter(({ design }) => design === key).map(({ member }) => member)).size >= 2,
    );
    expect(wellCut.length).toBeGreaterThanOrEqual(12);
  });
});
