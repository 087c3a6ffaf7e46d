import type { Item, Plan } from '#shared/core/plan.ts';
import { withWood } from '#shared/core/wood-groups.ts';
import { isBallast } from '#shared/core/wood-trial-base.ts';
import { type Trial } from '#shared/core/wood-trial.ts';

/** Ballast that trims a trial: g, and mm aft of the datum. */
export interface TrimWeight {
  mass: number;
  x: number;
}

/** The plan as a trial would have it built: in its woods, with this ballast in place of the plan's own. */
export function trimmedPlan(
  plan: Plan,
  { materials }: Pick<Trial, 'materials'>,
  weights: readonly TrimWeight[],
): Plan {
  const ballast = weights
    .filter(({ mass }) => mass > 0)
    .map(({ mass, x }, i): Item => ({
      id: freeId(plan, i),
      name: 'Ballast',
      group: 'ballast',
      mass,
      at: [x, 0, 0],
    }));
  const items = [...plan.items.filter((item) => !isBallast(item)), ...ballast];
  return withWood({ ...plan, items }, materials);
}

function freeId({ items }: Plan, n: number): string {
  let id = `trim-${n + 1}`;
  while (items.some((item) => item.id === id)) id += '-';
  return id;
}
