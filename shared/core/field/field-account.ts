import { balanceAfter } from '../ballast.ts';
import { percentOfMac } from '../balance.ts';
import { readingOf } from '../built/reading.ts';
import type { WingReference } from '../wing-reference.ts';
import { fingerTest, supportsAccount, type SupportReading } from './supports-account.ts';

/** One scale under the model as it is read in the field. g, mm */
export interface FieldSupport {
  reading: number;
  tare: number;
  /** smallest step that the scale shows */
  resolution: number;
  x: number;
  y: number;
  /** standard uncertainty of the place */
  ux: number;
}

/** How the balance was found: on scales, or on a finger with the mass from one scale. */
export type FieldMethod =
  | { kind: 'supports'; supports: readonly FieldSupport[] }
  | { kind: 'finger'; mass: number; resolution: number; tipsForwardAt: number; tipsAftAt: number };

/** Mass and balance with standard uncertainties, g and mm; % MAC null without a wing. */
export interface FieldFigures {
  mass: number;
  u: number;
  x: number;
  ux: number;
  percentMac: number | null;
}

/**
 * What the model weighs and where it balances, as measured and with the ballast that was fitted after it; null where
 * the scales carry nothing.
 * @example fieldAccount({ kind: 'finger', mass: 100, resolution: 0, tipsForwardAt: 80, tipsAftAt: 80 }, [{ mass: 25, x: 30 }], null).flown.x // → 70
 */
export function fieldAccount(
  method: FieldMethod,
  ballast: readonly { mass: number; x: number }[],
  wing: Pick<WingReference, 'mac' | 'xLeMac'> | null,
): { measured: FieldFigures; flown: FieldFigures } | null {
  const found = measure(method);
  if (!found) return null;
  const percent = (x: number) => (wing ? percentOfMac(x, wing.xLeMac, wing.mac) : null);
  const added = ballast.reduce((sum, { mass }) => sum + mass, 0);
  const moment = ballast.reduce((sum, { mass, x }) => sum + mass * x, 0);
  const mass = found.mass + added;
  const x = added > 0 ? balanceAfter(found.mass, found.x, added, moment / added) : found.x;
  const flown = { ...found, mass, x, ux: (found.ux * found.mass) / mass, percentMac: percent(x) };
  return { measured: { ...found, percentMac: percent(found.x) }, flown };
}

/**
 * Where the model balances sideways, mm to starboard with its standard uncertainty; null where its supports do not
 * stand apart sideways, or it lay on a finger.
 * @example fieldSideways({ kind: 'finger', mass: 100, resolution: 0, tipsForwardAt: 80, tipsAftAt: 80 }) // → null
 */
export function fieldSideways(method: FieldMethod): { mass: number; y: number; uy: number } | null {
  if (method.kind === 'finger' || method.supports.every(({ y }) => y === method.supports[0]?.y)) return null;
  const account = supportsAccount(method.supports.map(withDoubt));
  return account && { mass: account.mass, y: account.y, uy: account.uy };
}

function measure(method: FieldMethod): Omit<FieldFigures, 'percentMac'> | null {
  if (method.kind === 'finger') {
    const reading = readingOf({ values: [method.mass], tare: 0, resolution: method.resolution });
    if (!reading || reading.mass <= 0) return null;
    return { ...reading, ...fingerTest(method.tipsForwardAt, method.tipsAftAt) };
  }
  const account = supportsAccount(method.supports.map(withDoubt));
  return account && { mass: account.mass, u: account.u, x: account.x, ux: account.ux };
}

const withDoubt = ({ reading, tare, resolution, x, y, ux }: FieldSupport): SupportReading => ({
  reading,
  tare,
  x,
  y,
  ux,
  uy: ux,
  u: readingOf({ values: [reading], tare, resolution })?.u ?? 0,
});
