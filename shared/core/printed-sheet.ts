import { Decimal } from 'decimal.js';
import { apportion } from './apportion.ts';
import { massUncertainty } from './balance.ts';
import type { Estimate, Line } from './result.ts';
import { sheetGroups } from './sheet-groups.ts';

/**
 * Figures as printed: a decimal point, a plain minus, no thousands marks, a fixed count of decimals per column
 * (`digits`). Masses, arms aft of the datum and moments in the units of the printing, shares % of the mass. `arm`
 * is null where nothing has a mass.
 */
export interface PrintedFigures {
  mass: string;
  /** standard uncertainty of the mass */
  u: string;
  arm: string | null;
  moment: string;
  share: string;
}

/** One line of the estimate. */
export interface PrintedRow extends PrintedFigures {
  /** id of the estimate's line */
  id: string;
  name: string;
  /** key of the material, null for items */
  material: string | null;
}

/** One group (`sheetGroups`) with its rows. */
export interface PrintedGroup extends PrintedFigures {
  key: string;
  name: string;
  rows: PrintedRow[];
}

/** The whole sheet. */
export interface PrintedSheet {
  groups: PrintedGroup[];
  total: PrintedFigures;
  /** decimals of each column */
  digits: Record<Column | 'u' | 'arm', number>;
}

/** The units that a sheet is printed in: g, mm and g·mm in one of each, and the decimals of a model of some weight. */
export interface Printing {
  mass: number;
  arm: number;
  moment: number;
  digits: { mass: number; arm: number; moment: number };
}

/** Grams, millimetres and gram millimetres. */
export const METRIC_PRINTING: Printing = {
  mass: 1,
  arm: 1,
  moment: 1,
  digits: { mass: 1, arm: 1, moment: 0 },
};

type Column = 'mass' | 'moment' | 'share';
type Printed = Record<Column, Decimal>;

/** Below this mass, g, a sheet prints masses and moments with one more decimal. */
const LIGHT = 20;

/**
 * The balance sheet by group and part, as printed on screen, on paper and in CSV. Printed masses, moments and
 * shares add up to the last digit: parts to their group, groups to the total; no printed figure lies as much as one
 * unit of its last digit from the exact one. Uncertainties add in quadrature, so that column is rounded alone, and
 * never down to nothing; arms are exact arms, rounded. `printing` says in which units and with how many decimals.
 * @example printedSheet(EXAMPLE_ESTIMATE).total // → { mass: '19.26', u: '0.58', arm: '13.8', moment: '266.4', share: '100.0' }
 */
export function printedSheet(
  estimate: Pick<Estimate, 'lines'>,
  printing: Printing = METRIC_PRINTING,
): PrintedSheet {
  const lines = estimate.lines.map((line) => inUnits(line, printing));
  const mass = exactSum(lines, 'mass');
  const moment = exactSum(lines, 'moment');
  const more = mass.times(printing.mass).lessThan(LIGHT) ? 1 : 0;
  const fine = printing.digits.mass + more;
  const digits = {
    mass: fine,
    u: fine,
    arm: printing.digits.arm,
    moment: printing.digits.moment + more,
    share: 1,
  };
  const shareOf = (part: Decimal) => (mass.isZero() ? new Decimal(0) : part.times(100).div(mass));

  const groups = sheetGroups(lines).map((group) => ({
    ...group,
    mass: exactSum(group.lines, 'mass'),
    moment: exactSum(group.lines, 'moment'),
  }));
  const total: Printed = {
    mass: mass.toDecimalPlaces(digits.mass, Decimal.ROUND_HALF_UP),
    moment: moment.toDecimalPlaces(digits.moment, Decimal.ROUND_HALF_UP),
    share: new Decimal(mass.isZero() ? 0 : 100),
  };
  const byGroup = spread(groups, total, digits, shareOf);

  const write = (printed: Printed, of: readonly Line[], arm: Decimal | null): PrintedFigures => ({
    mass: printed.mass.toFixed(digits.mass),
    u: printedUncertainty(massUncertainty(of), digits.u),
    arm: arm === null ? null : plain(arm.toDecimalPlaces(digits.arm, Decimal.ROUND_HALF_UP), digits.arm),
    moment: plain(printed.moment, digits.moment),
    share: printed.share.toFixed(digits.share),
  });
  // The unit of moments need not be the product of the other two.
  const armUnit = new Decimal(printing.moment).div(printing.mass).div(printing.arm);
  const armOf = (of: { mass: Decimal; moment: Decimal }) =>
    of.mass.isZero() ? null : of.moment.div(of.mass).times(armUnit);

  return {
    groups: groups.map((group, i): PrintedGroup => {
      const printed = at(byGroup, i);
      const exact = group.lines.map((line) => ({
        mass: new Decimal(line.mass),
        moment: new Decimal(line.moment),
      }));
      const byRow = spread(exact, printed, digits, shareOf);
      return {
        key: group.key,
        name: group.name,
        ...write(printed, group.lines, armOf(group)),
        rows: group.lines.map((line, j) => ({
          id: line.id,
          name: line.name,
          material: line.material,
          ...write(at(byRow, j), [line], new Decimal(line.at[0])),
        })),
      };
    }),
    total: write(total, lines, armOf({ mass, moment })),
    digits,
  };
}

/** Each column apportioned to its printed total. */
function spread(
  parts: readonly { mass: Decimal; moment: Decimal }[],
  total: Printed,
  digits: Record<Column, number>,
  shareOf: (mass: Decimal) => Decimal,
): Printed[] {
  const masses = apportion(
    parts.map((part) => part.mass),
    total.mass,
    digits.mass,
  );
  const moments = apportion(
    parts.map((part) => part.moment),
    total.moment,
    digits.moment,
  );
  const shares = apportion(
    parts.map((part) => shareOf(part.mass)),
    total.share,
    digits.share,
  );
  return parts.map((_, i) => ({ mass: at(masses, i), moment: at(moments, i), share: at(shares, i) }));
}

/** What is printed of one is at hand for each, by construction. */
function at<T>(list: readonly T[], index: number): T {
  const value = list[index];
  if (value === undefined) throw new RangeError(`nothing at ${index}`);
  return value;
}

/** A line with its figures in the units of the printing. */
function inUnits(line: Line, { mass, arm, moment }: Printing): Line {
  const [x, y, z] = line.at;
  return {
    ...line,
    mass: line.mass / mass,
    u: line.u / mass,
    moment: line.moment / moment,
    at: [x / arm, y, z],
  };
}

function exactSum(lines: readonly Line[], column: 'mass' | 'moment'): Decimal {
  return Decimal.sum(0, ...lines.map((line) => line[column]));
}

/** JCGM 100:2008, 7.2.6, lets an uncertainty be rounded up: a small one never prints as none. */
function printedUncertainty(u: number, digits: number): string {
  const unit = new Decimal(10).pow(-digits);
  const rounded = new Decimal(u).toDecimalPlaces(digits, Decimal.ROUND_HALF_UP);
  return (u > 0 && rounded.lessThan(unit) ? unit : rounded).toFixed(digits);
}

/** Without a minus before a nought. */
function plain(value: Decimal, digits: number): string {
  return (value.isZero() ? new Decimal(0) : value).toFixed(digits);
}
