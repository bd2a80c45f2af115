import { queryOptions, useMutation } from '@tanstack/react-query';
import type { Machine, MachineCreate } from '#shared/api/bench.ts';
import type { List } from './list.ts';
import { queryKeys } from './query-keys.ts';
import { useRefreshBench } from './refresh-bench.ts';
import { create, request } from './request.ts';

/** The member's own machines, oldest first. */
export const machinesQuery = queryOptions({
  queryKey: queryKeys.machines,
  queryFn: ({ signal }) => request<List<Machine>>('GET', '/api/machines', { signal }),
});

export const useAddMachine = () => {
  const refresh = useRefreshBench(queryKeys.machines);
  return useMutation({
    mutationFn: (given: MachineCreate) => create<Machine>('/api/machines', given),
    onSuccess: refresh,
  });
};

export const useChangeMachine = () => {
  const refresh = useRefreshBench(queryKeys.machines);
  return useMutation({
    mutationFn: ({ id, version, given }: { id: string; version: number; given: MachineCreate }) =>
      request<Machine>('PATCH', `/api/machines/${id}`, { body: { ...given, version } }),
    onSuccess: refresh,
  });
};

export const useRemoveMachine = () => {
  const refresh = useRefreshBench(queryKeys.machines);
  return useMutation({
    mutationFn: (id: string) => request<undefined>('DELETE', `/api/machines/${id}`),
    onSuccess: refresh,
  });
};
