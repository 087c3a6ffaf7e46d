import type { PlanChange } from './field-changes.ts';
import { conflictId, type Settle, type Three } from './merge-fields.ts';

type Keys = readonly string[];

/**
 * The order of what is left of a list, by keys: of those that are `kept`. Things that are on both sides stand as
 * the side has them that moved any; what one side added stands behind what it stood behind there. Things added by
 * both at one place stand by their keys, so that it does not matter who merges. Where both moved some, and not
 * alike, `settle` is asked for the order of the list at `path`.
 * @example mergedOrder('items', { base: ['a'], mine: ['a', 'b'], theirs: ['c', 'a'] }, new Set(['a', 'b', 'c']), () => 'mine') // → ['c', 'a', 'b']
 */
export function mergedOrder(
  path: string,
  { base, mine, theirs }: Three<Keys>,
  kept: ReadonlySet<string>,
  settle: Settle,
): string[] {
  const [here, there] = [new Set(mine), new Set(theirs)];
  const inBoth = (key: string) => kept.has(key) && here.has(key) && there.has(key);
  const spine = spineOf(
    path,
    { base: base.filter(inBoth), mine: mine.filter(inBoth), theirs: theirs.filter(inBoth) },
    settle,
  );
  const common = new Set(spine);
  const sides = [runsBehind(mine, common, kept), runsBehind(theirs, common, kept)];
  return [null, ...spine].flatMap((key) => [
    ...(key === null ? [] : [key]),
    ...sides
      .flatMap((runs) => runs.get(key) ?? [])
      .sort(byFirst)
      .flat(),
  ]);
}

function spineOf(path: string, { base, mine, theirs }: Three<Keys>, settle: Settle): Keys {
  const alike = (a: Keys, b: Keys) => a.join('\n') === b.join('\n');
  if (alike(mine, theirs)) return theirs;
  const old = new Set(base);
  const moved = (side: Keys) =>
    !alike(
      side.filter((key) => old.has(key)),
      base,
    );
  if (moved(mine) !== moved(theirs)) return moved(mine) ? mine : theirs;
  const order: PlanChange = { path, name: '', field: 'order', from: null, to: null, unit: null };
  const choice = settle({
    id: conflictId(path, 'order'),
    path,
    name: '',
    field: 'order',
    mine: [order],
    theirs: [order],
    canKeepBoth: false,
  });
  return choice === 'theirs' ? theirs : mine;
}

/** Runs of things that only this side has, under the common thing that each stands behind; null at the start. */
function runsBehind(
  keys: Keys,
  common: ReadonlySet<string>,
  kept: ReadonlySet<string>,
): Map<string | null, string[][]> {
  const runs = new Map<string | null, string[][]>();
  let behind: string | null = null;
  for (const key of keys) {
    if (common.has(key)) behind = key;
    else if (kept.has(key)) {
      const [run = []] = runs.get(behind) ?? [];
      runs.set(behind, [[...run, key]]);
    }
  }
  return runs;
}

const byFirst = ([a = '']: string[], [b = '']: string[]) => (a < b ? -1 : a > b ? 1 : 0);
