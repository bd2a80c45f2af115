import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { meQuery } from './me.ts';
import { isProblem } from './problem-error.ts';

/** A 401 from any call means that the session is over, whatever was known of it. */
export const useEndOfSession = (): void => {
  const client = useQueryClient();
  useEffect(() => {
    const end = (error: unknown) => {
      const isOver = isProblem(error, 401) && error.problem.type === 'session.missing';
      if (isOver && client.getQueryData(meQuery.queryKey) != null)
        client.setQueryData(meQuery.queryKey, null);
    };
    const stopQueries = client.getQueryCache().subscribe((event) => {
      if (event.type === 'updated' && event.action.type === 'error') end(event.action.error);
    });
    const stopMutations = client.getMutationCache().subscribe((event) => {
      if (event.type === 'updated' && event.action.type === 'error') end(event.action.error);
    });
    return () => {
      stopQueries();
      stopMutations();
    };
  }, [client]);
};
