import type { FitContext } from './check.ts';

/** Thickness of what will lie on the bed, in mm: the member's sheet, else that of the shared cut. */
export const thicknessMm = ({ stock, stockThicknessMm }: FitContext): number | undefined =>
  stock?.thicknessMm ?? stockThicknessMm;

/** The deepest cut in mm, overcut and all; through the stock when no depth is named. */
export const cutDepthMm = (context: FitContext): number | undefined => {
  const thickness = thicknessMm(context);
  if (context.depthMm !== undefined) return context.depthMm;
  return thickness === undefined ? undefined : thickness + context.practice.overcutMm.value;
};
