import type { Printing } from '#shared/core/printed-sheet.ts';
import { convert } from '#shared/units/units.ts';
import { digitsOf } from './numbers.ts';
import type { Units } from './units.ts';

/**
 * How a balance sheet is printed for a reader: what one of the reader's units holds, in g, mm and g·mm, and how
 * many decimals it is told with.
 * @example printingOf(USUAL_UNITS) // → { mass: 1, arm: 1, moment: 1, digits: { mass: 1, arm: 1, moment: 0 } }
 */
export function printingOf(units: Units): Printing {
  const [mass, arm, moment] = [units.unit('mass'), units.unit('length'), units.unit('moment')];
  return {
    mass: convert(1, mass, 'g'),
    arm: convert(1, arm, 'mm'),
    moment: convert(1, moment, 'g.mm'),
    digits: {
      mass: digitsOf('mass', mass),
      arm: digitsOf('length', arm),
      moment: digitsOf('moment', moment),
    },
  };
}
