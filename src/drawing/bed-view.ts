import type { Machine } from '#shared/api/bench.ts';
import type { BoundsMm } from './turned.ts';

export type Bed = Pick<Machine, 'bedXMm' | 'bedYMm' | 'marginMm' | 'clampStripMm'>;

interface BoxPx {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

export interface BedView {
  readonly scalePxPerMm: number;
  readonly bed: BoxPx;
  /** What margins and the clamp strip leave of the bed. The front of the bed is at the bottom. */
  readonly usable: BoxPx;
}

/** A card is drawn in this box and stretched to its column, so that every card has one scale. */
export const cardBoxPx = { width: 360, height: 236 } as const;
const spare = { left: 30, right: 48, top: 20, bottom: 42 } as const;

/** Where a bed lies in a card's box, as large as it can be. */
export const bedView = ({ bedXMm, bedYMm, marginMm, clampStripMm }: Bed): BedView => {
  const roomX = cardBoxPx.width - spare.left - spare.right;
  const roomY = cardBoxPx.height - spare.top - spare.bottom;
  const scale = Math.min(roomX / bedXMm, roomY / bedYMm);
  const bed = {
    x: spare.left + (roomX - bedXMm * scale) / 2,
    y: spare.top + (roomY - bedYMm * scale) / 2,
    width: bedXMm * scale,
    height: bedYMm * scale,
  };
  return {
    scalePxPerMm: scale,
    bed,
    usable: {
      x: bed.x + marginMm.left * scale,
      y: bed.y + marginMm.back * scale,
      width: bed.width - (marginMm.left + marginMm.right) * scale,
      height: bed.height - (marginMm.front + marginMm.back + clampStripMm) * scale,
    },
  };
};

/** Fits are judged to 0.01 mm (contract). */
const TOLERANCE_MM = 0.01;

export interface Placed {
  readonly box: BoxPx;
  readonly overhangs: boolean;
}

/**
 * Where a part lies on the bed: in the middle along each axis it fits, else from the front left corner, so
 * that what is too much hangs over to the right or the back.
 */
export const placeOnBed = ({ scalePxPerMm: scale, usable }: BedView, bounds: BoundsMm): Placed => {
  const width = (bounds.maxX - bounds.minX) * scale;
  const height = (bounds.maxY - bounds.minY) * scale;
  const slack = TOLERANCE_MM * scale;
  const fitsX = width <= usable.width + slack;
  const fitsY = height <= usable.height + slack;
  return {
    box: {
      x: fitsX ? usable.x + (usable.width - width) / 2 : usable.x,
      y: fitsY ? usable.y + (usable.height - height) / 2 : usable.y + usable.height - height,
      width,
      height,
    },
    overhangs: !(fitsX && fitsY),
  };
};
