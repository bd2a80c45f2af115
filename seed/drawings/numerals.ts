import { arcTo, type Corner, close, curveTo, filleted, lineTo, move, type Step } from './outline.ts';

/** Slab numerals 84 mm high, drawn for this club's house number; top left corner at x, y. */
export function numeralOne(x: number, y: number): Step[] {
  const corners: Corner[] = [
    [18, 0],
    [27, 0],
    [27, 75, 2],
    [41, 75],
    [41, 84],
    [0, 84],
    [0, 75],
    [13, 75, 2],
    [13, 17, 2],
    [1, 24],
    [1, 13],
  ];
  return filleted(corners.map(([cx, cy, r]): Corner => [x + cx, y + cy, r ?? 0]));
}

export function numeralSeven(x: number, y: number): Step[] {
  return [
    move(x, y),
    lineTo(x + 54, y),
    lineTo(x + 54, y + 9),
    curveTo(x + 40, y + 32, x + 30, y + 56, x + 28, y + 84),
    lineTo(x + 13, y + 84),
    curveTo(x + 15, y + 58, x + 25, y + 34, x + 40, y + 13),
    lineTo(x + 12, y + 13),
    arcTo(2, false, x + 10, y + 15),
    lineTo(x + 10, y + 25),
    lineTo(x, y + 25),
    close,
  ];
}

export function numeralTwo(x: number, y: number): Step[] {
  return [
    move(x + 1, y + 25),
    arcTo(25, true, x + 51, y + 25),
    curveTo(x + 51, y + 46, x + 25, y + 54, x + 19, y + 71),
    lineTo(x + 40, y + 71),
    arcTo(2, false, x + 42, y + 69),
    lineTo(x + 42, y + 60),
    lineTo(x + 52, y + 60),
    lineTo(x + 52, y + 84),
    lineTo(x, y + 84),
    lineTo(x, y + 77),
    curveTo(x + 2, y + 52, x + 37, y + 46, x + 37, y + 26),
    arcTo(11, false, x + 15, y + 26),
    lineTo(x + 20, y + 26),
    lineTo(x + 20, y + 35),
    lineTo(x + 1, y + 35),
    close,
  ];
}
