import { QueryClient } from '@tanstack/react-query';
import { isPassing } from './api.ts';

/** What was fetched stays fresh for half a minute; only what may pass by itself is tried again. */
export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 30_000,
        retry: (count, error) => count < 2 && isPassing(error),
        networkMode: 'always',
      },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
}
