import { describe, expect, it } from 'vitest';
import { circleOf } from './circle.ts';

const box = { minX: 10, minY: 20, maxX: 16, maxY: 26 };

describe('circleOf', () => {
  it('knows a circle by its box and its length, π d', () => {
    expect(circleOf({ closed: true, boundsMm: box, lengthMm: Math.PI * 6 })).toEqual({
      xMm: 13,
      yMm: 23,
      radiusMm: 3,
    });
  });

  it('takes neither a square nor an open line for one', () => {
    expect(circleOf({ closed: true, boundsMm: box, lengthMm: 24 })).toBeNull();
    expect(circleOf({ closed: false, boundsMm: box, lengthMm: Math.PI * 6 })).toBeNull();
  });
});
