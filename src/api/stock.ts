import { queryOptions, useMutation } from '@tanstack/react-query';
import type { Stock, StockCreate } from '#shared/api/bench.ts';
import type { List } from './list.ts';
import { queryKeys } from './query-keys.ts';
import { useRefreshBench } from './refresh-bench.ts';
import { create, request } from './request.ts';

/** The member's own stock, oldest first. */
export const stockQuery = queryOptions({
  queryKey: queryKeys.stock,
  queryFn: ({ signal }) => request<List<Stock>>('GET', '/api/stock', { signal }),
});

export const useAddStock = () => {
  const refresh = useRefreshBench(queryKeys.stock);
  return useMutation({
    mutationFn: (given: StockCreate) => create<Stock>('/api/stock', given),
    onSuccess: refresh,
  });
};

export const useChangeStock = () => {
  const refresh = useRefreshBench(queryKeys.stock);
  return useMutation({
    mutationFn: ({ id, version, given }: { id: string; version: number; given: StockCreate }) =>
      request<Stock>('PATCH', `/api/stock/${id}`, { body: { ...given, version } }),
    onSuccess: refresh,
  });
};

export const useRemoveStock = () => {
  const refresh = useRefreshBench(queryKeys.stock);
  return useMutation({
    mutationFn: (id: string) => request<undefined>('DELETE', `/api/stock/${id}`),
    onSuccess: refresh,
  });
};
