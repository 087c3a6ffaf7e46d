import { isAlike } from './alike.ts';
import { agreed, chosen, mergeFields, type Settle, type Three } from './merge-fields.ts';
import { mergeList, wholeConflict } from './merge-lists.ts';
import type { Panel } from './plan.ts';

type Panels = readonly Panel[];
interface Numbered {
  key: string;
  panel: Panel;
}

/**
 * Panels have no key, only a place. Where one side alone added or removed some, and it can be told which, they are
 * joined panel by panel; else the whole row of panels is one value, for which `settle` is asked. `surface` is the
 * key of the surface that they are of.
 * @example mergePanels('wing', { base: EXAMPLE_WING.panels, mine: [...EXAMPLE_WING.panels, ...EXAMPLE_WING.panels], theirs: EXAMPLE_WING.panels }, () => 'mine').length // → 2
 */
export function mergePanels(surface: string, three: Three<Panels>, settle: Settle): Panel[] {
  const whole = agreed(three);
  if (whole) return [...whole.value];
  const { base, mine, theirs } = three;
  const own = base.map((_, i) => String(i + 1));
  const [here, there] = [alignedKeys(base, mine), alignedKeys(base, theirs)];
  const recut = (keys: readonly string[]) => keys.join() !== own.join();
  const path = `surfaces/${surface}`;
  if (!here || !there || (recut(here) && recut(there))) {
    const where = { path, name: surface };
    const told = (panels: Panels) => [`${panels.length} panels`];
    return [...chosen(three, settle(wholeConflict(where, told(mine), told(theirs), 'panels')))];
  }
  const numbered = (panels: Panels, keys: readonly string[]): Numbered[] =>
    panels.map((panel, i) => ({ key: keys[i] ?? '', panel }));
  return mergeList(
    { base: numbered(base, own), mine: numbered(mine, here), theirs: numbered(theirs, there) },
    {
      path: `${path}/panels`,
      keyOf: ({ key }) => key,
      nameOf: ({ key }) => `${surface}, panel ${key}`,
      kindOf: () => 'panel',
      merge: (where, sides) => ({
        key: sides.mine.key,
        panel: mergeFields(
          where,
          { base: sides.base?.panel, mine: sides.mine.panel, theirs: sides.theirs.panel },
          settle,
        ),
      }),
    },
    settle,
  ).map(({ panel }) => panel);
}

/**
 * For each panel of a side the number of the one of the base that it is, or was before it was changed; `new-1` and
 * so on for the others, which may only follow the last. Null where changed panels and new ones cannot be told apart:
 * a panel before one of the base's may be new there, or be the base's own, changed, with a copy of it put behind.
 */
function alignedKeys(base: Panels, side: Panels): string[] | null {
  const pairs = [...commonPairs(base, side), [base.length, side.length] as const];
  const keys: string[] = [];
  let [b, s] = [0, 0];
  for (const [toBase, toSide] of pairs) {
    const [before, after] = [toBase - b, toSide - s];
    if (before !== after && before > 0 && after > 0) return null;
    if (before === 0 && after > 0 && toBase < base.length) return null;
    for (let i = 0; i < after; i++) keys.push(before === 0 ? `new-${keys.length + 1}` : String(b + i + 1));
    if (toSide < side.length) keys.push(String(toBase + 1));
    [b, s] = [toBase + 1, toSide + 1];
  }
  return keys;
}

/** Longest common run of unchanged panels, as pairs of places. */
function commonPairs(base: Panels, side: Panels): (readonly [number, number])[] {
  const longest = new Map<number, (readonly [number, number])[]>();
  const place = (i: number, j: number) => i * (side.length + 1) + j;
  const at = (i: number, j: number) => longest.get(place(i, j)) ?? [];
  for (let i = base.length - 1; i >= 0; i--) {
    for (let j = side.length - 1; j >= 0; j--) {
      const [down, right] = [at(i + 1, j), at(i, j + 1)];
      const pairs = isAlike(base[i], side[j])
        ? [[i, j] as const, ...at(i + 1, j + 1)]
        : down.length >= right.length
          ? down
          : right;
      longest.set(place(i, j), pairs);
    }
  }
  return at(0, 0);
}
