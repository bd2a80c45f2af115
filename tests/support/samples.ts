import type { BitCreate, MachineCreate } from '#shared/api/bench.ts';
import type { DesignDetails } from '#shared/api/designs.ts';

/** A small machine that is right in every field; tests change what they are about. */
export const machineOf = (change: Partial<MachineCreate> = {}): MachineCreate => ({
  name: 'Shed router',
  class: 'small-desktop',
  bedXMm: 300,
  bedYMm: 180,
  marginMm: { left: 4, right: 4, front: 4, back: 4 },
  clampStripMm: 0,
  zTravelMm: 45,
  openingMm: 80,
  maxFeedMmPerMin: 3000,
  maxPlungeMmPerMin: 1000,
  rapidMmPerMin: 4000,
  spindle: { kind: 'dial', positionsRpm: [10_000, 16_000, 22_000, 30_000] },
  spindlePowerW: 700,
  colletsMm: [3.175, 6.35],
  ...change,
});

export const bitOf = (change: Partial<BitCreate> = {}): BitCreate => ({
  name: '1/8 in up-cut',
  kind: 'up-cut',
  diameterMm: 3.175,
  shankMm: 3.175,
  flutes: 2,
  cuttingLengthMm: 22,
  canPlunge: true,
  ...change,
});

export const cutOf = (machineId: string, change: Partial<NonNullable<DesignDetails['cut']>> = {}) => ({
  machineId,
  bit: { diameterMm: 3.175, flutes: 2, kind: 'up-cut' as const },
  materialId: 'mdf' as const,
  stockThicknessMm: 12,
  settings: {
    spindleRpm: 16_000,
    feedMmPerMin: 1200,
    plungeMmPerMin: 400,
    depthOfCutMm: 1.5,
    stepoverMm: 1.2,
  },
  holdDown: 'tape' as const,
  outcome: 'clean' as const,
  runTimeS: 1800,
  ...change,
});

export const detailsOf = (change: Partial<DesignDetails> = {}): DesignDetails => ({
  title: 'Square corner stop',
  summary: 'Sits in the corner of the bed.',
  kind: 'jigs-and-stops',
  licence: 'CC-BY-SA-4.0',
  tags: ['corner', 'stop'],
  ...change,
});

/** A plate with one hole, 120 × 80 mm. */
export const plateSvg = (widthMm = 120, heightMm = 80) =>
  `<svg xmlns="http://www.w3.org/2000/svg" width="${widthMm}mm" height="${heightMm}mm" viewBox="0 0 ${widthMm} ${heightMm}">
  <g id="outside"><rect x="0" y="0" width="${widthMm}" height="${heightMm}" rx="5" fill="none" stroke="black"/></g>
  <g id="hole"><circle cx="20" cy="20" r="3" fill="none" stroke="black"/></g>
</svg>`;
