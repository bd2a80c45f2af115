import { type QueryKey, useQueryClient } from '@tanstack/react-query';
import { restOnBench } from './query-keys.ts';

/** Reads a part of the bench afresh, and lets go of everything that was worked out from it. */
export const useRefreshBench = (changed: QueryKey) => {
  const client = useQueryClient();
  return async (): Promise<void> => {
    for (const queryKey of restOnBench) void client.invalidateQueries({ queryKey });
    await client.invalidateQueries({ queryKey: changed });
  };
};
