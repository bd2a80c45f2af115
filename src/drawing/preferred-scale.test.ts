import { describe, expect, it } from 'vitest';
import { preferredScale } from './preferred-scale.ts';

// CSS: 1 in = 96 px = 25.4 mm, so 1 : 1 is 96 / 25.4 px/mm. Steps: ISO 3, series R10 (S1).
const fullSize = 96 / 25.4;

describe('preferredScale', () => {
  it.each([
    [fullSize, '1 : 1'],
    [fullSize * 1.99, '1.6 : 1'],
    [fullSize * 20, '10 : 1'],
    [fullSize / 1.5, '1 : 1.6'],
    [fullSize / 10, '1 : 10'],
    [fullSize / 30, '1 : 31.5'],
  ])('takes the largest step of at most %d px/mm: %s', (most, text) => {
    const scale = preferredScale(most);
    expect(scale.text).toBe(text);
    expect(scale.pxPerMm).toBeLessThanOrEqual(most);
  });

  it('says when nothing is small enough', () => {
    expect(preferredScale(fullSize / 5000).text).toBe('not to scale');
  });
});
