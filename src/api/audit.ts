import { infiniteQueryOptions } from '@tanstack/react-query';
import type { AuditList } from '#shared/api/flags.ts';
import { queryKeys } from './query-keys.ts';
import { request } from './request.ts';

/** The audit log, newest first, with whether its chain of hashes is whole; moderators only. */
export const auditQuery = infiniteQueryOptions({
  queryKey: queryKeys.audit,
  queryFn: ({ pageParam, signal }) => {
    const query = pageParam === null ? '' : `?${new URLSearchParams({ cursor: pageParam })}`;
    return request<AuditList>('GET', `/api/audit${query}`, { signal });
  },
  initialPageParam: null as string | null,
  getNextPageParam: ({ nextCursor }) => nextCursor,
});
