import { percentOfMac } from './balance.ts';
import type { Cause, ScatterOptions } from './draws-causes.ts';
import { layoutOf } from './draws-layout.ts';
import { drawOut } from './draws-loop.ts';
import { firstOrderOf } from './draws-first-order.ts';
import type { FoldedPlan } from './linear-model.ts';
import { weigh } from './linear-model-weigh.ts';

export interface DrawOptions extends ScatterOptions {
  /** whole number; the same seed draws the same */
  seed: number;
  /** 20,000 unless said otherwise */
  draws?: number | undefined;
}

/** Share of a variance, 0–1, told in two ways; over all causes they add up to 1, the drawn ones about. */
export interface Shares {
  /** by the slopes alone (JCGM 100:2008, 5.1.2) */
  firstOrder: number;
  /** by regression of the drawn values on the cause */
  drawn: number;
}

export interface CauseShares extends Cause {
  mass: Shares;
  /** of the balance point */
  balance: Shares;
}

/** What a model may weigh and where it may balance. */
export interface Draws {
  /** g, of each draw */
  mass: Float64Array;
  /** mm aft of the datum, of each draw; null where the plan has no mass */
  x: Float64Array | null;
  /** % MAC, of each draw; null without a wing or a mass */
  percentMac: Float64Array | null;
  /** as reckoned, without chance */
  nominal: { mass: number; x: number | null; percentMac: number | null };
  /** standard uncertainties to first order, to hold the drawn ones against */
  firstOrder: { mass: number; x: number | null; percentMac: number | null };
  /** those that scatter at all, what adds most to the mass first */
  causes: CauseShares[];
}

export const DEFAULT_DRAWS = 20_000;

/**
 * Draws masses at random, in one go: see `drawSteps`.
 * @throws RangeError when `draws` is not a whole number above 1
 * @example drawMasses(foldPlan(EXAMPLE_PLAN), { seed: 1, draws: 100 }).mass.length // → 100
 */
export function drawMasses(fold: FoldedPlan, options: DrawOptions): Draws {
  const steps = drawSteps(fold, options);
  let step = steps.next();
  while (step.done !== true) step = steps.next();
  return step.value;
}

/**
 * Draws masses at random: each line's density by its spread, sheet's thickness by its tolerance, an item by its own
 * uncertainty, lines of one measured piece together, glue by share with its wood (JCGM 101:2008). One draw is one
 * product a line; nothing is allotted in between. Rests after every thousand draws with the number drawn; how often
 * it is interrupted, and for how long, does not change the answer.
 * @throws RangeError when `draws` is not a whole number above 1
 * @example drawSteps(foldPlan(EXAMPLE_PLAN), { seed: 1, draws: 5_000 }).next() // → { value: 1000, done: false }
 */
export function* drawSteps(fold: FoldedPlan, options: DrawOptions): Generator<number, Draws, undefined> {
  const { seed, draws = DEFAULT_DRAWS } = options;
  if (!Number.isInteger(draws) || draws < 2) throw new RangeError(`${draws} draws are too few`);
  const layout = layoutOf(fold, options);
  const { mass, at, percentMac } = weigh(fold);
  const nominal = { mass, x: at?.[0] ?? null, percentMac };
  const out = yield* drawOut(fold, layout, { seed, draws });
  const first = firstOrderOf(fold, layout);
  const { wing } = fold;
  const causes = layout.causes.map((cause, i): CauseShares => {
    const sumOver = (values: Float64Array) =>
      layout.causeOf.reduce((sum, c, place) => (c === i ? sum + (values[place] ?? 0) : sum), 0);
    return {
      ...cause,
      mass: { firstOrder: sumOver(first.massShares), drawn: sumOver(out.massShares) },
      balance: { firstOrder: sumOver(first.balanceShares), drawn: sumOver(out.balanceShares) },
    };
  });
  return {
    mass: out.mass,
    x: nominal.x === null ? null : out.x,
    percentMac: nominal.x === null || !wing ? null : out.x.map((x) => percentOfMac(x, wing.xLeMac, wing.mac)),
    nominal,
    firstOrder: {
      mass: first.mass,
      x: nominal.x === null ? null : first.balance,
      percentMac: nominal.x === null || !wing ? null : (100 * first.balance) / wing.mac,
    },
    causes: causes
      .filter(({ mass: { firstOrder }, balance }) => firstOrder > 0 || balance.firstOrder > 0)
      .sort((a, b) => b.mass.firstOrder - a.mass.firstOrder),
  };
}
