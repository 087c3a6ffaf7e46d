import { unitLabel } from '#shared/format/numbers.ts';
import type { Quantity } from '#shared/units/quantities.ts';
import type { ParseProblem } from '#shared/units/scan.ts';
import type { Unit } from '#shared/units/units.ts';
import { textOf } from './number-text.ts';

const PROBLEMS: Record<ParseProblem, string> = {
  missing: 'Type a number.',
  not_a_number: 'Not a number. Write 12.5, 1/16, 3 1/2 in or 12 + 3.5.',
  two_decimal_marks: 'Comma or point is the decimal mark: use one, and no thousands marks.',
  divided_by_zero: 'A fraction cannot be over 0.',
  unknown_unit: 'That unit is not known.',
  wrong_unit: 'That unit measures something else.',
  several_units: 'Multiply or divide by a number without a unit.',
};

export function problemText(problem: ParseProblem): string {
  return PROBLEMS[problem];
}

interface Range {
  quantity: Quantity;
  unit: Unit;
  min?: number | undefined;
  max?: number | undefined;
  /** the bound itself is refused too */
  above?: number | undefined;
}

/** A bound as the plan's rules tell it, in the base unit. */
const BOUND = /^(Must be (?:more than|at least|at most)) (-?\d+(?:\.\d+)?)(?: mm)?\.$/;

/** The rule of a plan that a value breaks, with its bound in the field's own unit. */
export function boundIn(message: string, quantity: Quantity, unit: Unit): string {
  return message.replace(
    BOUND,
    (_, rule: string, bound: string) => `${rule} ${boundText(Number(bound), quantity, unit)}.`,
  );
}

function boundText(bound: number, quantity: Quantity, unit: Unit): string {
  return `${textOf(bound, quantity, unit)} ${unitLabel(quantity, unit)}`.trim();
}

/** What is wrong with the size of a value, all in the base unit; undefined when nothing is. */
export function rangeText(value: number, { quantity, unit, min, max, above }: Range): string | undefined {
  const shown = (bound: number) => boundText(bound, quantity, unit);
  if (above !== undefined && value <= above) return `Must be more than ${shown(above)}.`;
  if (min !== undefined && value < min) return `Must be at least ${shown(min)}.`;
  if (max !== undefined && value > max) return `Must be at most ${shown(max)}.`;
  return undefined;
}

/** The field's help in one sentence: read aloud with it, and shown where the pointer rests. */
export const NUMBER_HELP =
  'Comma or point is the decimal mark. A unit may follow (2,5 mm, 1/16 in, 3\'6", 0.4 oz); so may a sum (12 + 3.5, 3*12.5).';
