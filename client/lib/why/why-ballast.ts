import { ballastFor } from '#shared/core/ballast.ts';
import { NARROW_SPACE } from '#shared/format/numbers.ts';
import { sayIn } from './say.ts';
import type { Asked, Why } from './why.ts';

const SOURCE = 'FAA-H-8083-1B, Weight and Balance Handbook, ch. 7.';

/** The ballast that brings the balance point to a wanted one; null where none does. */
export function whyBallast({ result, units }: Omit<Asked, 'plan'>, arm: number, to: number): Why | null {
  const { grams, mm } = sayIn(units);
  const { mass } = result.totals;
  const { x, u } = result.balance;
  const found = x === null ? null : ballastFor(mass, x, to, arm);
  if (x === null || found === null || !('mass' in found)) return null;
  const doubt = u === null ? null : Math.abs(((mass + found.mass) * u) / (to - arm));
  return {
    title: 'Ballast',
    formula: `${grams(found.mass)} = M·(x₀ − x₁) ÷ (x₁ − b) = ${grams(mass)} × (${mm(x)} − ${inBrackets(to, mm)}) ÷ (${mm(to)} − ${inBrackets(arm, mm)})`,
    steps: ['x₀ is where it balances, x₁ where it shall, b the arm of the ballast.'],
    inputs: [
      { name: 'Mass of the model', value: grams(mass), ask: { of: 'total' } },
      { name: 'Balance point', value: mm(x), ask: { of: 'balance' } },
      { name: 'Wanted point', value: mm(to), at: { place: 'balance', field: 'Point, % MAC' } },
      { name: 'Arm', value: mm(arm), at: { place: 'balance', field: 'At arm' } },
    ],
    doubt:
      doubt === null
        ? null
        : `±${NARROW_SPACE}${units.doubt(doubt, 'mass', { fine: true })}: the balance point’s own ±${NARROW_SPACE}${units.doubt(u, 'length')}. Trim on the supports before gluing it in.`,
    source: SOURCE,
  };
}

/** The same sideways, to the plane of symmetry. */
export function whyTipWeight({ result, units }: Asked, arm: number): Why | null {
  const { grams, mm } = sayIn(units);
  const { mass, at } = result.totals;
  const found = at ? ballastFor(mass, at[1], 0, arm) : null;
  if (!at || found === null || !('mass' in found)) return null;
  return {
    title: 'Tip weight',
    formula: `${grams(found.mass)} = M·y₀ ÷ −b = ${grams(mass)} × ${mm(Math.abs(at[1]))} ÷ ${mm(Math.abs(arm))}`,
    steps: [
      'y₀ is how far the balance point lies from the middle, b the place of the weight on the other side.',
    ],
    inputs: [
      { name: 'Mass of the model', value: grams(mass), ask: { of: 'total' } },
      { name: 'Place', value: mm(arm), at: { place: 'balance', field: 'At y, starboard +' } },
    ],
    doubt: 'Halves of one wood are taken as alike; weigh the panels, for two sheets seldom are.',
    source: SOURCE,
  };
}

const inBrackets = (value: number, say: (value: number) => string) =>
  value < 0 ? `(${say(value)})` : say(value);
