import { queryOptions, useMutation } from '@tanstack/react-query';
import type { Bit, BitCreate } from '#shared/api/bench.ts';
import type { List } from './list.ts';
import { queryKeys } from './query-keys.ts';
import { useRefreshBench } from './refresh-bench.ts';
import { create, request } from './request.ts';

/** The member's own bits, oldest first. */
export const bitsQuery = queryOptions({
  queryKey: queryKeys.bits,
  queryFn: ({ signal }) => request<List<Bit>>('GET', '/api/bits', { signal }),
});

export const useAddBit = () => {
  const refresh = useRefreshBench(queryKeys.bits);
  return useMutation({
    mutationFn: (given: BitCreate) => create<Bit>('/api/bits', given),
    onSuccess: refresh,
  });
};

export const useChangeBit = () => {
  const refresh = useRefreshBench(queryKeys.bits);
  return useMutation({
    mutationFn: ({ id, version, given }: { id: string; version: number; given: BitCreate }) =>
      request<Bit>('PATCH', `/api/bits/${id}`, { body: { ...given, version } }),
    onSuccess: refresh,
  });
};

export const useRemoveBit = () => {
  const refresh = useRefreshBench(queryKeys.bits);
  return useMutation({
    mutationFn: (id: string) => request<undefined>('DELETE', `/api/bits/${id}`),
    onSuccess: refresh,
  });
};
