import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type {
  Invitation,
  InvitationAcceptance,
  InvitationCreate,
  InvitationMade,
  InvitationOffer,
} from '#shared/api/people.ts';
import type { List } from './list.ts';
import { queryKeys } from './query-keys.ts';
import { create, request } from './request.ts';

/** Invitations, newest first; administrators only. */
export const invitationsQuery = queryOptions({
  queryKey: queryKeys.invitations,
  queryFn: ({ signal }) => request<List<Invitation>>('GET', '/api/invitations', { signal }),
});

export const useInvite = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (given: InvitationCreate) => create<InvitationMade>('/api/invitations', given),
    onSuccess: () => client.invalidateQueries({ queryKey: queryKeys.invitations }),
  });
};

const pathOf = (code: string): string => `/api/invitations/${encodeURIComponent(code)}`;

/** What an invitation link offers. */
export const invitationOfferQuery = (code: string) =>
  queryOptions({
    queryKey: [...queryKeys.invitations, 'offer', code],
    queryFn: ({ signal }) => request<InvitationOffer>('GET', pathOf(code), { signal }),
    // The answer changes only by being used, which happens on this page.
    staleTime: Number.POSITIVE_INFINITY,
  });

/** Makes the account; signing in is a step of its own. */
export const acceptInvitation = (code: string, given: InvitationAcceptance) =>
  request<{ id: string; email: string }>('POST', `${pathOf(code)}/acceptance`, { body: given });
