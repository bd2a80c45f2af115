import type { Inspection } from '#shared/api/drawings.ts';
import type { DrawingRefusal } from '#shared/drawing/types.ts';

/** All that the server keeps or shows of a drawing, worked out in one go. */
export interface ReadDrawing {
  readonly inspection: Inspection;
  /** Simplified path data for cards, at most 4 kB. */
  readonly outline: string;
  /** The drawing written anew in true millimetres. */
  readonly cleanSvg: string;
  /** The geometry as text, the same for the same geometry: what a geometry hash is taken of. */
  readonly geometryText: string;
}

export type AnalysisResult =
  | { readonly ok: true; readonly read: ReadDrawing }
  | { readonly ok: false; readonly refusal: DrawingRefusal };

export interface ReadOptions {
  readonly title?: string | undefined;
  /** Millimetres per user unit as stated by the member. */
  readonly millimetresPerUnit?: number | undefined;
}
