import type { FitCheck } from '#shared/api/fit.ts';
import type { FitResult } from '#shared/api/vocabulary.ts';
import type { FitInput } from './fit-input.ts';
import type { FitPractice } from './practice.ts';
import type { Wording } from './wording.ts';

/** One answer, with the words it lends the verdict. */
export interface Check extends FitCheck {
  /** Follows "but" or "and" in the verdict; empty when another check already says it. */
  readonly clause: string;
}

/** What every check is given beside the question itself. */
export interface FitContext extends FitInput {
  readonly wording: Wording;
  readonly practice: FitPractice;
}

/** Worst first. A certain no outweighs a condition, and a condition what is not known. */
export const worstFirst: readonly FitResult[] = ['doesNotFit', 'fitsIf', 'notKnown', 'fits'];

/** 0 for a fit, more the worse it is. */
export const severity = (result: FitResult): number => worstFirst.length - 1 - worstFirst.indexOf(result);

/** A clause made a sentence of its own. */
export const asSentence = (clause: string): string => `${clause.charAt(0).toUpperCase()}${clause.slice(1)}.`;

/** A check that cannot be answered yet. */
export const notKnown = (id: string, unit: string, why: string, clause = ''): Check => ({
  id,
  result: 'notKnown',
  have: null,
  need: null,
  unit,
  sentence: asSentence(why),
  clause,
});
