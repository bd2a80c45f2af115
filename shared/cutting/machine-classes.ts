import type { MachineClass } from '../api/vocabulary.ts';

type DefaultSpindle =
  | { readonly kind: 'range'; readonly minRpm: number; readonly maxRpm: number }
  | { readonly kind: 'dial'; readonly positionsRpm: readonly number[] };

/** What a machine of a class usually is. Stands in for what its owner has not measured, and is named as such. */
export interface MachineClassDefaults {
  /** Typical only: a bed is always typed by its owner, since every drawing is judged against it. */
  readonly typicalBedXMm: number;
  readonly typicalBedYMm: number;
  readonly zTravelMm: number;
  /** Free height under the collet with Z at the top. */
  readonly openingMm: number;
  readonly maxFeedMmPerMin: number;
  readonly maxPlungeMmPerMin: number;
  readonly rapidMmPerMin: number;
  readonly accelerationMmPerS2: number;
  readonly spindle: DefaultSpindle;
  readonly spindlePowerW: number;
  readonly colletsMm: readonly number[];
}

/**
 * Class defaults, in mm, mm/min, mm/s², rev/min and W. Source: P, common practice of the trade without a
 * published table, every value of it. Speeds and accelerations are at the careful end of what the class
 * does, so that a run time is rather over- than understated; 3.175 and 6.35 mm are 1/8 and 1/4 in.
 */
export const machineClassDefaults: Readonly<Record<MachineClass, MachineClassDefaults>> = {
  'small-desktop': {
    typicalBedXMm: 300,
    typicalBedYMm: 180,
    zTravelMm: 45,
    openingMm: 65,
    maxFeedMmPerMin: 1500,
    maxPlungeMmPerMin: 400,
    rapidMmPerMin: 2000,
    accelerationMmPerS2: 150,
    spindle: { kind: 'range', minRpm: 5000, maxRpm: 12_000 },
    spindlePowerW: 300,
    colletsMm: [3.175],
  },
  'belt-gantry': {
    typicalBedXMm: 750,
    typicalBedYMm: 750,
    zTravelMm: 70,
    openingMm: 90,
    maxFeedMmPerMin: 4000,
    maxPlungeMmPerMin: 800,
    rapidMmPerMin: 5000,
    accelerationMmPerS2: 300,
    spindle: { kind: 'dial', positionsRpm: [10_000, 14_000, 18_000, 22_000, 26_000, 30_000] },
    spindlePowerW: 700,
    colletsMm: [3.175, 6.35],
  },
  'screw-gantry': {
    typicalBedXMm: 800,
    typicalBedYMm: 600,
    zTravelMm: 100,
    openingMm: 120,
    maxFeedMmPerMin: 5000,
    maxPlungeMmPerMin: 1500,
    rapidMmPerMin: 6000,
    accelerationMmPerS2: 350,
    spindle: { kind: 'range', minRpm: 8000, maxRpm: 24_000 },
    spindlePowerW: 1500,
    colletsMm: [3.175, 6.35],
  },
  floor: {
    typicalBedXMm: 1250,
    typicalBedYMm: 900,
    zTravelMm: 150,
    openingMm: 180,
    maxFeedMmPerMin: 10_000,
    maxPlungeMmPerMin: 3000,
    rapidMmPerMin: 15_000,
    accelerationMmPerS2: 700,
    spindle: { kind: 'range', minRpm: 8000, maxRpm: 24_000 },
    spindlePowerW: 2200,
    colletsMm: [3.175, 6.35, 12.7],
  },
};

/** The acceleration to reckon with in mm/s², and whether it is the class default (P) for want of the owner's. */
export const accelerationOf = (machine: {
  readonly class: MachineClass;
  readonly accelerationMmPerS2?: number | undefined;
}): { readonly mmPerS2: number; readonly isClassDefault: boolean } =>
  machine.accelerationMmPerS2 === undefined
    ? { mmPerS2: machineClassDefaults[machine.class].accelerationMmPerS2, isClassDefault: true }
    : { mmPerS2: machine.accelerationMmPerS2, isClassDefault: false };
