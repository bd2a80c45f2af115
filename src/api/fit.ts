import { queryOptions } from '@tanstack/react-query';
import type { FitReport } from '#shared/api/fit.ts';
import type { UnitSystem } from '#shared/units/system.ts';
import { queryKeys } from './query-keys.ts';
import { request } from './request.ts';

export interface FitAsked {
  readonly slug: string;
  readonly revision: number;
  readonly machineId: string;
  /** The record whose settings are shown beside it. */
  readonly recordId: string | null;
  readonly units: UnitSystem;
}

/** Whether a revision can be cut on one of the member's machines, with the bits in their drawer. */
export const fitQuery = ({ slug, revision, machineId, recordId, units }: FitAsked) => {
  const query = new URLSearchParams({ machineId, units, ...(recordId === null ? {} : { recordId }) });
  const path = `/api/designs/${encodeURIComponent(slug)}/revisions/${revision}/fit?${query}`;
  return queryOptions({
    queryKey: [...queryKeys.fit, slug, revision, machineId, recordId, units],
    queryFn: ({ signal }) => request<FitReport>('GET', path, { signal }),
  });
};
