import { circle, type Sheet, type SheetShape, upTo } from './sheet.ts';

const places: SheetShape[] = upTo(20).map((index) => ({
  kind: 'use',
  id: 'spacer',
  xMm: 9 + (index % 5) * 24,
  yMm: 9 + Math.floor(index / 5) * 24,
}));
const bores = places.map((place): SheetShape => (place.kind === 'use' ? { ...place, id: 'bore' } : place));

/** One spacer drawn once and used twenty times, with room for the bit and a wall between. */
export const twentySpacers: Sheet = {
  key: 'twenty-spacers',
  widthMm: 114,
  heightMm: 90,
  borderMm: 6,
  reused: [
    { id: 'bore', shape: circle(0, 0, 6.4) },
    { id: 'spacer', shape: circle(0, 0, 18) },
  ],
  layers: [
    { name: 'bores 6.4 through', shapes: bores },
    { name: 'outside', shapes: places },
  ],
};
