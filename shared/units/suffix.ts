import { QUANTITIES, type Quantity } from './quantities.ts';
import { Refused, type Scanner } from './scan.ts';
import { SPELLINGS } from './spellings.ts';
import type { Unit } from './units.ts';

/** Marks, or words that may be joined: `"`, `°`, `lb/ft³`, `sq in`. An `x` on its own multiplies. */
const RUN =
  /\s*(''|["″'′°%]|(?!x(?![a-z]))[a-z]+[\d²³]*(?:\s*[/·.]\s*[a-z]+[\d²³]*|\s+(?!x(?![a-z]))[a-z]+[\d²³]*)*)/iy;

/**
 * The unit that stands here, or null where none does; steps over it. A spelling that serves two units means the one
 * that the quantity has; of `2ft3in` the feet are taken first.
 * @throws Refused for a unit that is not known or measures something else
 * @example readUnit(new Scanner(' sq in'), 'area') // → 'in2'
 */
export function readUnit(scan: Scanner, quantity: Quantity): Unit | null {
  const found = scan.see(RUN);
  if (!found) return null;
  const [whole, run = ''] = found;
  const lead = whole.length - run.length;
  const offered: readonly Unit[] = QUANTITIES[quantity].units;
  for (let length = run.length; length > 0; length--) {
    if (/[a-z]/i.test(run.charAt(length)) && /[a-z]/i.test(run.charAt(length - 1))) continue;
    const unit = spelled(run.slice(0, length)).find((one) => offered.includes(one));
    if (unit === undefined) continue;
    scan.step(lead + length);
    return unit;
  }
  throw new Refused(spelled(run).length > 0 ? 'wrong_unit' : 'unknown_unit');
}

function spelled(text: string): readonly Unit[] {
  const spelling = text
    .replace(/\s/g, '')
    .replaceAll('²', '2')
    .replaceAll('³', '3')
    .replaceAll('·', '.')
    .toLowerCase();
  return SPELLINGS.get(spelling) ?? [];
}
