import type { Bit, Machine } from '#shared/api/bench.ts';
import type { BitUsed, Settings } from '#shared/api/cuts.ts';
import type { Point } from '#shared/drawing/types.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import type { FitPractice } from './practice.ts';

/** The room of a bed: what fitting an outline on it needs. */
export type FitBed = Pick<Machine, 'bedXMm' | 'bedYMm' | 'marginMm' | 'clampStripMm'>;

export type FitMachine = FitBed &
  Pick<
    Machine,
    'zTravelMm' | 'openingMm' | 'maxFeedMmPerMin' | 'maxPlungeMmPerMin' | 'spindle' | 'colletsMm'
  >;

export type FitBit = Pick<
  Bit,
  'name' | 'kind' | 'diameterMm' | 'shankMm' | 'flutes' | 'cuttingLengthMm' | 'canPlunge' | 'maxRpm'
>;

export interface FitStock {
  readonly lengthMm: number;
  readonly widthMm: number;
  readonly thicknessMm: number;
}

/** What is asked: a drawing with what is known of its cut, and the bench it should be cut on. */
export interface FitInput {
  readonly hullMm: readonly Point[];
  /** Bit, settings and stock thickness of the shared cut; absent while nobody has cut it. */
  readonly bit?: BitUsed | undefined;
  readonly settings?: Settings | undefined;
  readonly stockThicknessMm?: number | undefined;
  /** The deepest cut, overcut and all; absent: through the stock, which is the deepest it can be. */
  readonly depthMm?: number | undefined;
  readonly runTimeS?: number | undefined;
  readonly machine: FitMachine;
  readonly bits: readonly FitBit[];
  /** The member's own sheet, when one is named. */
  readonly stock?: FitStock | undefined;
  /** The longest the member wants to run, when they said so. */
  readonly runTimeLimitS?: number | undefined;
  /** Units of the sentences; figures are in mm always. */
  readonly units?: UnitSystem | undefined;
  readonly practice?: FitPractice | undefined;
}
