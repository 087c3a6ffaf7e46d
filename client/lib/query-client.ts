import { QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiError, isPassing } from './api.ts';

/** What was fetched stays fresh for half a minute; only what may pass by itself is tried again. */
export function createQueryClient(): QueryClient {
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({
      // A session that ended elsewhere is noticed by whatever is asked next.
      onError: (error) => {
        if (error instanceof ApiError && error.status === 401)
          void client.invalidateQueries({ queryKey: ['session'] });
      },
    }),
    defaultOptions: {
      queries: {
        staleTime: 30_000,
        retry: (count, error) => count < 2 && isPassing(error),
        networkMode: 'always',
      },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
  return client;
}
