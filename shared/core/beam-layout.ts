import {
  between,
  candidates,
  CHOICES,
  ownCost,
  reach,
  type HungLabel,
  type HungPlace,
  type Placed,
} from './beam-places.ts';

/** Rounds, at the most, in which weights move to better places. */
const PASSES = 4;

/**
 * Depth and side of the label for weights hung from one bar, so that no weight or label covers another and, where
 * it can be helped, no string crosses one. Deeper rows are used only where the shallow ones are taken. `posts` are
 * upright lines through the drawing that labels keep clear of. Same input, same answer.
 * @param hung the weights, in the units of the drawing
 * @param width of the drawing, from x = 0; labels stay inside it where they can
 * @returns one place for each weight, in the order given
 * @example layHung([{ key: 'a', x: 100, radius: 10, width: 40, height: 12 }], 200)[0].string // → 30
 */
export function layHung(
  hung: readonly HungLabel[],
  width: number,
  posts: readonly number[] = [],
): HungPlace[] {
  const choices = hung.map(candidates);
  const costs = costTables(hung, choices, width, posts);
  const chosen: number[] = [];
  hung.forEach((_, i) => {
    chosen[i] = leastOf(aloneCosts(i, chosen, costs, []));
  });
  for (let pass = 0; pass < PASSES; pass++) {
    const one = moveOne(chosen, costs);
    const two = moveTwo(chosen, costs);
    if (!one && !two) break;
  }
  return chosen.flatMap((candidate, i) => choices[i]?.[candidate]?.place ?? []);
}

/** What each candidate of each weight costs by itself, and what two of them cost together; null: nothing ever. */
interface Costs {
  own: number[][];
  pair: (Float64Array | null)[][];
}

function costTables(
  hung: readonly HungLabel[],
  choices: readonly Placed[][],
  width: number,
  posts: readonly number[],
): Costs {
  const own = choices.map((all) => all.map((one) => ownCost(one, width, posts)));
  const pair = choices.map((): (Float64Array | null)[] => choices.map(() => null));
  choices.forEach((all, i) => {
    for (let j = 0; j < i; j++) {
      const [a, b, others] = [hung[i], hung[j], choices[j]];
      if (!a || !b || !others || Math.abs(a.x - b.x) > reach(a) + reach(b)) continue;
      const [forward, back] = [new Float64Array(CHOICES * CHOICES), new Float64Array(CHOICES * CHOICES)];
      all.forEach((mine, m) => {
        others.forEach((other, o) => {
          const cost = between(mine, other);
          forward[m * CHOICES + o] = cost;
          back[o * CHOICES + m] = cost;
        });
      });
      put(pair, i, j, forward);
      put(pair, j, i, back);
    }
  });
  return { own, pair };
}

function put(table: (Float64Array | null)[][], i: number, j: number, costs: Float64Array): void {
  const row = table[i];
  if (row) row[j] = costs;
}

/** What each candidate of a weight costs beside the chosen ones of the others, some left out. */
function aloneCosts(
  i: number,
  chosen: readonly number[],
  { own, pair }: Costs,
  without: readonly number[],
): number[] {
  const costs = [...(own[i] ?? [])];
  chosen.forEach((candidate, j) => {
    const table = pair[i]?.[j];
    if (j === i || !table || without.includes(j)) return;
    for (let m = 0; m < CHOICES; m++) costs[m] = (costs[m] ?? 0) + (table[m * CHOICES + candidate] ?? 0);
  });
  return costs;
}

function leastOf(costs: readonly number[]): number {
  let least = 0;
  costs.forEach((cost, m) => {
    if (cost < (costs[least] ?? 0)) least = m;
  });
  return least;
}

/** Gives each its best place among the others as they are; true where that changed one. */
function moveOne(chosen: number[], costs: Costs): boolean {
  let moved = false;
  chosen.forEach((before, i) => {
    const alone = aloneCosts(i, chosen, costs, []);
    const next = leastOf(alone);
    if ((alone[next] ?? 0) >= (alone[before] ?? 0)) return;
    chosen[i] = next;
    moved = true;
  });
  return moved;
}

/** Two that stand in each other's way may both have to move; true where that helped. */
function moveTwo(chosen: number[], costs: Costs): boolean {
  let moved = false;
  for (let i = 0; i < chosen.length; i++) {
    for (let j = 0; j < i; j++) {
      const table = costs.pair[i]?.[j];
      const [a = 0, b = 0] = [chosen[i], chosen[j]];
      if (!table || table[a * CHOICES + b] === 0) continue;
      const mine = aloneCosts(i, chosen, costs, [j]);
      const other = aloneCosts(j, chosen, costs, [i]);
      const cost = (m: number, o: number) => (mine[m] ?? 0) + (other[o] ?? 0) + (table[m * CHOICES + o] ?? 0);
      let [least, m1, o1] = [cost(a, b) - 1e-9, a, b];
      for (let m = 0; m < CHOICES; m++) {
        if ((mine[m] ?? 0) >= least) continue;
        for (let o = 0; o < CHOICES; o++) if (cost(m, o) < least) [least, m1, o1] = [cost(m, o), m, o];
      }
      if (m1 === a && o1 === b) continue;
      chosen[i] = m1;
      chosen[j] = o1;
      moved = true;
    }
  }
  return moved;
}
