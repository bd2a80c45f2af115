import type { Point } from '#shared/drawing/types.ts';

/** A side of the box that follows `x · cos(angle) + y · sin(angle)`, in mm, while the outline is turned. */
export interface Side {
  readonly x: number;
  readonly y: number;
}

/** A stretch of turning over which the same corners stay outermost. */
export interface TurnPiece {
  readonly fromRad: number;
  readonly toRad: number;
  readonly width: Side;
  readonly height: Side;
}

const HALF_TURN = Math.PI;
/** Two turns nearer than this are one: parallel edges whose angles differ by rounding. */
const SAME_TURN_RAD = 1e-12;
/** Corners nearer together than this, in mm, never stop the walk: their order is rounding, not shape. */
const SLACK_MM = 1e-9;

const withinHalfTurn = (angleRad: number): number => {
  const rest = angleRad % HALF_TURN;
  return rest < 0 ? rest + HALF_TURN : rest;
};

/** Where an outermost corner changes: the turns at which an edge lies along or across the box. */
const criticalTurns = (hull: readonly Point[]): Float64Array => {
  const turns = new Float64Array(2 * hull.length + 2);
  turns[0] = 0;
  turns[1] = HALF_TURN;
  hull.forEach((from, at) => {
    const to = hull[(at + 1) % hull.length] ?? from;
    const edgeRad = Math.atan2(to.y - from.y, to.x - from.x);
    turns[2 * at + 2] = withinHalfTurn(edgeRad);
    turns[2 * at + 3] = withinHalfTurn(edgeRad + HALF_TURN / 2);
  });
  return turns.sort();
};

/** Walks the hull to the corner furthest along a direction that only ever turns one way. */
const furthestCorner = (
  hull: readonly Point[],
  first: Point,
): ((alongX: number, alongY: number) => Point) => {
  let at = 0;
  let started = false;
  return (alongX, alongY) => {
    const from = at;
    let best = Number.NEGATIVE_INFINITY;
    let furthest = first;
    for (let step = 0; step < hull.length; step += 1) {
      const index = (from + step) % hull.length;
      const corner = hull[index] ?? first;
      const here = corner.x * alongX + corner.y * alongY;
      if (here > best) {
        best = here;
        at = index;
        furthest = corner;
      } else if (started && here < best - SLACK_MM) break;
    }
    started = true;
    return furthest;
  };
};

/**
 * Cuts half a turn into the pieces over which width and height each follow one cosine (rotating
 * calipers). Angles run from 0 to π, anticlockwise as seen on a page whose y runs down. `hull` is a
 * result of convexHull.
 */
export const turnPieces = (hull: readonly Point[]): TurnPiece[] => {
  const [first] = hull;
  if (first === undefined) return [];
  const furthestRight = furthestCorner(hull, first);
  const furthestLeft = furthestCorner(hull, first);
  const furthestDown = furthestCorner(hull, first);
  const furthestUp = furthestCorner(hull, first);
  const pieces: TurnPiece[] = [];
  let fromRad = 0;
  for (const toRad of criticalTurns(hull)) {
    if (toRad - fromRad <= SAME_TURN_RAD) continue;
    const alongX = Math.cos((fromRad + toRad) / 2);
    const alongY = Math.sin((fromRad + toRad) / 2);
    const right = furthestRight(alongX, alongY);
    const left = furthestLeft(-alongX, -alongY);
    const down = furthestDown(-alongY, alongX);
    const up = furthestUp(alongY, -alongX);
    pieces.push({
      fromRad,
      toRad,
      width: { x: right.x - left.x, y: right.y - left.y },
      // A quarter turn on: (x, y) along (−sin, cos) is (y, −x) along (cos, sin).
      height: { x: down.y - up.y, y: up.x - down.x },
    });
    fromRad = toRad;
  }
  return pieces;
};

/** Length of a side at a turn, in mm. */
export const sideAt = ({ x, y }: Side, angleRad: number): number =>
  x * Math.cos(angleRad) + y * Math.sin(angleRad);
