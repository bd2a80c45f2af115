import { scalloped } from './outline.ts';
import { circle, path, type Sheet, type SheetLayer, type SheetShape, upTo } from './sheet.ts';

interface Wheel {
  readonly key: string;
  readonly places: number;
  readonly diameterMm: number;
  readonly holeMm: number;
  /** From the middle to the middle of a hole. */
  readonly reachMm: number;
  readonly more?: readonly SheetLayer[];
}

/** A wheel for collets, turned on a peg: drawn round its own centre, then moved. */
function wheel({ key, places, diameterMm, holeMm, reachMm, more = [] }: Wheel): Sheet {
  const middleMm = diameterMm / 2;
  const holes: SheetShape[] = upTo(places).map((index) => ({
    kind: 'use',
    id: 'collet-hole',
    xMm: reachMm,
    yMm: 0,
    turnedDeg: (index * 360) / places,
  }));
  return {
    key,
    widthMm: diameterMm,
    heightMm: diameterMm,
    borderMm: 5,
    reused: [{ id: 'collet-hole', shape: circle(0, 0, holeMm) }],
    layers: [
      { name: `holes ${holeMm.toFixed(1)} through`, movedMm: [middleMm, middleMm], shapes: holes },
      { name: 'peg hole 8.0 through', shapes: [circle(middleMm, middleMm, 8)] },
      { name: 'first place mark 3.0 deep', shapes: [circle(middleMm + reachMm - 12, middleMm, 4)] },
      ...more,
      {
        name: 'outside',
        movedMm: [middleMm, middleMm],
        shapes: [
          path(
            scalloped({ xMm: 0, yMm: 0, radiusMm: middleMm }, places, {
              radiusMm: 9,
              awayMm: middleMm + 5,
            }),
          ),
        ],
      },
    ],
  };
}

export const colletWheel = wheel({ key: 'collet-wheel', places: 8, diameterMm: 90, holeMm: 12, reachMm: 31 });

/** Revision 2: what the records asked for. */
export const colletWheelWider = wheel({
  key: 'collet-wheel-wider',
  places: 8,
  diameterMm: 90,
  holeMm: 12.1,
  reachMm: 31,
});

export const colletWheelTwelve = wheel({
  key: 'collet-wheel-twelve',
  places: 12,
  diameterMm: 120,
  holeMm: 12.1,
  reachMm: 46,
});

/** With pockets for round magnets, so that it stays where it was turned to. */
export const colletWheelMagnets = wheel({
  key: 'collet-wheel-magnets',
  places: 12,
  diameterMm: 120,
  holeMm: 12.1,
  reachMm: 46,
  more: [
    {
      name: 'magnet pockets 10.2, 4 deep',
      shapes: upTo(4).map((index) =>
        circle(
          60 + 20 * Math.cos((index * Math.PI) / 2 + Math.PI / 4),
          60 + 20 * Math.sin((index * Math.PI) / 2 + Math.PI / 4),
          10.2,
        ),
      ),
    },
  ],
});
