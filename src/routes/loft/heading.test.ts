import { describe, expect, it } from 'vitest';
import { headingOf, subheadingOf } from './heading.ts';

const counts = { total: 41, fitting: 33, machineName: 'Shed router', onlyFitting: false };

describe('the heading of the loft', () => {
  it('counts what was found and what lies on the bed, and nothing that is not known', () => {
    expect(headingOf(counts)).toBe('41 designs, 33 fit your bed');
    expect(subheadingOf(counts)).toBe('Drawn to one scale on the bed of Shed router. 8 do not fit it.');
    expect(headingOf({ ...counts, total: 1, fitting: 1 })).toBe('1 design, and it fits your bed');
    expect(headingOf({ ...counts, total: 0, fitting: 0 })).toBe('No designs');
  });

  it('says nothing of a bed without a machine', () => {
    expect(headingOf({ ...counts, fitting: null, machineName: null })).toBe('41 designs');
  });
});
