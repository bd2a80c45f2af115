/** A value the trade goes by without a published source (label P); a club may set its own. */
export interface PracticeValue {
  readonly value: number;
  readonly unit: string;
  readonly words: string;
}

/** Every such value of the fit report, in one table. */
export const fitPractice = {
  overcutMm: { value: 0.3, unit: 'mm', words: 'a through cut goes this far below the stock' },
  clampTopMm: { value: 10, unit: 'mm', words: 'clamps stand this high above the stock' },
  clearanceMm: { value: 5, unit: 'mm', words: 'the bit travels this far above what it must clear' },
  spoilboardMm: { value: 12, unit: 'mm', words: 'thickness of the spoilboard' },
  leastSheetMm: { value: 3, unit: 'mm', words: 'the thinnest sheet that still saves the bed' },
  beyondFlutesMm: {
    value: 2,
    unit: 'mm',
    words: 'the bit stands out of the collet this far beyond its flutes',
  },
  sameThicknessMm: { value: 0.3, unit: 'mm', words: 'two sheets within this are cut alike' },
  colletMm: { value: 0.05, unit: 'mm', words: 'a collet holds a shank within this of its size' },
  sameSpeedShare: { value: 0.02, unit: '', words: 'speeds and feeds within this share are the same' },
  leastBitShare: {
    value: 0.5,
    unit: '',
    words: 'settings are not carried to a bit smaller than this share of the diameter',
  },
} as const satisfies Readonly<Record<string, PracticeValue>>;

export type FitPractice = { readonly [Name in keyof typeof fitPractice]: PracticeValue };

/** Two bit diameters are the same size within this, in mm (as in the search for a bit size). */
export const SAME_BIT_MM = 0.02;
/** Sizes may be over by this before they do not fit, in mm. */
export const FIT_TOLERANCE_MM = 0.01;
