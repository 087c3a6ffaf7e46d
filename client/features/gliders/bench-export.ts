import { request } from '#client/lib/api.ts';
import type { Plan } from '#shared/core/plan.ts';
import { glider, type GliderSummaryDto } from '#shared/schemas/glider.ts';
import { downloadJson, downloadPlan } from './plan-file.ts';

/** Plans fetched side by side. */
const AT_ONCE = 4;

/** Hands plans to the reader: one as a file of its own, several as one file that can be imported again. */
export async function exportPlans(gliders: readonly GliderSummaryDto[]): Promise<void> {
  const plans: Plan[] = [];
  for (let from = 0; from < gliders.length; from += AT_ONCE) {
    const some = await Promise.all(
      gliders
        .slice(from, from + AT_ONCE)
        .map(({ id }) => request(`/gliders/${encodeURIComponent(id)}`, glider)),
    );
    plans.push(...some.map(({ plan }) => plan));
  }
  const [only] = plans;
  if (plans.length === 1 && only) downloadPlan(only);
  else downloadJson({ plans }, `${plans.length} gliders`);
}
