import { useQuery, type UseQueryResult } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { estimate } from '#shared/core/estimate.ts';
import { logQueries } from '../queries.ts';
import type { Stood } from './compare-states.ts';

/** A saved state by its version, or what lies on the desk now. */
export type Side = number | 'now';

type StoodQuery = Pick<UseQueryResult<Stood>, 'data' | 'error' | 'isPending' | 'refetch'>;

/** A state with its figures, worked out here: the same calculator for both sides, whatever it was saved with. */
export function useStood(gliderId: string, side: Side, workspace: Workspace): StoodQuery {
  const now = useValidPlan(workspace);
  const query = useQuery({
    ...logQueries.state(gliderId, side === 'now' ? 0 : side),
    enabled: side !== 'now',
  });
  const plan = side === 'now' ? now : query.data?.plan;
  const own = side === 'now' ? workspace.result : null;
  const data = useMemo(
    (): Stood | undefined => (plan ? { plan, result: own ?? estimate(plan) } : undefined),
    [plan, own],
  );
  if (side === 'now') {
    const error = data
      ? null
      : new Error('What lies on the desk has to be mended before it can be compared.');
    return { data, error, isPending: false, refetch: query.refetch } as StoodQuery;
  }
  return { data, error: query.error, isPending: query.isPending, refetch: query.refetch } as StoodQuery;
}
