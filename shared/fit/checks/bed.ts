import { convexHull } from '#shared/geometry/convex-hull.ts';
import { extentsAsDrawn, turnedExtents } from '#shared/geometry/turned-extents.ts';
import { turnsThatFit } from '#shared/geometry/turns-that-fit.ts';
import type { Check, FitContext } from '../check.ts';
import { bedRoom, fitsBed } from '../fits-bed.ts';
import { FIT_TOLERANCE_MM } from '../practice.ts';
import { sidesMm } from '../wording.ts';

const degrees = (angle: number): string => `${Math.round(angle * 10) / 10}°`;
const inDegrees = (angleRad: number): number => (angleRad * 180) / Math.PI;

/** How a drawing lies, in words. */
export const turnWords = (turnDeg: number): string => {
  if (turnDeg === 0) return 'as drawn';
  if (turnDeg === 90) return 'turned 90°';
  return `turned ${degrees(Math.abs(turnDeg))} ${turnDeg < 0 ? 'clockwise' : 'anticlockwise'}`;
};

/** From which to which turn it would do as well, in words, for a turn that is laid by hand. */
const leeway = ({ hullMm, bit, machine }: FitContext, turnDeg: number): string => {
  const room = bedRoom(machine);
  const bitMm = bit?.diameterMm ?? 0;
  const ranges = turnsThatFit(
    convexHull(hullMm),
    room.widthMm - bitMm,
    room.heightMm - bitMm,
    FIT_TOLERANCE_MM,
  );
  // Ranges run from 0° to 180°; a clockwise turn lies in them half a turn further on.
  const halfTurnDeg = turnDeg < 0 ? 180 : 0;
  const range = ranges
    .map(({ fromRad, toRad }) => ({
      from: inDegrees(fromRad) - halfTurnDeg,
      to: inDegrees(toRad) - halfTurnDeg,
    }))
    .find(({ from, to }) => from <= turnDeg + 1e-9 && turnDeg <= to + 1e-9);
  if (range === undefined) return '';
  const [least = 0, most = 0] = [Math.abs(range.from), Math.abs(range.to)].sort((a, b) => a - b);
  return `; any turn from ${degrees(least)} to ${degrees(most)} will do`;
};

/** Does the drawing, with the bit running round it, lie inside the bed's margins and clamp strip? */
export const checkBed = (context: FitContext): { check: Check; turnDeg: number | null } => {
  const { hullMm, bit, machine, wording } = context;
  const { fits, turnDeg, overMm } = fitsBed(hullMm, bit?.diameterMm, machine);
  const room = bedRoom(machine);
  const bitMm = bit?.diameterMm ?? 0;
  const quarter = extentsAsDrawn(hullMm);
  const turned =
    turnDeg === null || turnDeg === 0
      ? quarter
      : turnDeg === 90
        ? { widthMm: quarter.heightMm, heightMm: quarter.widthMm }
        : turnedExtents(hullMm, (turnDeg * Math.PI) / 180);
  const needMm = { widthMm: turned.widthMm + bitMm, heightMm: turned.heightMm + bitMm };
  const withBit = bit === undefined ? '' : ` with a ${wording.diameter(bitMm)} bit round it`;
  const needs = `${wording.size(needMm.widthMm, needMm.heightMm)}${withBit}`;
  const has = `${wording.size(room.widthMm, room.heightMm)} inside the margins and clamp strip`;
  const clause =
    turnDeg === null
      ? `does not fit your bed: it needs ${needs} as drawn, and there is ${has}; however it is turned, it is at least ${wording.length(overMm)} too large`
      : `fits your bed ${turnDeg === 0 || turnDeg === 90 ? '' : 'only '}${turnWords(turnDeg)}`;
  const more =
    turnDeg === null
      ? ''
      : `: it takes ${needs}, of ${has}${turnDeg === 0 || turnDeg === 90 ? '' : leeway(context, turnDeg)}`;
  const check: Check = {
    id: 'bed',
    result: fits ? 'fits' : 'doesNotFit',
    have: sidesMm(room.widthMm, room.heightMm),
    need: sidesMm(needMm.widthMm, needMm.heightMm),
    unit: 'mm',
    sentence: `${clause.charAt(0).toUpperCase()}${clause.slice(1)}${more}.`,
    clause,
  };
  return { check, turnDeg };
};
