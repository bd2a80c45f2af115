import { filleted, slot } from './outline.ts';
import { circle, line, path, type Sheet, upTo } from './sheet.ts';

const zeroMm = 5;

/** A batten with a pencil hole every 5 mm up to 280: 306 long, so it fits a 300 bed only turned. */
export const markingBatten: Sheet = {
  key: 'marking-batten',
  widthMm: 306,
  heightMm: 16,
  layers: [
    {
      name: 'marks on the line 0.4 deep',
      shapes: upTo(29).map((index) => {
        const x = zeroMm + index * 10;
        return line(x, 0.5, x, index % 5 === 0 ? 7 : 3.5);
      }),
    },
    {
      name: 'pencil holes 2.0 through',
      shapes: upTo(57).map((index) => circle(zeroMm + index * 5, index % 2 === 0 ? 9 : 11.5, 2)),
    },
    { name: 'hanging slot 6 through', shapes: [path(slot(293, 8, 298, 8, 6))] },
    {
      name: 'outside',
      shapes: [
        path(
          filleted([
            [0, 0],
            [306, 0, 7.9],
            [306, 16, 7.9],
            [0, 16, 2],
          ]),
        ),
      ],
    },
  ],
};
