import { percentOfMac } from './balance.ts';
import { ballastFor, type BallastRefusal } from './ballast.ts';
import { weigh, withOther } from './linear-model-weigh.ts';
import { foldPlan, type FoldedPlan } from './linear-model.ts';
import { worstStation } from './load-cases.ts';
import { loadingOf } from './loading.ts';
import type { Plan } from './plan.ts';
import { sparIn } from './spar.ts';
import { isBallast, trialBase, type TrialBase } from './wood-trial-base.ts';
import { withWood, woodsByLine, type TrialWood } from './wood-groups.ts';

/** A set of woods to compare, by group (`woodGroups`) or single part (`wing/ribs`); the rest stays as drawn. */
export interface Trial {
  name: string;
  materials: Readonly<Record<string, TrialWood>>;
}

/** What all trials are compared at. */
export interface TrialTerms {
  /** of the ballast, mm aft of the datum */
  arm: number;
  /** class minimum, g; null where none is set */
  minimumMass?: number | null | undefined;
}

/** Why a trial cannot be trimmed. */
export type TrialRefusal = BallastRefusal | { refused: 'no_mass' };

/** What a trial comes to, without ballast and re-trimmed. Masses g. */
export interface TrialResult {
  name: string;
  /** parts of all wings, covering and finish too */
  wingMass: number;
  /** the same without covering and finish */
  wingBare: number;
  /** everything but the ballast */
  bare: number;
  /** standard uncertainty of `bare` */
  u: number;
  /** balance without ballast, mm aft of the datum; null where nothing has a mass */
  x: number | null;
  /** the same, % MAC; null without a wing */
  percentMac: number | null;
  /** at the arm asked for; null where it cannot be trimmed there */
  ballast: number | null;
  /** what is then still missing to the class minimum, placed at the balance point */
  added: number | null;
  /** bare, ballast and what is added */
  allUp: number | null;
  /** g/dm², all up */
  wingLoading: number | null;
  /** g/dm² on wing and tailplane */
  classLoading: number | null;
  /** least margin of the spar, all up, at the plan's load factor; null where no strip carries */
  margin: number | null;
  /** station of that margin, mm from the root */
  marginAt: number | null;
  refused: TrialRefusal | null;
}

/** Trials side by side, all trimmed to one point. */
export interface TrialRun {
  /** where every trial is trimmed to, mm aft of the datum; null where the plan has no mass */
  wanted: number | null;
  /** ballast that the plan has and that every trial leaves out first, g */
  takenOff: number;
  results: TrialResult[];
}

/**
 * Woods side by side at equal terms: each trial without the plan's ballast, trimmed by new ballast at the arm of the
 * terms to the plan's wanted balance point, or to its own where none is wanted, then filled up to the class minimum
 * at that point. A trial that cannot be trimmed says why in `refused`.
 * @throws RangeError when a part or solid names a material that the plan does not hold
 * @example runTrials(EXAMPLE_PLAN, [{ name: 'As drawn', materials: {} }], { arm: -20 }).results[0].bare // → 9.256
 */
export function runTrials(plan: Plan, trials: readonly Trial[], terms: TrialTerms): TrialRun {
  return trialsFrom(trialBase(plan), trials, terms);
}

/**
 * The same from a plan measured once (`trialBase`), so that another wood costs one product.
 * @example trialsFrom(trialBase(EXAMPLE_PLAN), [{ name: 'As drawn', materials: {} }], { arm: -20 }).takenOff // → 10
 */
export function trialsFrom(base: TrialBase, trials: readonly Trial[], terms: TrialTerms): TrialRun {
  const { wanted, takenOff } = base;
  return { wanted, takenOff, results: trials.map((trial) => resultOf(base, trial, terms)) };
}

/** The plan without ballast in the woods of a trial; measured anew where its amounts say nothing of such a wood. */
function foldedIn(
  { plan, fold }: TrialBase,
  { materials }: Trial,
  woods: Record<string, TrialWood>,
): FoldedPlan {
  const bare = { ...plan, items: plan.items.filter((item) => !isBallast(item)) };
  return withOther(fold, woods) ?? foldPlan(withWood(bare, materials));
}

function resultOf(base: TrialBase, trial: Trial, { arm, minimumMass }: TrialTerms): TrialResult {
  const { wanted, covers, classArea } = base;
  const woods = woodsByLine(base.plan, trial.materials);
  const fold = foldedIn(base, trial, woods);
  const { masses, mass, wingMass, at, percentMac } = weigh(fold);
  const found =
    at === null || wanted === null ? ({ refused: 'no_mass' } as const) : ballastFor(mass, at[0], wanted, arm);
  const ballast = 'mass' in found ? found.mass : null;
  const added = ballast === null ? null : Math.max(0, (minimumMass ?? 0) - (mass + ballast));
  const allUp = ballast === null || added === null ? null : mass + ballast + added;
  const worst = allUp === null ? null : worstIn(base, woods, allUp - wingMass);
  return {
    name: trial.name,
    wingMass,
    wingBare: fold.lines.reduce(
      (sum, { id }, i) => (covers.has(id) ? sum - (masses[i] ?? 0) : sum),
      wingMass,
    ),
    bare: mass,
    u: Math.hypot(...fold.lines.map(({ cv, u }, i) => cv * (masses[i] ?? 0) + u)),
    x: at && at[0],
    percentMac,
    ballast,
    added,
    allUp,
    wingLoading: allUp === null || !fold.wing ? null : loadingOf(allUp, fold.wing.area),
    classLoading: allUp === null ? null : loadingOf(allUp, classArea),
    margin: worst?.margin ?? null,
    marginAt: worst?.s ?? null,
    refused: 'mass' in found ? null : found,
  };
}

function worstIn({ spar, plan }: TrialBase, woods: Record<string, TrialWood>, carriedG: number) {
  if (!spar) return null;
  const materialOf = ({ id, material }: { id: string; material: string }) =>
    woods[`${spar.surface}/${id}`]?.material ?? plan.materials[material];
  return worstStation(sparIn(spar.frame, materialOf, carriedG));
}

/**
 * The wanted balance point of a plan as told to a builder: % MAC of a place mm aft of the datum; null without a wing.
 * @example wantedPercent(trialBase(EXAMPLE_PLAN)) // → 40
 */
export function wantedPercent({ wanted, fold: { wing } }: TrialBase): number | null {
  return wanted === null || !wing ? null : percentOfMac(wanted, wing.xLeMac, wing.mac);
}
