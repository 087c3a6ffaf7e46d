import { NOTHING } from '../lump.ts';
import { observe, type Belief } from './belief.ts';
import type { SidedLine } from './sided-lines.ts';
import { placesOf, type Covered, type Weighing } from './weighing.ts';

/** The spread of a material, by its key. */
export type Spreads = Readonly<Record<string, { cv: number }>>;

/** What a weighing said against what was expected of it. */
export interface Heard {
  id: string;
  /** what it covers and was not on the scale before, by place */
  fresh: number[];
  /** as drawn, and as forecast just before it, g */
  estimated: number;
  expected: number;
  /** standard uncertainty of `expected` against the scale, g */
  uExpected: number;
  measured: number;
  u: number;
  /** what the fresh parts weigh by it, g, with its standard uncertainty beside the material's own common share */
  rest: number;
  uRest: number;
  /** covered parts that the plan does not have any more */
  strays: Covered[];
}

/** The account while weighings are told to it one after another. */
export interface BuiltState {
  lines: readonly SidedLine[];
  /** keys of the materials, the unknowns of `belief` in this order: how much heavier than its figure each is */
  materials: string[];
  belief: Belief;
  /** half of each material's variance, that which its parts do not share */
  own: number[];
  /** of a weighed line its mass, g; null of one still to come */
  mass: (number | null)[];
  /** the weighing that counts, by line */
  by: (string | null)[];
  /** mm aft of the datum */
  x: number[];
  heard: Heard[];
}

/**
 * Half of a material's variance is taken as common to all its parts (one batch, one shop, one day), half as each
 * part's own (common practice, no source): without a common half a weighed part would tell nothing of the next.
 */
export const COMMON_HALF = 0.5;

/**
 * The account before anything was weighed.
 * @example startBuilt(sidedLines(EXAMPLE_PLAN), EXAMPLE_PLAN.materials).belief.mean // → [1]
 */
export function startBuilt(lines: readonly SidedLine[], spreads: Spreads): BuiltState {
  const materials = [...new Set(lines.flatMap(({ material }) => material ?? []))];
  const common = materials.map((key) => COMMON_HALF * (spreads[key]?.cv ?? 0) ** 2);
  return {
    lines,
    materials,
    belief: {
      mean: materials.map(() => 1),
      cov: common.map((c, i) => common.map((_, j) => (i === j ? c : 0))),
    },
    own: materials.map((key) => (1 - COMMON_HALF) * (spreads[key]?.cv ?? 0) ** 2),
    mass: lines.map(() => null),
    by: lines.map(() => null),
    x: lines.map(({ at }) => at[0]),
    heard: [],
  };
}

const placeOf = (state: BuiltState, i: number) => state.materials.indexOf(state.lines[i]?.material ?? '');

/**
 * Mass of a line as it stands, g: weighed, or its estimate times what is held of its material.
 * @example massAt(EXAMPLE_BUILT, 0) // → 1.128
 */
export function massAt(state: BuiltState, i: number): number {
  const estimated = state.lines[i]?.mass ?? 0;
  return state.mass[i] ?? estimated * (state.belief.mean[placeOf(state, i)] ?? 1);
}

/**
 * Variance that a line still to come has for itself, g², beside what it shares with its material.
 * @example ownVariance(EXAMPLE_BUILT, 0).toFixed(6) // → '0.006362'
 */
export function ownVariance(state: BuiltState, i: number): number {
  const line = state.lines[i];
  if (!line) return 0;
  return line.material === null ? line.u ** 2 : line.mass ** 2 * (state.own[placeOf(state, i)] ?? 0);
}

/**
 * Estimated grams of some lines by material: the weights of what is held of the materials.
 * @example weightsOf(EXAMPLE_BUILT, [0, 1]) // → [2.256]
 */
export function weightsOf(state: BuiltState, places: readonly number[], factor = (_: number) => 1): number[] {
  const weights = state.materials.map(() => 0);
  for (const i of places) {
    const k = placeOf(state, i);
    if (k >= 0) weights[k] = (weights[k] ?? 0) + (state.lines[i]?.mass ?? 0) * factor(i);
  }
  return weights;
}

/**
 * Tells a weighing to the account. What was on the scale before keeps its reading and the fresh parts take the rest
 * in proportion to what was expected of them; where nothing is fresh, or no rest is left for it, all take what they
 * weigh together in proportion. Only fresh parts tell something of their materials, so that nothing counts twice.
 * @example hear(EXAMPLE_BUILT, { id: 'a', covers: [{ line: 'wing/ribs', side: 'port' }], mass: 1.2, u: 0.03 }).mass[0] // → 1.2
 */
export function hear(state: BuiltState, weighing: Weighing): BuiltState {
  const { places, strays } = placesOf(state.lines, weighing);
  const fresh = places.filter((i) => state.mass[i] === null);
  const before = places.filter((i) => state.mass[i] !== null);
  const sum = (of: readonly number[]) => of.reduce((total, i) => total + massAt(state, i), 0);
  const [expected, known] = [sum(places), sum(before)];
  const rest = weighing.mass - known;
  const takesRest = fresh.length > 0 && rest > NOTHING && expected - known > NOTHING;
  const factorOf = (i: number) => {
    if (!takesRest) return expected > NOTHING ? weighing.mass / expected : 1;
    return state.mass[i] === null ? rest / (expected - known) : 1;
  };
  const weights = weightsOf(state, fresh);
  const uKnown = before.reduce((total, i) => total + knownVariance(state, i), 0);
  const own = fresh.reduce((total, i) => total + ownVariance(state, i), 0);
  const variance = weighing.u ** 2 + uKnown + own;
  const items = fresh.filter((i) => placeOf(state, i) < 0);
  const told =
    takesRest && fresh.length > items.length
      ? observe(state.belief, { weights, value: rest - sum(items), variance })
      : state.belief;
  const common = state.belief.cov.reduce(
    (total, row, i) => total + row.reduce((t, c, j) => t + c * (weights[i] ?? 0) * (weights[j] ?? 0), 0),
    0,
  );
  const mass = [...state.mass];
  const by = [...state.by];
  const x = [...state.x];
  for (const i of places) {
    mass[i] = expected > NOTHING ? massAt(state, i) * factorOf(i) : weighing.mass / places.length;
    by[i] = weighing.id;
  }
  if (weighing.x !== undefined && weighing.mass > NOTHING) {
    const moment = places.reduce((total, i) => total + (mass[i] ?? 0) * (x[i] ?? 0), 0);
    for (const i of places) x[i] = (x[i] ?? 0) + weighing.x - moment / weighing.mass;
  }
  const heard: Heard = {
    id: weighing.id,
    fresh,
    estimated: places.reduce((total, i) => total + (state.lines[i]?.mass ?? 0), 0),
    expected,
    uExpected: Math.sqrt(variance + common),
    measured: weighing.mass,
    u: weighing.u,
    rest,
    uRest: Math.sqrt(variance),
    strays,
  };
  return { ...state, belief: told, mass, by, x, heard: [...state.heard, heard] };
}

/** Share of a weighing's variance that one of its lines carries, g². */
function knownVariance(state: BuiltState, i: number): number {
  const id = state.by[i];
  const heard = state.heard.find((one) => one.id === id);
  const together = state.by.reduce((total, by, j) => total + (by === id ? (state.mass[j] ?? 0) : 0), 0);
  return heard && together > NOTHING ? (heard.u ** 2 * (state.mass[i] ?? 0)) / together : 0;
}
