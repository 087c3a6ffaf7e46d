import type { Units } from '#shared/format/units.ts';

interface Effect {
  /** g */
  massBy: number | null;
  /** mm aft */
  balanceBy: number | null;
}

/** Less than this is no difference: g, and mm. */
const NOTHING = { mass: 0.005, balance: 0.005 };
/** Below this a difference is told with one more digit. */
const SMALL = 0.95;

/** What a change does to the model: `+3.1 g, balance 1.2 mm forward`. */
export function effectInWords(effect: Effect | null, units: Units): string {
  if (effect === null) return 'no valid plan';
  const { massBy, balanceBy } = effect;
  const mass = massBy === null || Math.abs(massBy) < NOTHING.mass ? null : massInWords(massBy, units);
  const moved =
    balanceBy === null || Math.abs(balanceBy) < NOTHING.balance
      ? null
      : `balance ${units.format(Math.abs(balanceBy), 'length', fineness(balanceBy))} ${balanceBy < 0 ? 'forward' : 'aft'}`;
  return [mass, moved].filter(Boolean).join(', ') || 'same mass and balance';
}

/** A difference in mass with its sign. */
export function massInWords(massBy: number, units: Units): string {
  return units.format(massBy, 'mass', { plus: true, ...fineness(massBy) });
}

const fineness = (value: number) => ({ fine: Math.abs(value) < SMALL });
