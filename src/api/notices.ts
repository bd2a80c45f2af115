import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { NoticeList } from '#shared/api/notices.ts';
import { queryKeys } from './query-keys.ts';
import { request } from './request.ts';

/** The member's own notices, newest first. */
export const noticesQuery = queryOptions({
  queryKey: queryKeys.notices,
  queryFn: ({ signal }) => request<NoticeList>('GET', '/api/notices', { signal }),
});

export const useReadNotice = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => request<undefined>('POST', `/api/notices/${encodeURIComponent(id)}/read`),
    onSettled: () => client.invalidateQueries({ queryKey: queryKeys.notices }),
  });
};
