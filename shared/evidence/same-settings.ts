import type { BitUsed, Settings } from '#shared/api/cuts.ts';
import { chipLoadMm } from '#shared/cutting/chip-load.ts';
import { effectiveFeedMmPerMin } from '#shared/cutting/effective-feed.ts';

/** Settings with the bit they were used with. */
export interface SettingsUsed {
  readonly bit: Pick<BitUsed, 'diameterMm' | 'flutes'>;
  readonly settings: Pick<Settings, 'spindleRpm' | 'feedMmPerMin' | 'depthOfCutMm'>;
  /** Feed override that the member ended with; absent: the feed as set. */
  readonly overridePercent?: number | null;
}

/** Two diameters are the same bit size within this, in mm. */
export const SAME_DIAMETER_MM = 0.02;
const SAME_SHARE = 0.15;

/** Of the feed that was really cut with: an override counts. */
const chipLoadCutMm = ({ bit, settings, overridePercent }: SettingsUsed): number =>
  chipLoadMm(bit, { ...settings, feedMmPerMin: effectiveFeedMmPerMin(settings, overridePercent) });

const depthPerDiameter = ({ bit, settings }: SettingsUsed): number => settings.depthOfCutMm / bit.diameterMm;

/** Measured against the smaller of the two, so that the answer is the same both ways round. */
const close = (a: number, b: number): boolean => Math.abs(a - b) <= SAME_SHARE * Math.min(a, b) * (1 + 1e-12);

/**
 * True when evidence for one of two settings counts for the other: same bit diameter and flutes, chip
 * load and depth per diameter within 15 %.
 */
export const sameSettings = (a: SettingsUsed, b: SettingsUsed): boolean =>
  Math.abs(a.bit.diameterMm - b.bit.diameterMm) <= SAME_DIAMETER_MM + 1e-9 &&
  a.bit.flutes === b.bit.flutes &&
  close(chipLoadCutMm(a), chipLoadCutMm(b)) &&
  close(depthPerDiameter(a), depthPerDiameter(b));
