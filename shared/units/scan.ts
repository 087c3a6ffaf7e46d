/** Why a text is no quantity. */
export type ParseProblem =
  | 'missing'
  | 'not_a_number'
  | 'two_decimal_marks'
  | 'divided_by_zero'
  | 'unknown_unit'
  | 'wrong_unit'
  | 'several_units';

/** What stands in the way of reading a text; caught where the reading began. */
export class Refused extends Error {
  readonly problem: ParseProblem;
  constructor(problem: ParseProblem) {
    super(problem);
    this.problem = problem;
  }
}

/** A text that is read from left to right. */
export class Scanner {
  private readonly text: string;
  private at = 0;
  constructor(text: string) {
    this.text = text;
  }
  /** What a sticky pattern finds here, and steps over it; null where it does not fit. */
  take(pattern: RegExp): RegExpExecArray | null {
    const found = this.see(pattern);
    if (found) this.at += found[0].length;
    return found;
  }
  /** What a sticky pattern finds here; null where it does not fit. */
  see(pattern: RegExp): RegExpExecArray | null {
    pattern.lastIndex = this.at;
    return pattern.exec(this.text);
  }
  step(length: number): void {
    this.at += length;
  }
  get ended(): boolean {
    return this.at >= this.text.length;
  }
}

const MIXED = /(\d+)(?:\s+|-)(\d+)\s*[/⁄]\s*(\d+)(?![\d.,])/y;
const FRACTION = /(\d+)\s*[/⁄]\s*(\d+)(?![\d.,])/y;
const RUN = /[\d.,]+(?:\s+[\d.,]+)*/y;
const THOUSANDS = /^\d{1,3}(\s\d{3})+([.,]\d*)?$/;
const DECIMAL = /^(\d+[.,]?\d*|[.,]\d+)$/;

/** Whether a number begins here, spaces aside. @example isNumberStart(new Scanner(' 12 mm')) // → true */
export function isNumberStart(scan: Scanner): boolean {
  return scan.see(/\s*[\d.,]/y) !== null;
}

/**
 * A number without sign: `12,5`, `1 000`, and where a fraction may stand `1/16`, `3 1/2`, `3-1/2`. Steps over it.
 * @throws Refused where no number stands, one has two decimal marks, or a fraction divides by 0
 * @example readNumber(new Scanner('3 1/2'), true) // → 3.5
 */
export function readNumber(scan: Scanner, mayBeFraction: boolean): number {
  if (mayBeFraction) {
    const mixed = scan.see(MIXED);
    // An improper one is no mixed number: 12-31/2 takes 15.5 from 12.
    if (mixed && (Number(mixed[2]) < Number(mixed[3]) || Number(mixed[3]) === 0)) {
      scan.step(mixed[0].length);
      return finite(Number(mixed[1]) + quotient(mixed[2], mixed[3]));
    }
    const fraction = scan.take(FRACTION);
    if (fraction) return finite(quotient(fraction[1], fraction[2]));
  }
  const run = scan.take(RUN)?.[0] ?? '';
  const digits = THOUSANDS.test(run) ? run.replace(/\s/g, '') : run;
  if (/^[\d.,]+$/.test(digits) && digits.replace(/\d/g, '').length > 1)
    throw new Refused('two_decimal_marks');
  if (!DECIMAL.test(digits)) throw new Refused('not_a_number');
  return finite(Number(digits.replace(',', '.')));
}

function quotient(numerator: string | undefined, denominator: string | undefined): number {
  if (Number(denominator) === 0) throw new Refused('divided_by_zero');
  return Number(numerator) / Number(denominator);
}

function finite(value: number): number {
  if (!Number.isFinite(value)) throw new Refused('not_a_number');
  return value;
}
