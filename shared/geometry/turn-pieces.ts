import type { Point } from '#shared/drawing/types.ts';

/** A length that follows `lengthMm · cos(angle − peakRad)` while the outline is turned. */
export interface Wave {
  readonly lengthMm: number;
  readonly peakRad: number;
}

/** A stretch of turning over which the same corners stay outermost. */
export interface TurnPiece {
  readonly fromRad: number;
  readonly toRad: number;
  readonly width: Wave;
  readonly height: Wave;
}

const HALF_TURN = Math.PI;
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

/** Corners nearer together than this, in mm, never stop the walk: their order is rounding, not shape. */
const SLACK_MM = 1e-9;

/** Walks the hull to the corner furthest along a direction that only ever turns one way. */
const furthestCorner = (hull: readonly Point[], origin: Point): ((angleRad: number) => Point) => {
  let at = 0;
  let started = false;
  const corner = (index: number): Point => hull[index % hull.length] ?? origin;
  return (angleRad) => {
    const alongX = Math.cos(angleRad);
    const alongY = Math.sin(angleRad);
    const along = ({ x, y }: Point): number => x * alongX + y * alongY;
    const from = at;
    let best = along(corner(from));
    for (let step = 1; step < hull.length; step += 1) {
      const here = along(corner(from + step));
      if (here > best) {
        best = here;
        at = (from + step) % hull.length;
      } else if (started && here < best - SLACK_MM) break;
    }
    started = true;
    return corner(at);
  };
};

const waveBetween = (near: Point, far: Point): Wave => ({
  lengthMm: Math.hypot(far.x - near.x, far.y - near.y),
  peakRad: Math.atan2(far.y - near.y, far.x - near.x),
});

/**
 * Cuts half a turn into the pieces over which width and height each follow one cosine (rotating
 * calipers). Angles run from 0 to π, anticlockwise as seen on a page whose y runs down.
 */
export const turnPieces = (hull: readonly Point[]): TurnPiece[] => {
  const [first] = hull;
  if (first === undefined) return [];
  const right = furthestCorner(hull, first);
  const left = furthestCorner(hull, first);
  const bottom = furthestCorner(hull, first);
  const top = furthestCorner(hull, first);
  const turns = criticalTurns(hull);
  const pieces: TurnPiece[] = [];
  for (let index = 1; index < turns.length; index += 1) {
    const fromRad = turns[index - 1] ?? 0;
    const toRad = turns[index] ?? fromRad;
    if (toRad <= fromRad) continue;
    const middleRad = (fromRad + toRad) / 2;
    pieces.push({
      fromRad,
      toRad,
      width: waveBetween(left(middleRad + HALF_TURN), right(middleRad)),
      height: quarterBack(waveBetween(top(middleRad - HALF_TURN / 2), bottom(middleRad + HALF_TURN / 2))),
    });
  }
  return pieces;
};

/** Height is reach a quarter turn on from width, so its wave peaks a quarter turn sooner. */
function quarterBack(wave: Wave): Wave {
  return { lengthMm: wave.lengthMm, peakRad: wave.peakRad - HALF_TURN / 2 };
}
