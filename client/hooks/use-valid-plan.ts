import { useState } from 'react';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';

/**
 * The plan that `workspace.result` is made from: the present one, or the last one that was valid; null where the
 * page was opened on one that is not.
 */
export function useValidPlan({ plan, issues }: Pick<Workspace, 'plan' | 'issues'>): Plan | null {
  const valid = issues.size === 0;
  const [last, setLast] = useState<Plan | null>(valid ? plan : null);
  if (valid && last !== plan) setLast(plan);
  return valid ? plan : last;
}
