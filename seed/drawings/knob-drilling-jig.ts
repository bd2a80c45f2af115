import { filleted, slot } from './outline.ts';
import { circle, line, path, type Sheet } from './sheet.ts';

const centres = [32, 64, 96, 128];

/** Handle centres at 32 mm steps for drawer fronts; this member's drawing program thinks in inches. */
export const knobDrillingJig: Sheet = {
  key: 'knob-drilling-jig',
  widthMm: 160,
  heightMm: 90,
  unit: 'in',
  borderMm: 6.35,
  layers: [
    { name: 'centre line 0.5 deep', shapes: [line(80, 4, 80, 86), line(4, 45, 156, 45)] },
    {
      name: 'drill guides 5.0 through',
      shapes: [
        ...centres.flatMap((apart) => [circle(80 - apart / 2, 45, 5), circle(80 + apart / 2, 45, 5)]),
        circle(80, 45, 5),
      ],
    },
    {
      name: 'stop slots 6.5 through',
      shapes: [path(slot(24, 20, 24, 33, 6.5)), path(slot(136, 20, 136, 33, 6.5))],
    },
    {
      name: 'viewing windows through',
      shapes: [
        path(
          filleted([
            [56, 14, 4],
            [104, 14, 4],
            [104, 32, 4],
            [56, 32, 4],
          ]),
        ),
        path(
          filleted([
            [40, 60, 4],
            [120, 60, 4],
            [108, 76, 4],
            [52, 76, 4],
          ]),
        ),
      ],
    },
    {
      name: 'outside',
      shapes: [
        path(
          filleted([
            [0, 0],
            [160, 0],
            [160, 74, 2],
            [144, 90, 2],
            [16, 90, 2],
            [0, 74, 2],
          ]),
        ),
      ],
    },
  ],
};
