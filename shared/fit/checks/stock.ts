import { convexHull } from '#shared/geometry/convex-hull.ts';
import { extentsAsDrawn } from '#shared/geometry/turned-extents.ts';
import { turnToFit } from '#shared/geometry/turns-that-fit.ts';
import { asSentence, type Check, type FitContext } from '../check.ts';
import type { FitStock } from '../fit-input.ts';
import { FIT_TOLERANCE_MM } from '../practice.ts';
import { figure, sidesMm } from '../wording.ts';
import { turnWords } from './bed.ts';

/** Is the member's sheet long and wide enough, with a bit's width round the part? */
export const checkStock = ({ hullMm, bit, wording }: FitContext, stock: FitStock): Check => {
  const bitMm = bit?.diameterMm ?? 0;
  const turnDeg = turnToFit(
    convexHull(hullMm),
    stock.lengthMm - bitMm,
    stock.widthMm - bitMm,
    FIT_TOLERANCE_MM,
  );
  const drawn = extentsAsDrawn(hullMm);
  const need = [drawn.widthMm + bitMm, drawn.heightMm + bitMm] as const;
  const sheet = `your ${wording.size(stock.lengthMm, stock.widthMm)} stock`;
  const clause =
    turnDeg === null
      ? `${sheet} is too small for the ${wording.size(...need)} it takes`
      : `${sheet} holds it ${turnWords(turnDeg)}`;
  return {
    id: 'stock',
    result: turnDeg === null ? 'doesNotFit' : 'fits',
    have: sidesMm(stock.lengthMm, stock.widthMm),
    need: sidesMm(...need),
    unit: 'mm',
    sentence: asSentence(clause),
    clause,
  };
};

/** Is the member's sheet as thick as the one that was cut? Slots for the sheet depend on it. */
export const checkStockThickness = (
  { practice, wording }: FitContext,
  stock: FitStock,
  cutInMm: number,
): Check => {
  const same = Math.abs(stock.thicknessMm - cutInMm) <= practice.sameThicknessMm.value + 1e-9;
  const clause = same
    ? `your stock is as thick as the one that was cut, ${wording.length(cutInMm)}`
    : `your stock measures ${wording.length(stock.thicknessMm)} where ${wording.length(cutInMm)} was cut: set depths, and slots that hold a sheet, from yours`;
  return {
    id: 'stock-thickness',
    result: same ? 'fits' : 'fitsIf',
    have: figure(stock.thicknessMm),
    need: figure(cutInMm),
    unit: 'mm',
    sentence: asSentence(clause),
    clause,
  };
};
