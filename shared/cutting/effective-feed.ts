import type { Settings } from '../api/cuts.ts';

/**
 * The feed in mm/min that the machine ran at: the feed as set times the override the member ended with, in percent.
 * Without an override it is the feed as set. Source: meaning of a feed override on any controller (C).
 */
export const effectiveFeedMmPerMin = (
  { feedMmPerMin }: Pick<Settings, 'feedMmPerMin'>,
  overridePercent?: number | null,
): number => (feedMmPerMin * (overridePercent ?? 100)) / 100;
