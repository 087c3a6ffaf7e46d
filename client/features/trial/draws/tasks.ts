import { drawSteps, type DrawOptions, type Draws } from '#shared/core/draws.ts';
import {
  agreementOf,
  chanceWithin,
  sharesByMaterial,
  summaryOf,
  type Agreement,
  type Bounds,
  type Chance,
  type MaterialShares,
  type Summary,
} from '#shared/core/draws-summary.ts';
import { foldPlan } from '#shared/core/linear-model.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { DrawSettings } from './settings.ts';

/** What a model has to keep; what is left out does not bind. Both ends included. */
export interface DrawLimits {
  /** g, all up */
  mass?: Bounds | undefined;
  /** % MAC */
  percentMac?: Bounds | undefined;
}

/** All that the page shows of one plan. */
export interface FiguresTask {
  of: 'figures';
  plan: Plan;
  settings: DrawSettings;
}

/** The chance of keeping some limits, for one plan after the other; null for a plan that there is not. */
export interface ChancesTask {
  of: 'chances';
  plans: readonly (Plan | null)[];
  limits: DrawLimits;
  settings: DrawSettings;
}

export type DrawTask = FiguresTask | ChancesTask;

/** What the draws of one plan come to. */
export interface Figures {
  draws: number;
  nominal: Draws['nominal'];
  mass: Summary | null;
  /** mm aft of the datum */
  x: Summary | null;
  percentMac: Summary | null;
  agreement: { mass: Agreement | null; x: Agreement | null };
  shares: MaterialShares[];
  /** of balancing within the plan's own target; null where it has none */
  onTarget: Chance | null;
}

/** Chances of keeping each limit and all of them at once; null where none is set or it cannot be told. */
export interface Chances {
  mass: Chance | null;
  balance: Chance | null;
  all: Chance | null;
}

export type AnswerOf<Task extends DrawTask> = Task extends FiguresTask ? Figures : (Chances | null)[];

/** A share of a task that is done, 0–1. */
export type Progress = number;

/** Works a task out, with rests in between that tell how far it has come. */
export function* workOut<Task extends DrawTask>(task: Task): Generator<Progress, AnswerOf<Task>, undefined> {
  // The two kinds of answer cannot be told apart by the compiler here; `AnswerOf` says which belongs to which.
  return (task.of === 'figures' ? yield* figuresOf(task) : yield* chancesOf(task)) as AnswerOf<Task>;
}

function* figuresOf({ plan, settings }: FiguresTask): Generator<Progress, Figures, undefined> {
  const draws = yield* drawn(plan, settings, 0, 1);
  const { target } = plan;
  const wanted = target && {
    min: target.percentMac - target.tolerance,
    max: target.percentMac + target.tolerance,
  };
  return {
    draws: settings.draws,
    nominal: draws.nominal,
    mass: summaryOf(draws.mass),
    x: draws.x && summaryOf(draws.x),
    percentMac: draws.percentMac && summaryOf(draws.percentMac),
    agreement: {
      mass: agreementOf(draws.mass, draws.firstOrder.mass),
      x: draws.x && agreementOf(draws.x, draws.firstOrder.x ?? 0),
    },
    shares: sharesByMaterial(draws),
    onTarget: wanted && draws.percentMac ? chanceWithin([{ values: draws.percentMac, ...wanted }]) : null,
  };
}

function* chancesOf({ plans, limits, settings }: ChancesTask) {
  const answers: (Chances | null)[] = [];
  for (const [i, plan] of plans.entries()) {
    answers.push(
      plan && chancesIn(yield* drawn(plan, settings, i / plans.length, (i + 1) / plans.length), limits),
    );
  }
  return answers;
}

function chancesIn({ mass, percentMac, nominal }: Draws, limits: DrawLimits): Chances {
  const byMass = limits.mass && { values: mass, ...limits.mass };
  const byBalance = limits.percentMac && percentMac && { values: percentMac, ...limits.percentMac };
  // A model without a mass keeps no limit by weighing nothing.
  const there = nominal.x !== null;
  const chance = (...of: NonNullable<typeof byMass>[]) => (of.length > 0 && there ? chanceWithin(of) : null);
  const balanceAsked = limits.percentMac !== undefined;
  return {
    mass: byMass ? chance(byMass) : null,
    balance: byBalance ? chance(byBalance) : null,
    all: balanceAsked && !byBalance ? null : chance(...[byMass, byBalance].flatMap((one) => one ?? [])),
  };
}

function* drawn(
  plan: Plan,
  { draws, seed, thickness, pieces }: DrawSettings,
  from: Progress,
  to: Progress,
): Generator<Progress, Draws, undefined> {
  const options: DrawOptions = { draws, seed, spreads: { thickness }, pieces };
  const steps = drawSteps(foldPlan(plan), options);
  for (;;) {
    const step = steps.next();
    if (step.done === true) return step.value;
    yield from + ((to - from) * step.value) / draws;
  }
}
