import { QueryClient } from '@tanstack/react-query';

/** A refusal is final, and only a lost connection is worth another try. */
export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      staleTime: 30_000,
      refetchOnWindowFocus: false,
      retry: (failures, error) => error instanceof TypeError && failures < 2,
    },
  },
});
