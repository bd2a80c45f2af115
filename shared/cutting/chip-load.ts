import type { BitUsed, Settings } from '../api/cuts.ts';

/** Feed per tooth in mm: fz = vf / (n z), vf in mm/min and n in rev/min. Source: any machining text (C). */
export const chipLoadMm = (
  bit: Pick<BitUsed, 'flutes'>,
  settings: Pick<Settings, 'spindleRpm' | 'feedMmPerMin'>,
): number => settings.feedMmPerMin / (settings.spindleRpm * bit.flutes);
