/** Sizes of the font that em and rem refer to, in CSS pixels (user units). */
export interface FontSizes {
  readonly sizePx: number;
  readonly rootSizePx: number;
  /** False once a font size could not be read: lengths in em are then a guess. */
  readonly isKnown: boolean;
}

/** `medium` of CSS Fonts as browsers take it: 16 px. */
export const INITIAL_FONT: FontSizes = { sizePx: 16, rootSizePx: 16, isKnown: true };
