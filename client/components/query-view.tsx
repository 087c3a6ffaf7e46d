import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useDelayed } from '#client/hooks/use-delayed.ts';
import { ErrorScreen } from './error-screen.tsx';
import { Skeleton } from './ui/skeleton.tsx';

interface QueryViewProps<T> {
  query: Pick<UseQueryResult<T>, 'data' | 'error' | 'isPending' | 'refetch'>;
  isEmpty?: (data: T) => boolean;
  /** What to do first, where there is nothing yet. */
  empty?: ReactNode;
  /** Stands in while loading; ruled lines by default. */
  placeholder?: ReactNode;
  /** Links shown under an error. */
  otherwise?: ReactNode;
  children: (data: T) => ReactNode;
}

/** Pending, then error, then empty, then data: always in that order. Data once shown outlives a failed refresh. */
export function QueryView<T>(props: QueryViewProps<T>) {
  const { query, isEmpty, empty, placeholder, otherwise, children } = props;
  const late = useDelayed(query.isPending);
  if (query.isPending) return late ? (placeholder ?? <Skeleton />) : null;
  if (query.data === undefined) {
    return (
      <ErrorScreen error={query.error} onRetry={() => void query.refetch()}>
        {otherwise}
      </ErrorScreen>
    );
  }
  if (empty !== undefined && isEmpty?.(query.data)) return empty;
  return children(query.data);
}
