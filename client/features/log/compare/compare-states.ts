import type { PlanChange } from '#shared/core/field-changes.ts';
import { planChanges } from '#shared/core/plan-changes.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate, Line } from '#shared/core/result.ts';
import { sheetGroupKey } from '#shared/core/sheet-groups.ts';

/** A state with what it works out to. */
export interface Stood {
  plan: Plan;
  result: Estimate;
}

/** One part on both sides; null where it is not there. */
export interface ComparedLine {
  id: string;
  name: string;
  /** group of the balance sheet that it stands in */
  group: string;
  before: Pick<Line, 'mass' | 'at'> | null;
  after: Pick<Line, 'mass' | 'at'> | null;
  /** its own; empty where it only follows from others */
  changes: PlanChange[];
  differs: boolean;
}

export interface Comparison {
  lines: ComparedLine[];
  /** changes that belong to no single part: panels, materials, the wanted balance */
  others: PlanChange[];
  massBy: number;
  /** mm aft; null where one of the two has no balance point */
  balanceBy: number | null;
}

/** Less is no difference: g, and mm. */
const NOTHING = { mass: 0.0005, arm: 0.005 };

/** Two states part by part, in the order of the later one; what was removed stands behind what it stood behind. */
export function compareStates(before: Stood, after: Stood): Comparison {
  const changes = planChanges(before.plan, after.plan);
  const own = new Map<string, PlanChange[]>();
  for (const change of changes) {
    const id = change.field === 'order' ? null : lineOfPath(change.path);
    if (id !== null) own.set(id, [...(own.get(id) ?? []), change]);
  }
  const [earlier, later] = [byId(before.result.lines), byId(after.result.lines)];
  const lines = orderOf(before.result.lines, after.result.lines).map((id): ComparedLine => {
    const [was, is] = [earlier.get(id) ?? null, later.get(id) ?? null];
    const line = is ?? was;
    const mine = own.get(id) ?? [];
    const differs = mine.length > 0 || was === null || is === null || measures(was, is);
    return {
      id,
      name: line?.name ?? id,
      group: line ? sheetGroupKey(line) : '',
      before: was,
      after: is,
      changes: mine,
      differs,
    };
  });
  const told = new Set(lines.flatMap((line) => line.changes));
  const [x, y] = [before.result.balance.x, after.result.balance.x];
  return {
    lines,
    others: changes.filter((change) => !told.has(change)),
    massBy: after.result.totals.mass - before.result.totals.mass,
    balanceBy: x === null || y === null ? null : y - x,
  };
}

/** Id of the line that a path leads to: `wing/spar` of `surfaces/wing/parts/spar`. */
function lineOfPath(path: string): string | null {
  const [, part] = /^surfaces\/(.+\/)parts\/(?=.)/.exec(path) ?? [];
  if (part !== undefined) return part + path.slice(`surfaces/${part}parts/`.length);
  if (path.startsWith('items/')) return `item/${path.slice('items/'.length)}`;
  return path.startsWith('solids/') ? `solid/${path.slice('solids/'.length)}` : null;
}

const byId = (lines: readonly Line[]) => new Map(lines.map((line) => [line.id, line]));

const measures = (was: Line, is: Line) =>
  Math.abs(is.mass - was.mass) > NOTHING.mass || Math.abs(is.at[0] - was.at[0]) > NOTHING.arm;

function orderOf(before: readonly Line[], after: readonly Line[]): string[] {
  const order = after.map(({ id }) => id);
  const there = new Set(order);
  let behind = -1;
  for (const { id } of before) {
    if (there.has(id)) behind = order.indexOf(id);
    else order.splice(++behind, 0, id);
  }
  return order;
}
