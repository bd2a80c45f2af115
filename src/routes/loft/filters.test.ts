import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { kinds, materialFamilies, sorts, standingWords } from '#shared/api/vocabulary.ts';
import { type Filters, filtersFrom, noFilters, paramsOf, searchOf } from './filters.ts';

const orNone = <Value>(values: readonly Value[]) => fc.constantFrom<Value | null>(null, ...values);
const anyFilters: fc.Arbitrary<Filters> = fc.record({
  q: fc.constantFrom('', 'tray', '1/4 in & mdf', 'ø 90 + 15'),
  kind: orNone(kinds),
  material: orNone(materialFamilies),
  bitMm: orNone([2, 3.175, 6.35]),
  standing: orNone(standingWords),
  fits: fc.boolean(),
  maxMinutes: orNone([10, 45, 120]),
  sort: orNone(sorts),
});

describe('filters in the address', () => {
  it('come back as they were written, so that back, reload and a sent link show the same list', () => {
    fc.assert(
      fc.property(anyFilters, (filters) => {
        expect(filtersFrom(new URLSearchParams(paramsOf(filters).toString()))).toEqual(filters);
      }),
    );
  });

  it('leave no trace when none is set', () => {
    expect(paramsOf(noFilters).toString()).toBe('');
  });

  it('that are not understood are left out, so that the server never refuses an old link', () => {
    const params = new URLSearchParams(
      'kind=tools&material=toString&standing=great&bitMm=-3&maxMinutes=1e9&sort=best&fits=1&cursor=x',
    );
    expect(filtersFrom(params)).toEqual(noFilters);
  });

  it('name the machine always, and ask for what fits only with one (fits alone is a 400)', () => {
    const fitting = { ...noFilters, fits: true };
    expect(searchOf(fitting, 'm1')).toBe('fits=true&machineId=m1');
    expect(searchOf(noFilters, 'm1')).toBe('machineId=m1');
    expect(searchOf(fitting, null)).toBe('');
  });
});
