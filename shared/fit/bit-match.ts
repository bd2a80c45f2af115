import type { BitUsed } from '#shared/api/cuts.ts';
import type { BitKind, FitResult } from '#shared/api/vocabulary.ts';
import type { FitBit } from './fit-input.ts';
import { SAME_BIT_MM } from './practice.ts';

/** How near an owned bit comes to the bit of the shared cut, nearest first. */
export const bitMatches = ['same', 'other-kind', 'smaller', 'much-smaller', 'larger', 'unlike'] as const;
export type BitMatch = (typeof bitMatches)[number];

/** Bits that leave the same flat floor and square wall can stand in for each other. */
const squareEnded: ReadonlySet<BitKind> = new Set(['up-cut', 'down-cut', 'compression', 'straight']);

export const matchBit = (used: BitUsed, owned: FitBit, leastShare: number): BitMatch => {
  const sameKind = used.kind === owned.kind;
  if (!sameKind && !(squareEnded.has(used.kind) && squareEnded.has(owned.kind))) return 'unlike';
  const widerMm = owned.diameterMm - used.diameterMm;
  if (Math.abs(widerMm) <= SAME_BIT_MM + 1e-9) return sameKind ? 'same' : 'other-kind';
  if (widerMm > 0) return 'larger';
  return owned.diameterMm >= leastShare * used.diameterMm ? 'smaller' : 'much-smaller';
};

/** What a match means for the report: a smaller bit enters wherever the other did, a larger may not. */
export const matchResult = (match: BitMatch): FitResult => {
  if (match === 'same') return 'fits';
  return match === 'other-kind' || match === 'smaller' ? 'fitsIf' : 'doesNotFit';
};
