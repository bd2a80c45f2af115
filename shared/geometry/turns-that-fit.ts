import type { Point } from '#shared/drawing/types.ts';
import { type Side, sideAt, type TurnPiece, turnPieces } from './turn-pieces.ts';
import { extentsAsDrawn } from './turned-extents.ts';

/** An unbroken range of turns, in radians from 0 to π. */
export interface TurnRange {
  readonly fromRad: number;
  readonly toRad: number;
}

/** Ranges that part by less than this are one range: it is the rounding of angles, not a gap. */
const SAME_RAD = 1e-12;

/** The angle nearest to `aroundRad` that stands for the same direction as `angleRad`. */
const nearestTo = (angleRad: number, aroundRad: number): number =>
  angleRad - 2 * Math.PI * Math.round((angleRad - aroundRad) / (2 * Math.PI));

/** The parts of a range over which a side is at most `mostMm`: before and after its peak. */
const rangesWithin = ({ x, y }: Side, range: TurnRange, mostMm: number): readonly TurnRange[] => {
  if (mostMm < 0) return [];
  const longestMm = Math.sqrt(x * x + y * y);
  if (longestMm <= mostMm) return [range];
  const peak = nearestTo(Math.atan2(y, x), (range.fromRad + range.toRad) / 2);
  const half = Math.acos(mostMm / longestMm);
  return [
    { fromRad: range.fromRad, toRad: Math.min(range.toRad, peak - half) },
    { fromRad: Math.max(range.fromRad, peak + half), toRad: range.toRad },
  ].filter(({ fromRad, toRad }) => fromRad <= toRad);
};

const joined = (ranges: readonly TurnRange[]): TurnRange[] => {
  const all: TurnRange[] = [];
  for (const range of ranges) {
    const last = all.at(-1);
    if (last !== undefined && range.fromRad - last.toRad <= SAME_RAD) {
      all[all.length - 1] = { fromRad: last.fromRad, toRad: Math.max(last.toRad, range.toRad) };
    } else all.push(range);
  }
  return all;
};

/**
 * Every turn, within half a turn, at which an outline lies inside `widthMm` × `heightMm`. Exact: on
 * each piece of turning the limits are solved, not searched. A bit's radius is taken off the room by
 * the caller, which is exact too, because a round bit widens an outline alike in every direction.
 * `hull` is a result of convexHull.
 */
export const turnsThatFit = (
  hull: readonly Point[],
  widthMm: number,
  heightMm: number,
  toleranceMm = 0.01,
): TurnRange[] =>
  joined(
    turnPieces(hull).flatMap((piece) =>
      rangesWithin(piece.width, piece, widthMm + toleranceMm).flatMap((range) =>
        rangesWithin(piece.height, range, heightMm + toleranceMm),
      ),
    ),
  );

/** Where on a piece the room left in width equals the room left in height. */
const evenTurns = (piece: TurnPiece, excessMm: number): number[] => {
  const x = piece.width.x - piece.height.x;
  const y = piece.width.y - piece.height.y;
  const length = Math.sqrt(x * x + y * y);
  if (length === 0 || Math.abs(excessMm) > length) return [];
  const half = Math.acos(excessMm / length);
  const middle = (piece.fromRad + piece.toRad) / 2;
  return [Math.atan2(y, x) + half, Math.atan2(y, x) - half]
    .map((turn) => nearestTo(turn, middle))
    .filter((turn) => turn > piece.fromRad && turn < piece.toRad);
};

/**
 * The turn that leaves the most room, and that room in mm: the smaller of what is left in width and
 * in height, below zero when the outline does not fit. Exact: a cosine bends down between the ends of
 * its piece, so the best turn is an end, or a turn at which both rooms are equal.
 */
export const roomiestTurn = (
  hull: readonly Point[],
  widthMm: number,
  heightMm: number,
): { readonly turnRad: number; readonly roomMm: number } => {
  let turnRad = 0;
  let roomMm = hull.length === 0 ? Math.min(widthMm, heightMm) : Number.NEGATIVE_INFINITY;
  for (const piece of turnPieces(hull)) {
    for (const turn of [piece.fromRad, piece.toRad, ...evenTurns(piece, widthMm - heightMm)]) {
      const room = Math.min(widthMm - sideAt(piece.width, turn), heightMm - sideAt(piece.height, turn));
      if (room > roomMm) {
        roomMm = room;
        turnRad = turn;
      }
    }
  }
  return { turnRad, roomMm };
};

/** Ranges whose widths differ by less than this are as good as each other to a hand that lays the stock. */
const SAME_WIDTH_RAD = 1e-6;

/** The same lie by the shorter turn, in degrees: above 90° anticlockwise it is less than 90° clockwise. */
const shorterTurn = (turnDeg: number): number => (turnDeg > 90 ? turnDeg - 180 : turnDeg);

/** The turn a member is told: the middle of a range, on a whole degree where the range allows. */
const tellable = ({ fromRad, toRad }: TurnRange): number => {
  const degrees = (angleRad: number): number => (angleRad * 180) / Math.PI;
  const middleDeg = degrees((fromRad + toRad) / 2);
  for (const steps of [1, 10]) {
    const roundDeg = Math.round(middleDeg * steps) / steps;
    if (roundDeg >= degrees(fromRad) && roundDeg <= degrees(toRad)) return roundDeg;
  }
  return middleDeg;
};

/**
 * How to turn an outline to fit, in degrees anticlockwise from −90 to 90: 0 when it fits as drawn, else
 * 90, else the middle of the widest range of turns that fit (so that a hand-laid angle may be off most;
 * of two alike the shorter turn), else null.
 */
export const turnToFit = (
  hull: readonly Point[],
  widthMm: number,
  heightMm: number,
  toleranceMm = 0.01,
): number | null => {
  const drawn = extentsAsDrawn(hull);
  const mostMm = { width: widthMm + toleranceMm, height: heightMm + toleranceMm };
  if (drawn.widthMm <= mostMm.width && drawn.heightMm <= mostMm.height) return 0;
  if (drawn.heightMm <= mostMm.width && drawn.widthMm <= mostMm.height) return 90;
  const ranges = turnsThatFit(hull, widthMm, heightMm, toleranceMm);
  if (ranges.length === 0) return null;
  const widestRad = Math.max(...ranges.map(({ fromRad, toRad }) => toRad - fromRad));
  const turns = ranges
    .filter(({ fromRad, toRad }) => toRad - fromRad >= widestRad - SAME_WIDTH_RAD)
    .map((range) => shorterTurn(tellable(range)));
  return turns.reduce((best, turn) => (Math.abs(turn) < Math.abs(best) ? turn : best));
};
