import type { BitUsed } from '../api/cuts.ts';
import type { MaterialFamily } from '../api/vocabulary.ts';

// Every number in this file is label P: common practice, no published source. A club may come to set its own.

/** Least and greatest chip load in mm a tooth. */
export interface ChipLoadRange {
  readonly leastMm: number;
  readonly mostMm: number;
}

/** Upper ends of the diameter bands in mm; a bit belongs to the first band that it is not larger than. */
export const diameterBandsMm = [1, 2, 4, 7, 11, Number.POSITIVE_INFINITY] as const;

type PerBand<Value> = readonly [Value, Value, Value, Value, Value, Value];
const range = (leastMm: number, mostMm: number): ChipLoadRange => ({ leastMm, mostMm });

/** Bits up to 1 mm, as for engraving and circuit boards: a few hundredths of a millimetre break them; P. */
const TINY = range(0.002, 0.02);

/** Chip load in mm a tooth by family and diameter band; P, common practice, no published source. */
const chipLoads: Readonly<Record<MaterialFamily, PerBand<ChipLoadRange>>> = {
  softwood: [
    TINY,
    range(0.012, 0.06),
    range(0.025, 0.13),
    range(0.04, 0.26),
    range(0.06, 0.4),
    range(0.08, 0.5),
  ],
  hardwood: [
    TINY,
    range(0.01, 0.05),
    range(0.02, 0.1),
    range(0.03, 0.2),
    range(0.05, 0.32),
    range(0.06, 0.4),
  ],
  plywood: [
    TINY,
    range(0.012, 0.06),
    range(0.025, 0.13),
    range(0.04, 0.26),
    range(0.06, 0.4),
    range(0.08, 0.5),
  ],
  mdf: [TINY, range(0.012, 0.07), range(0.025, 0.15), range(0.04, 0.3), range(0.06, 0.45), range(0.08, 0.6)],
  acrylic: [
    TINY,
    range(0.012, 0.06),
    range(0.025, 0.1),
    range(0.05, 0.2),
    range(0.08, 0.28),
    range(0.1, 0.35),
  ],
  'soft-plastic': [
    TINY,
    range(0.015, 0.07),
    range(0.03, 0.15),
    range(0.05, 0.3),
    range(0.08, 0.4),
    range(0.1, 0.5),
  ],
  aluminium: [
    range(0.001, 0.01),
    range(0.003, 0.02),
    range(0.006, 0.04),
    range(0.012, 0.07),
    range(0.02, 0.1),
    range(0.025, 0.12),
  ],
};

/** Greatest depth of one pass as a share of the diameter, by family and band; P, no published source. */
const depthShares: Readonly<Record<MaterialFamily, PerBand<number>>> = {
  softwood: [0.75, 0.75, 1, 1, 1, 1],
  hardwood: [0.5, 0.5, 0.75, 0.75, 0.75, 0.75],
  plywood: [0.75, 0.75, 1, 1, 1, 1],
  mdf: [0.75, 0.75, 1, 1, 1, 1],
  acrylic: [0.5, 0.5, 0.75, 0.75, 0.75, 0.75],
  'soft-plastic': [0.75, 0.75, 1, 1, 1, 1],
  aluminium: [0.15, 0.15, 0.25, 0.25, 0.25, 0.25],
};

/** A surfacing bit takes a skin off: its pass is at most this share of its diameter; P, no published source. */
const SURFACING_DEPTH_SHARE = 0.15;
/** A surfacing bit is wide and skims: light machines feed it far slower for its width and it cuts well; P. */
const SURFACING_LEAST_SHARE = 0.25;
/** A V cuts over its cone, at half its diameter in the middle; P, no published source. */
const V_BIT_SHARE = 0.5;

type Bit = Pick<BitUsed, 'diameterMm' | 'kind'>;

const bandOf = (diameterMm: number) => diameterBandsMm.findIndex((upToMm) => diameterMm <= upToMm);

const inBand = <Value>(perBand: PerBand<Value>, diameterMm: number): Value =>
  perBand[bandOf(diameterMm)] ?? perBand[5];

/** The usual chip load of a bit in a material, mm a tooth. P: common practice, no published source. */
export const chipLoadRange = (family: MaterialFamily, { diameterMm, kind }: Bit): ChipLoadRange => {
  const { leastMm, mostMm } = inBand(
    chipLoads[family],
    kind === 'v-bit' ? diameterMm * V_BIT_SHARE : diameterMm,
  );
  return { leastMm: kind === 'surfacing' ? leastMm * SURFACING_LEAST_SHARE : leastMm, mostMm };
};

/** The greatest usual depth of one pass in mm. P: common practice, no published source. */
export const depthOfCutCapMm = (family: MaterialFamily, { diameterMm, kind }: Bit): number => {
  const share = inBand(depthShares[family], diameterMm);
  return diameterMm * (kind === 'surfacing' ? Math.min(share, SURFACING_DEPTH_SHARE) : share);
};
