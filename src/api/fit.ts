import { queryOptions } from '@tanstack/react-query';
import type { FitReport } from '#shared/api/fit.ts';
import { queryKeys } from './query-keys.ts';
import { request } from './request.ts';

/** Whether a revision can be cut on one of the member's machines, with the bits in their drawer. */
export const fitQuery = (slug: string, revision: number, machineId: string) =>
  queryOptions({
    queryKey: [...queryKeys.fit, slug, revision, machineId],
    queryFn: ({ signal }) =>
      request<FitReport>(
        'GET',
        `/api/designs/${encodeURIComponent(slug)}/revisions/${revision}/fit?machineId=${machineId}`,
        { signal },
      ),
  });
