import type { FitResult } from '#shared/api/vocabulary.ts';

/** The ink of words about a fit; their mark says the same without colour. */
export const fitInk: Readonly<Record<FitResult, string>> = {
  fits: 'text-pine',
  fitsIf: 'text-ochre-ink',
  doesNotFit: 'text-brick',
  notKnown: 'text-ink-soft',
};
