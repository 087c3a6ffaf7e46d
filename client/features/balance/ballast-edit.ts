import type { Vec3 } from '#shared/core/frame.ts';
import type { Item, Plan } from '#shared/core/plan.ts';

/** The plan with a piece of ballast more. */
export function withBallast(plan: Plan, name: string, mass: number, at: Vec3): Plan {
  const taken = new Set(plan.items.map(({ id }) => id));
  let id = 'ballast';
  for (let n = 2; taken.has(id); n++) id = `ballast-${n}`;
  return { ...plan, items: [...plan.items, { id, name, group: 'ballast', mass, at }] };
}

/** The plan with less of one piece of ballast; nothing left of it takes it away. */
export function withLess(plan: Plan, id: string, mass: number): Plan {
  const items = plan.items.flatMap((item): Item[] => {
    if (item.id !== id) return [item];
    const left = item.mass - mass;
    return left > 0 ? [{ ...item, mass: left }] : [];
  });
  return { ...plan, items };
}
