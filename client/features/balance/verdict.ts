import { ballastFor } from '#shared/core/ballast.ts';
import type { Beam } from '#shared/core/beam.ts';
import type { Plan, Target } from '#shared/core/plan.ts';
import { standingOf, type Standing } from '#shared/core/standing.ts';
import type { Estimate } from '#shared/core/result.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { spareBallast } from './ballast-edit.ts';

/** The answer of the page: how it balances, and what to do about it. */
export interface Verdict {
  kind: 'none' | Standing;
  headline: string;
  /** the fact behind it, and the range asked for */
  detail: string;
  /** what puts it right */
  advice: string | null;
}

const percent = (value: number) => formatNumber(value, 1);

/** How the plan balances, in words. `nose` is the arm at which ballast is thought of, mm. */
export function verdictOf(
  { target, items }: Pick<Plan, 'target' | 'items'>,
  { totals }: Pick<Estimate, 'totals'>,
  beam: Beam | null,
  nose: number,
  units: Units,
): Verdict {
  if (!beam) {
    return {
      kind: 'none',
      headline: 'Nothing has a mass yet',
      detail: 'Draw a part or add an item; its mass hangs on the beam at once.',
      advice: null,
    };
  }
  const { x, percentMac, uPercentMac } = beam.balance;
  if (percentMac === null) {
    return {
      kind: 'none',
      headline: `Balances ${placeOf(x, units)}`,
      detail: 'Without a wing there is no chord to tell it by.',
      advice: null,
    };
  }
  if (!target || !beam.wanted) {
    return {
      kind: 'none',
      headline: `Balances at ${percent(percentMac)}${NARROW_SPACE}%\u00a0MAC`,
      detail: `That is ${placeOf(x, units)}. No balance point is asked for yet.`,
      advice: null,
    };
  }
  const by = x - beam.wanted.x;
  const kind = standingOf(target, percentMac, uPercentMac);
  const advice = adviceOf(totals.mass, x, beam.wanted.x, nose, items, target, units);
  const offset = offsetOf(by, units);
  const range = rangeOf(target);
  if (kind === 'outside') {
    const detail = `It balances at ${percent(percentMac)}${NARROW_SPACE}%\u00a0MAC; ${range} is asked for.`;
    return { kind, headline: capital(`${offset} the wanted balance point`), detail, advice };
  }
  const close = kind === 'close' && uPercentMac !== null;
  const on = Math.abs(by) < 0.05;
  return {
    kind,
    headline: `Balances at ${percent(percentMac)}${NARROW_SPACE}%\u00a0MAC, inside ${range}`,
    detail: close
      ? `${capital(offset)} the wanted point; ±${NARROW_SPACE}${percent(uPercentMac)}${NARROW_SPACE}% of doubt reaches over the edge.`
      : on
        ? 'On the wanted point. Nothing to add.'
        : `${capital(offset)} the wanted point. Nothing has to be added.`,
    advice: close ? advice : null,
  };
}

function adviceOf(
  mass: number,
  from: number,
  to: number,
  nose: number,
  items: Plan['items'],
  { percentMac }: Target,
  units: Units,
): string | null {
  const mm = (value: number) => units.format(value, 'length');
  const found = ballastFor(mass, from, to, nose);
  const grams = (value: number) => units.format(value, 'mass', { fine: mass < 20 });
  const then = `it balances at ${percent(percentMac)}${NARROW_SPACE}%\u00a0MAC`;
  if ('mass' in found) {
    return found.mass === 0 ? null : `Put ${grams(found.mass)} at the nose (${mm(nose)}) and ${then}.`;
  }
  if (found.refused !== 'wrong_side') return null;
  const spare = spareBallast(items, mass, from, to);
  if (!spare) return 'It is nose-heavy without any ballast: move gear aft, or lengthen the tail.';
  const { item, takeOff, enough } = spare;
  const off = `${grams(takeOff)} of the ballast at ${mm(item.at[0])} off`;
  return enough ? `Take ${off} and ${then}.` : `Take the ${off} first; no piece of ballast alone is enough.`;
}

function offsetOf(by: number, units: Units): string {
  return `${units.format(Math.abs(by), 'length')} ${by > 0 ? 'behind' : 'ahead of'}`;
}

function rangeOf({ percentMac, tolerance }: Target): string {
  return `${percent(percentMac - tolerance)}–${percent(percentMac + tolerance)}${NARROW_SPACE}%`;
}

/** An arm in words: `33.3 mm aft of the datum`. */
export function placeOf(x: number, units: Units): string {
  return `${units.format(Math.abs(x), 'length')} ${x < 0 ? 'ahead of' : 'aft of'} the datum`;
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
