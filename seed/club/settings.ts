import type { CutSettings } from './types.ts';

/** Settings in the order they are typed at the machine: rev/min, mm/min, mm/min, mm, mm. */
export const settings = (
  spindleRpm: number,
  feedMmPerMin: number,
  plungeMmPerMin: number,
  depthOfCutMm: number,
  stepoverMm: number,
): CutSettings => ({ spindleRpm, feedMmPerMin, plungeMmPerMin, depthOfCutMm, stepoverMm });
