import type { Step } from './outline.ts';

/** One thing drawn on a demo sheet. Sizes in mm, y down, before the file's own unit is applied. */
export type SheetShape =
  | { readonly kind: 'circle'; readonly xMm: number; readonly yMm: number; readonly diameterMm: number }
  | {
      readonly kind: 'ellipse';
      readonly xMm: number;
      readonly yMm: number;
      readonly widthMm: number;
      readonly heightMm: number;
    }
  | {
      readonly kind: 'rect';
      readonly xMm: number;
      readonly yMm: number;
      readonly widthMm: number;
      readonly heightMm: number;
      readonly cornerMm: number;
    }
  | {
      readonly kind: 'line';
      readonly x1Mm: number;
      readonly y1Mm: number;
      readonly x2Mm: number;
      readonly y2Mm: number;
    }
  | { readonly kind: 'polygon'; readonly points: readonly (readonly [number, number])[] }
  | { readonly kind: 'path'; readonly steps: readonly Step[] }
  | {
      readonly kind: 'use';
      readonly id: string;
      readonly xMm: number;
      readonly yMm: number;
      readonly turnedDeg?: number;
    };

/** Everything cut by one operation; its name becomes the group's id and title. */
export interface SheetLayer {
  readonly name: string;
  readonly shapes: readonly SheetShape[];
  /** Written as a translate on the group, for files that were moved rather than redrawn. */
  readonly movedMm?: readonly [number, number];
  readonly mirroredAboutXMm?: number;
}

/** The unit a member's drawing program wrote; svg.ts knows what each means. */
export type FileUnit = 'mm' | 'cm' | 'in' | 'pt' | 'px' | 'bare-90';

/** A demo drawing as data: `writeSvg` turns it into the file a member would have uploaded. */
export interface Sheet {
  readonly key: string;
  /** Extents of the geometry, not of the page. */
  readonly widthMm: number;
  readonly heightMm: number;
  readonly layers: readonly SheetLayer[];
  readonly unit?: FileUnit;
  /** Empty page around the part; the part's corner stays at 0, 0. */
  readonly borderMm?: number;
  readonly relativePaths?: boolean;
  readonly paintByClass?: boolean;
  /** Shapes drawn once under `defs` and placed by `use`. */
  readonly reused?: readonly { readonly id: string; readonly shape: SheetShape }[];
}

export const circle = (xMm: number, yMm: number, diameterMm: number): SheetShape => ({
  kind: 'circle',
  xMm,
  yMm,
  diameterMm,
});

export const ellipse = (xMm: number, yMm: number, widthMm: number, heightMm: number): SheetShape => ({
  kind: 'ellipse',
  xMm,
  yMm,
  widthMm,
  heightMm,
});

export const rect = (
  xMm: number,
  yMm: number,
  widthMm: number,
  heightMm: number,
  cornerMm = 0,
): SheetShape => ({ kind: 'rect', xMm, yMm, widthMm, heightMm, cornerMm });

export const line = (x1Mm: number, y1Mm: number, x2Mm: number, y2Mm: number): SheetShape => ({
  kind: 'line',
  x1Mm,
  y1Mm,
  x2Mm,
  y2Mm,
});

export const path = (steps: readonly Step[]): SheetShape => ({ kind: 'path', steps });

/** Whole numbers 0 … count − 1, for rows of holes. */
export const upTo = (count: number): number[] => Array.from({ length: count }, (_, index) => index);
