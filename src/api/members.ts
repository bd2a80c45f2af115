import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Member, MemberChange } from '#shared/api/people.ts';
import type { List } from './list.ts';
import { queryKeys } from './query-keys.ts';
import { request } from './request.ts';

/** The members of the club; administrators only. */
export const membersQuery = queryOptions({
  queryKey: queryKeys.members,
  queryFn: ({ signal }) => request<List<Member>>('GET', '/api/members', { signal }),
});

export const useChangeMember = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, change }: { id: string; change: MemberChange }) =>
      request<Member>('PATCH', `/api/members/${id}`, { body: change }),
    // After a refusal too: a 409 means that the list is old. An administrator may have changed themselves.
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: queryKeys.members }),
        client.invalidateQueries({ queryKey: queryKeys.me }),
      ]),
  });
};
