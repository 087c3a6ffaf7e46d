import { isAlike } from '#shared/core/alike.ts';
import type { PlanChangeDto, SaveChanges } from '#shared/schemas/glider-save.ts';

/** What several saves, oldest first, came to together: a field by its first and last value, or not at all. */
export function joinChanges(saves: readonly SaveChanges[]): SaveChanges {
  const byField = new Map<string, PlanChangeDto>();
  for (const change of saves.flatMap(({ list }) => list)) {
    // What was added in these saves was added as it now is.
    if (isInsideNew(byField, change)) continue;
    if (change.field === null) joinWhole(byField, change);
    else joinField(byField, change);
  }
  return {
    list: [...byField.values()],
    more: saves.reduce((sum, { more }) => sum + more, 0),
    massBy: sumOf(saves.map(({ massBy }) => massBy)),
    balanceBy: sumOf(saves.map(({ balanceBy }) => balanceBy)),
  };
}

const keyOf = ({ path, field }: Pick<PlanChangeDto, 'path' | 'field'>) => `${path}#${field ?? ''}`;

function isInsideNew(byField: ReadonlyMap<string, PlanChangeDto>, { path, field }: PlanChangeDto): boolean {
  const steps = path.split('/');
  const own = field === null ? steps.length - 1 : steps.length;
  return steps.slice(0, own).some((_, i) => {
    const whole = byField.get(keyOf({ path: steps.slice(0, i + 1).join('/'), field: null }));
    return whole !== undefined && whole.from === null && whole.to !== null;
  });
}

function joinField(byField: Map<string, PlanChangeDto>, change: PlanChangeDto): void {
  const key = keyOf(change);
  const earlier = byField.get(key);
  const from = earlier ? earlier.from : change.from;
  const back = earlier !== undefined && change.field !== 'order' && isAlike(from, change.to);
  if (back) byField.delete(key);
  else byField.set(key, { ...change, from });
}

function joinWhole(byField: Map<string, PlanChangeDto>, change: PlanChangeDto): void {
  const { path, to } = change;
  for (const [key, other] of byField) {
    const inside = other.path.startsWith(`${path}/`) || (other.path === path && other.field !== null);
    if (to === null && inside) byField.delete(key);
  }
  const key = keyOf(change);
  const earlier = byField.get(key);
  // Added and removed again: as if nothing had been.
  if (earlier && earlier.from === null && to === null) byField.delete(key);
  else if (earlier && earlier.from === to) byField.delete(key);
  else byField.set(key, earlier ? { ...change, from: earlier.from } : change);
}

/** Null as soon as one of them is not known. */
function sumOf(values: readonly (number | null)[]): number | null {
  return values.reduce((sum, value) => (sum === null || value === null ? null : sum + value), 0);
}
