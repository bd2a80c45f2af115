import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Me } from '#shared/api/people.ts';
import { isProblem } from './problem-error.ts';
import { queryKeys } from './query-keys.ts';
import { request } from './request.ts';

/** The member signed in; null without a session. */
export const meQuery = queryOptions({
  queryKey: queryKeys.me,
  queryFn: async ({ signal }): Promise<Me | null> => {
    // Asking for the session answers null without one; asking for the member would be a failed request.
    const session = await request<object | null>('GET', '/api/auth/get-session', { signal });
    if (session === null) return null;
    try {
      return await request<Me>('GET', '/api/me', { signal });
    } catch (error) {
      if (isProblem(error, 401)) return null;
      throw error;
    }
  },
});

/** Starts a session. */
export const signIn = (email: string, password: string): Promise<void> =>
  request('POST', '/api/auth/sign-in/email', { body: { email, password } });

/** Ends the session. */
export const signOut = (): Promise<void> => request('POST', '/api/auth/sign-out', { body: {} });

export const useSignIn = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (given: { email: string; password: string }) => signIn(given.email, given.password),
    // Nothing of whoever was signed in before may be seen; what this page itself shows stays.
    onSuccess: async () => {
      client.removeQueries({ type: 'inactive' });
      await client.fetchQuery({ ...meQuery, staleTime: 0 });
    },
  });
};

export const useSignOut = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: signOut,
    onSuccess: () => {
      client.setQueryData(meQuery.queryKey, null);
      client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== queryKeys.me[0] });
    },
  });
};
