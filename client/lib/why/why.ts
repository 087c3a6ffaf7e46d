import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import type { Units } from '#shared/format/units.ts';
import type { WhyQuestion } from './question.ts';

/** How a figure was made. */
export interface Why {
  /** what the figure is: `Mass and balance of Nose sheeting` */
  title: string;
  /** with its numbers: `10.31 g = 92.08 cm³ × 112 kg/m³` */
  formula: string;
  steps: string[];
  inputs: WhyInput[];
  /** where the uncertainty comes from */
  doubt: string | null;
  source: string | null;
}

/** Something that a figure is made from. */
export interface WhyInput {
  name: string;
  value: string;
  /** where it is entered */
  at?: WhyPlace | undefined;
  /** or how it was made itself */
  ask?: WhyQuestion | undefined;
}

/** A field of a glider's places. */
export interface WhyPlace {
  place: 'drawing' | 'balance' | 'loading';
  /** line of the balance sheet whose form it is in, or one of the same surface */
  line?: string | undefined;
  /** label of the field */
  field?: string | undefined;
  /** The line only brings its surface to hand; its own form stays shut. */
  surfaceOnly?: boolean | undefined;
}

/** What an answer is made from. */
export interface Asked {
  plan: Plan;
  result: Estimate;
  units: Units;
}
