import type { Point } from '#shared/drawing/types.ts';
import { convexHull } from '#shared/geometry/convex-hull.ts';
import { type Extents, extentsAsDrawn } from '#shared/geometry/turned-extents.ts';
import { roomiestTurn, turnsThatFit, turnToFit } from '#shared/geometry/turns-that-fit.ts';
import type { FitBed } from './fit-input.ts';
import { FIT_TOLERANCE_MM } from './practice.ts';

/** What a bed leaves inside its margins and clamp strip, in mm. */
export const bedRoom = (bed: FitBed): Extents => ({
  widthMm: bed.bedXMm - bed.marginMm.left - bed.marginMm.right,
  heightMm: bed.bedYMm - bed.marginMm.front - bed.marginMm.back - bed.clampStripMm,
});

export interface BedFit {
  readonly fits: boolean;
  /** Degrees anticlockwise, from −90 to 90; null when no turn fits. */
  readonly turnDeg: number | null;
  /** How far it is too large, in mm, at the turn where it is least so; 0 when it fits. */
  readonly overMm: number;
}

/**
 * Whether an outline, with a bit running round its outside, lies on a bed. The bit widens the outline
 * by its radius on each side, alike in every direction, so the room is made smaller instead.
 */
export const fitsBed = (hullMm: readonly Point[], bitMm: number | undefined, bed: FitBed): BedFit => {
  const room = bedRoom(bed);
  const widthMm = room.widthMm - (bitMm ?? 0);
  const heightMm = room.heightMm - (bitMm ?? 0);
  const hull = convexHull(hullMm);
  const turnDeg = turnToFit(hull, widthMm, heightMm, FIT_TOLERANCE_MM);
  if (turnDeg !== null) return { fits: true, turnDeg, overMm: 0 };
  return { fits: false, turnDeg, overMm: Math.max(0, -roomiestTurn(hull, widthMm, heightMm).roomMm) };
};

/**
 * The same yes or no, for asking of thousands of designs at once: most are settled by their box. A
 * box that holds a line as long as the outline's longer side has at least that diagonal.
 */
export const liesOnBed = (hullMm: readonly Point[], bitMm: number | undefined, bed: FitBed): boolean => {
  const room = bedRoom(bed);
  const widthMm = room.widthMm - (bitMm ?? 0);
  const heightMm = room.heightMm - (bitMm ?? 0);
  const mostWidthMm = widthMm + FIT_TOLERANCE_MM;
  const mostHeightMm = heightMm + FIT_TOLERANCE_MM;
  const drawn = extentsAsDrawn(hullMm);
  if (mostWidthMm < 0 || mostHeightMm < 0) return false;
  if (drawn.widthMm <= mostWidthMm && drawn.heightMm <= mostHeightMm) return true;
  if (drawn.heightMm <= mostWidthMm && drawn.widthMm <= mostHeightMm) return true;
  if (Math.max(drawn.widthMm, drawn.heightMm) > Math.hypot(mostWidthMm, mostHeightMm)) return false;
  return turnsThatFit(convexHull(hullMm), widthMm, heightMm, FIT_TOLERANCE_MM).length > 0;
};
