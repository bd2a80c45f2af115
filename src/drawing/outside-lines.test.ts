import { describe, expect, it } from 'vitest';
import { outsideLines } from './outside-lines.ts';

const square = 'M0 0L100 0L100 100L0 100Z';
const hole = 'M20 50A10 10 0 1 1 40 50A10 10 0 1 1 20 50Z';
const apart = 'M200 0H220V20H200Z';

describe('outsideLines', () => {
  it('finds what lies inside, in any order of the file', () => {
    expect(outsideLines(hole + square)).toEqual({ outside: square, inside: hole });
  });

  it('takes parts that lie side by side for outside', () => {
    const { outside, inside } = outsideLines(square + hole + apart);
    expect(outside).toContain(apart);
    expect(outside).toContain(square);
    expect(inside).toBe(hole);
  });

  it('draws what it cannot box as outside, losing nothing', () => {
    const relative = 'm1 1l5 0';
    expect(outsideLines(square + relative).outside).toContain(relative);
  });
});
