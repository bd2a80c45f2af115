import type { FindingLevel } from '#shared/api/vocabulary.ts';

/** What the levels of a finding are called, and the ink of the word; the word alone carries the meaning. */
export const findingLevelLabels: Readonly<Record<FindingLevel, string>> = {
  note: 'note',
  caution: 'caution',
  'do-not-cut': 'do not cut',
};

export const findingLevelInk: Readonly<Record<FindingLevel, string>> = {
  note: 'text-ink-soft',
  caution: 'text-ochre-ink',
  'do-not-cut': 'text-brick',
};
