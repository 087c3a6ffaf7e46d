import { percentOfMac, positionOfPercent } from './balance.ts';
import { ballastFor, type BallastRefusal } from './ballast.ts';
import { estimate } from './estimate.ts';
import { loadingOf } from './loading.ts';
import type { Item, Plan } from './plan.ts';
import { wingReference, type WingReference } from './wing-reference.ts';
import { withWood, type TrialWood } from './wood-groups.ts';

/** A set of woods to compare, by group (`woodGroups`); what is not named stays as drawn. */
export interface Trial {
  name: string;
  materials: Readonly<Record<string, TrialWood>>;
}

/** Why a trial cannot be trimmed. */
export type TrialRefusal = BallastRefusal | { refused: 'no_mass' };

/** What a trial comes to, without ballast and re-trimmed. Masses g. */
export interface TrialResult {
  name: string;
  /** parts of all wings */
  wingMass: number;
  /** everything but the ballast */
  bare: number;
  /** standard uncertainty of `bare` */
  u: number;
  /** balance without ballast, % MAC; null without a wing */
  percentMac: number | null;
  /** at the arm asked for; null where it cannot be trimmed there */
  ballast: number | null;
  /** bare and ballast */
  allUp: number | null;
  /** g/dm², all up */
  wingLoading: number | null;
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
 * True of items that trim the model, and that a fair comparison leaves out: those of the group `ballast`, in
 * capitals or not.
 * @example isBallast({ group: 'Ballast' }) // → true
 */
export function isBallast(item: Pick<Item, 'group'>): boolean {
  return item.group.trim().toLowerCase() === 'ballast';
}

/**
 * Woods side by side at equal terms: each trial is estimated without the plan's ballast and trimmed by new ballast
 * at `arm`, mm aft of the datum, to the plan's wanted balance point, or to its own where none is wanted. A trial
 * that cannot be trimmed there says why in `refused`.
 * @throws RangeError when a part or solid names a material that the plan does not hold
 * @example runTrials(EXAMPLE_PLAN, [{ name: 'As drawn', materials: {} }], { arm: -20 }).results[0].bare // → 9.256
 */
export function runTrials(plan: Plan, trials: readonly Trial[], { arm }: { arm: number }): TrialRun {
  const reference = wingReference(plan);
  const wanted =
    plan.target && reference
      ? positionOfPercent(plan.target.percentMac, reference.xLeMac, reference.mac)
      : estimate(plan).balance.x;
  const bare = { ...plan, items: plan.items.filter((item) => !isBallast(item)) };
  return {
    wanted,
    takenOff: plan.items.filter(isBallast).reduce((sum, { mass }) => sum + mass, 0),
    results: trials.map((trial) =>
      resultOf(withWood(bare, trial.materials), trial.name, { arm, wanted, reference }),
    ),
  };
}

function resultOf(
  plan: Plan,
  name: string,
  { arm, wanted, reference }: { arm: number; wanted: number | null; reference: WingReference | null },
): TrialResult {
  const { totals, balance } = estimate(plan);
  const found =
    balance.x === null || wanted === null
      ? ({ refused: 'no_mass' } as const)
      : ballastFor(totals.mass, balance.x, wanted, arm);
  const ballast = 'mass' in found ? found.mass : null;
  const allUp = ballast === null ? null : totals.mass + ballast;
  return {
    name,
    wingMass: totals.wingMass,
    bare: totals.mass,
    u: totals.u,
    percentMac:
      balance.x === null || !reference ? null : percentOfMac(balance.x, reference.xLeMac, reference.mac),
    ballast,
    allUp,
    wingLoading: allUp === null || !reference ? null : loadingOf(allUp, reference.area),
    refused: 'mass' in found ? null : found,
  };
}
