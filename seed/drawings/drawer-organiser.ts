import { circle, rect, type Sheet, upTo } from './sheet.ts';

/** One row a shank size: hole diameter with its clearance, row height, holes, first hole, pitch. */
const rows = [
  { shank: '3.175', holeMm: 3.3, yMm: 17, count: 12, firstMm: 52, pitchMm: 12.5 },
  { shank: '6', holeMm: 6.1, yMm: 43, count: 10, firstMm: 54, pitchMm: 15 },
  { shank: '6.35', holeMm: 6.5, yMm: 73, count: 10, firstMm: 54, pitchMm: 15 },
  { shank: '8', holeMm: 8.2, yMm: 103, count: 8, firstMm: 56, pitchMm: 18.7 },
];

/** Four rows of bits by shank, a label recess before each row. Page in cm, a tenth of a mm a unit. */
export const drawerOrganiser: Sheet = {
  key: 'drawer-organiser',
  widthMm: 200,
  heightMm: 120,
  unit: 'cm',
  borderMm: 5,
  layers: [
    { name: 'pocket 2 deep for labels', shapes: rows.map((row) => rect(8, row.yMm - 7, 32, 14, 2)) },
    ...rows.map((row) => ({
      name: `holes ${row.holeMm} for ${row.shank} shanks, 14 deep`,
      shapes: upTo(row.count).map((index) => circle(row.firstMm + index * row.pitchMm, row.yMm, row.holeMm)),
    })),
    { name: 'outside', shapes: [rect(0, 0, 200, 120, 5)] },
  ],
};
