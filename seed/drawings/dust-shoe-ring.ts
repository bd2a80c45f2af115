import { slot, wrapped } from './outline.ts';
import { circle, path, type Sheet } from './sheet.ts';

const spindle = { xMm: 55, yMm: 55, radiusMm: 55 };
const hose = { xMm: 142, yMm: 55, radiusMm: 34 };

/** Spindle bore, hose port and the groove for the brush strip; an old export at 90 units an inch. */
export const dustShoeRing: Sheet = {
  key: 'dust-shoe-ring',
  widthMm: 176,
  heightMm: 110,
  unit: 'bare-90',
  borderMm: 4,
  layers: [
    {
      name: 'pocket 4 deep brush groove 6 wide',
      shapes: [
        path([
          ...wrapped({ ...spindle, radiusMm: 50 }, { ...hose, radiusMm: 29 }),
          ...wrapped({ ...spindle, radiusMm: 44 }, { ...hose, radiusMm: 23 }),
        ]),
      ],
    },
    { name: 'bore 66 through for the spindle', shapes: [circle(55, 55, 66)] },
    { name: 'bore 38 through for the hose', shapes: [circle(142, 55, 38)] },
    {
      name: 'clamp slots 4.5 through',
      shapes: [path(slot(106, 40, 114, 40, 4.5)), path(slot(106, 70, 114, 70, 4.5))],
    },
    { name: 'outside', shapes: [path(wrapped(spindle, hose))] },
  ],
};
