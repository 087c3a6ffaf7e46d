import { balanceOnSupports, type Support } from '../supports.ts';

/** A figure with its standard uncertainty. */
export interface Known {
  value: number;
  u: number;
}

/** A measured figure against its forecast. */
export interface Comparison {
  /** measured less forecast */
  difference: number;
  /** in multiples of the joint standard uncertainty; null where both are given as exact */
  multiples: number | null;
  /** `questioned` beyond two multiples, or wherever exact figures differ */
  verdict: 'agrees' | 'questioned';
}

/**
 * Whether a measured figure and its forecast can both be right: d/√(u² + u²), questioned beyond 2, which is the
 * expanded uncertainty of about 95 % (JCGM 100:2008, 6.2.1 and G.6.6).
 * @example compareWithForecast({ value: 84, u: 0.6 }, { value: 82, u: 0.8 }) // → { difference: 2, multiples: 2, verdict: 'agrees' }
 */
export function compareWithForecast(measured: Known, forecast: Known): Comparison {
  const difference = measured.value - forecast.value;
  const joint = Math.hypot(measured.u, forecast.u);
  const multiples = joint > 0 ? Math.abs(difference) / joint : null;
  const agrees = multiples === null ? difference === 0 : multiples <= 2;
  return { difference, multiples, verdict: agrees ? 'agrees' : 'questioned' };
}

/** What may be wrong where a weighing and its forecast differ too much. */
export type LikelyCause =
  | { code: 'readings_swapped' }
  | { code: 'tare_forgotten'; support: number }
  | { code: 'places_in_inches' }
  | { code: 'item_missing'; id: string }
  | { code: 'item_extra'; grams: number }
  | { code: 'datum_shifted'; by: number };

interface Expected {
  mass: Known;
  x: Known;
  /** what may have been left out or be missing from the plan */
  items: readonly { id: string; mass: number; at: readonly [number, number, number] }[];
}

/**
 * Causes that would make weighing and forecast agree, likeliest first: each is tried on the readings and kept where
 * mass and balance both come within two joint uncertainties. Empty where they agree already, or none would do.
 * `measuredU` are the standard uncertainties of the weighing, g and mm.
 * @example likelyCauses([{ reading: 30, tare: 0, x: 0 }, { reading: 10, tare: 0, x: 100 }], { mass: 0.1, x: 1 }, { mass: { value: 40, u: 1 }, x: { value: 75, u: 1 }, items: [] }) // → [{ code: 'readings_swapped' }, { code: 'datum_shifted', by: 50 }]
 */
export function likelyCauses(
  supports: readonly Support[],
  measuredU: { mass: number; x: number },
  expected: Expected,
): LikelyCause[] {
  const found = balanceOnSupports(supports);
  if (!found) return [];
  const near = (value: number, known: Known, u: number) =>
    Math.abs(value - known.value) <= 2 * Math.hypot(u, known.u);
  const fits = (mass: number, x: number) =>
    near(mass, expected.mass, measuredU.mass) && near(x, expected.x, measuredU.x);
  const heals = (changed: readonly Support[]) => {
    const account = balanceOnSupports(changed);
    return account !== null && fits(account.mass, account.x);
  };
  if (fits(found.mass, found.x)) return [];
  const causes: LikelyCause[] = [];
  const places = supports.map(({ x }) => x).reverse();
  if (supports.length === 2 && heals(supports.map((s, i) => ({ ...s, x: places[i] ?? s.x })))) {
    causes.push({ code: 'readings_swapped' });
  }
  if (heals(supports.map((s) => ({ ...s, x: s.x * 25.4 })))) causes.push({ code: 'places_in_inches' });
  for (const item of expected.items) {
    const mass = found.mass + item.mass;
    if (fits(mass, (found.mass * found.x + item.mass * item.at[0]) / mass)) {
      causes.push({ code: 'item_missing', id: item.id });
    }
  }
  const over = found.mass - expected.mass.value;
  supports.forEach((s, support) => {
    if (
      s.tare === 0 &&
      over > 0 &&
      heals(supports.map((o, i) => (i === support ? { ...o, tare: over } : o)))
    ) {
      causes.push({ code: 'tare_forgotten', support });
    }
  });
  if (over > 0 && !near(found.mass, expected.mass, measuredU.mass)) {
    causes.push({ code: 'item_extra', grams: over });
  }
  if (near(found.mass, expected.mass, measuredU.mass)) {
    causes.push({ code: 'datum_shifted', by: expected.x.value - found.x });
  }
  return causes;
}
