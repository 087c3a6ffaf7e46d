import { ballastFor } from '#shared/core/ballast.ts';
import type { Vec3 } from '#shared/core/frame.ts';
import type { Item, Plan } from '#shared/core/plan.ts';
import { isBallast } from '#shared/core/wood-trial-base.ts';

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

/** Ballast that may come off a nose-heavy model. */
export interface SpareBallast {
  item: Item;
  /** g; all of the piece where that is not enough */
  takeOff: number;
  enough: boolean;
}

/**
 * The foremost piece of ballast that puts a nose-heavy model right by losing mass; where none alone does, the
 * foremost one, whole. Null where no ballast lies ahead of the wanted point.
 */
export function spareBallast(
  items: readonly Item[],
  mass: number,
  from: number,
  to: number,
): SpareBallast | null {
  const ahead = items
    .filter((item) => isBallast(item) && item.at[0] < to && item.mass > 0)
    .sort((a, b) => a.at[0] - b.at[0]);
  for (const item of ahead) {
    const off = ballastFor(mass, from, to, item.at[0]);
    if ('takeOff' in off && off.takeOff !== null && off.takeOff <= item.mass) {
      return { item, takeOff: off.takeOff, enough: true };
    }
  }
  const [foremost] = ahead;
  return foremost ? { item: foremost, takeOff: foremost.mass, enough: false } : null;
}
