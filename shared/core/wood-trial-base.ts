import { positionOfPercent } from './balance.ts';
import { NOTHING } from './lump.ts';
import { weigh } from './linear-model-weigh.ts';
import { foldPlan, type FoldedPlan } from './linear-model.ts';
import type { Item, Plan } from './plan.ts';
import { classAreaOf } from './planform.ts';
import { sparFrame, type SparFrame } from './spar.ts';
import { surfaceLine } from './stations.ts';

/** A plan measured once for trials: whatever does not depend on what its wood weighs. */
export interface TrialBase {
  plan: Plan;
  /** without the plan's own ballast */
  fold: FoldedPlan;
  /** where trials are trimmed to, mm aft of the datum; null where the plan has no mass */
  wanted: number | null;
  /** ballast that the plan has, g */
  takenOff: number;
  /** lines of the wings that are covering or finish, by their ids */
  covers: ReadonlySet<string>;
  /** wing and tailplane, mm² */
  classArea: number;
  /** of the first wing; null without one */
  spar: { surface: string; frame: SparFrame } | null;
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
 * Measures a plan for its trials: folds it, cuts its spars, and finds where it is to balance, which is the wanted
 * point, or its own where none is wanted.
 * @throws RangeError when a part or solid names a material that the plan does not hold
 * @example trialBase(EXAMPLE_PLAN).wanted // → 40
 */
export function trialBase(plan: Plan): TrialBase {
  const whole = foldPlan(plan);
  const ballast = new Set(plan.items.filter(isBallast).map(({ id }) => `item/${id}`));
  const wing = plan.surfaces.find(({ role }) => role === 'wing');
  const wings = plan.surfaces.filter(({ role }) => role === 'wing');
  const classArea = plan.surfaces
    .filter(({ role }) => role !== 'fin')
    .reduce((sum, surface) => sum + classAreaOf(surface), 0);
  return {
    plan,
    // Items come last, so that what shares of wood refer to keeps its place.
    fold: { ...whole, lines: whole.lines.filter(({ id }) => !ballast.has(id)) },
    wanted:
      plan.target && whole.wing
        ? positionOfPercent(plan.target.percentMac, whole.wing.xLeMac, whole.wing.mac)
        : (weigh(whole).at?.[0] ?? null),
    takenOff: plan.items.filter(isBallast).reduce((sum, { mass }) => sum + mass, 0),
    covers: new Set(
      wings.flatMap(({ key, parts }) =>
        parts.filter(({ kind }) => kind === 'covering' || kind === 'finish').map(({ id }) => `${key}/${id}`),
      ),
    ),
    classArea: classArea > NOTHING ? classArea : 0,
    spar: wing ? { surface: wing.key, frame: sparFrame(plan, wing, surfaceLine(wing)) } : null,
  };
}
