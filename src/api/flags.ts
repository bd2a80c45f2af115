import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { DecisionCreate, Flag, FlagCreate } from '#shared/api/flags.ts';
import type { List } from './list.ts';
import { queryKeys, restOnDecisions } from './query-keys.ts';
import { create, request } from './request.ts';

type FlagState = Flag['state'];

const page = (state: FlagState, cursor: string | null, signal: AbortSignal) => {
  const params = new URLSearchParams({ state });
  if (cursor !== null) params.set('cursor', cursor);
  return request<List<Flag>>('GET', `/api/flags?${params}`, { signal });
};

/** The review desk, gravest and oldest first; moderators only. */
export const flagListQuery = (state: FlagState) =>
  infiniteQueryOptions({
    queryKey: [...queryKeys.flags, 'list', state],
    queryFn: ({ pageParam, signal }) => page(state, pageParam, signal),
    initialPageParam: null as string | null,
    getNextPageParam: ({ nextCursor }) => nextCursor,
  });

const everyFlag = async (state: FlagState, signal: AbortSignal): Promise<Flag[]> => {
  const flags: Flag[] = [];
  let cursor: string | null = null;
  do {
    const { items, nextCursor }: List<Flag> = await page(state, cursor, signal);
    flags.push(...items);
    cursor = nextCursor;
  } while (cursor !== null);
  return flags;
};

/** One flag with the decided ones on the same design; null when there is no such flag. */
export const flagQuery = (id: string) =>
  queryOptions({
    queryKey: [...queryKeys.flags, 'one', id],
    queryFn: async ({ signal }) => {
      const [open, decided] = await Promise.all([everyFlag('open', signal), everyFlag('decided', signal)]);
      const flag = [...open, ...decided].find((each) => each.id === id);
      if (flag === undefined) return null;
      const ofDesign = ({ id: other, design }: Flag) => other !== id && design.slug === flag.design.slug;
      return { flag, earlier: decided.filter(ofDesign) };
    },
  });

const useRefreshDecisions = () => {
  const client = useQueryClient();
  return () =>
    Promise.all(restOnDecisions.map((queryKey) => client.invalidateQueries({ queryKey: [...queryKey] })));
};

export const useRaiseFlag = () => {
  const refresh = useRefreshDecisions();
  return useMutation({
    mutationFn: (given: FlagCreate) => create<Flag>('/api/flags', given),
    onSuccess: refresh,
  });
};

export const useDecideFlag = (id: string) => {
  const refresh = useRefreshDecisions();
  return useMutation({
    mutationFn: (given: DecisionCreate) =>
      request<Flag>('POST', `/api/flags/${encodeURIComponent(id)}/decision`, { body: given }),
    onSuccess: refresh,
  });
};
