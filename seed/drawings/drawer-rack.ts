import { filleted } from './outline.ts';
import { path, rect, type Sheet, upTo } from './sheet.ts';

/** Six bays for small boxes; 420 long, so it wants a bed longer than most small desktops have. */
export const drawerRack: Sheet = {
  key: 'drawer-rack',
  widthMm: 420,
  heightMm: 150,
  layers: [
    {
      name: 'pocket 9 deep',
      shapes: upTo(6).map((index) => rect(14 + index * 66.4, 16, 60, 118, 5)),
    },
    {
      name: 'pocket 4 deep for labels',
      shapes: upTo(6).map((index) => rect(24 + index * 66.4, 138, 40, 8, 2)),
    },
    {
      name: 'outside',
      shapes: [
        path(
          filleted([
            [0, 0, 6],
            [420, 0, 6],
            [420, 150, 6],
            [0, 150, 6],
          ]),
        ),
      ],
    },
  ],
};
