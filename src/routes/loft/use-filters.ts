import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { type Filters, filtersFrom, paramsOf } from './filters.ts';

/** The filters of the address, and ways to change them. */
export const useFilters = () => {
  const [params, setParams] = useSearchParams();
  const filters = useMemo(() => filtersFrom(params), [params]);
  const hrefWith = (change: Partial<Filters>): string => {
    const query = paramsOf({ ...filters, ...change }).toString();
    return query === '' ? '/' : `/?${query}`;
  };
  /** `inPlace` for what is dragged: it leaves no step behind for the back button. */
  const change = (next: Partial<Filters>, inPlace = false): void =>
    setParams(paramsOf({ ...filters, ...next }), { replace: inPlace, preventScrollReset: true });
  return { filters, hrefWith, change };
};
