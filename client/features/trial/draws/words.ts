import type { Agreement, Chance, MaterialShares, Summary } from '#shared/core/draws-summary.ts';
import type { Plan } from '#shared/core/plan.ts';
import { formatNumber, formatQuantity, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import type { Quantity } from '#shared/units/quantities.ts';
import type { Figures } from './tasks.ts';

/** The shares below and above which a tenth of the draws lies, and the middle. */
export const TOLD = [0.05, 0.5, 0.95] as const;

export function quantile({ quantiles }: Summary, share: number): number | null {
  return quantiles.find((one) => one.share === share)?.value ?? null;
}

/** `All-up mass lies between 398.2 and 421.0 g nine times in ten; balance 38.2–41.0 % MAC`. */
export function drawsHeadline({ mass, x, percentMac }: Figures, units: Units): string {
  if (!mass || !x) return 'Nothing to draw: the plan has no mass';
  const text = (value: number | null, quantity: Quantity, bare: boolean) =>
    units.format(value, quantity, { bare });
  const [light, heavy] = [quantile(mass, 0.05), quantile(mass, 0.95)];
  const [quantity, place, of] = percentMac
    ? (['percentMac', percentMac, `${NARROW_SPACE}MAC`] as const)
    : (['length', x, ' from the datum'] as const);
  const [fore, aft] = [quantile(place, 0.05), quantile(place, 0.95)];
  const balance =
    text(fore, quantity, true) === text(aft, quantity, true)
      ? `balance at ${text(aft, quantity, false)}${of}`
      : `balance ${text(fore, quantity, true)}–${text(aft, quantity, false)}${of}`;
  return text(light, 'mass', true) === text(heavy, 'mass', true)
    ? `All-up mass is ${text(heavy, 'mass', false)} nine times in ten; ${balance}`
    : `All-up mass lies between ${text(light, 'mass', true)} and ${text(heavy, 'mass', false)} nine times in ten; ${balance}`;
}

/** A chance in per cent, never told as certain by a limited number of draws. */
export function chanceText({ share, standardError }: Chance): string {
  const percent = 100 * share;
  if (share === 1 || percent > 99.9) return `over ${formatNumber(99.9, 1)}${NARROW_SPACE}%`;
  if (share === 0 || percent < 0.1) return `under ${formatNumber(0.1, 1)}${NARROW_SPACE}%`;
  // A digit more is only worth reading where the draws can tell it.
  return `${formatNumber(percent, standardError < 0.001 ? 1 : 0)}${NARROW_SPACE}%`;
}

/** The chance of balancing within the plan's own target; nothing where it has none. */
export function targetSentence({ onTarget }: Figures, { target }: Pick<Plan, 'target'>): string {
  if (!onTarget || !target) return '';
  const range = `${formatNumber(target.percentMac, 1)} ± ${formatNumber(target.tolerance, 1)}${NARROW_SPACE}% MAC`;
  return `The chance of balancing within the wanted ${range} as it stands, without trimming: ${chanceText(onTarget)}.`;
}

/** More than this many standard errors apart is no chance. */
const PAST_CHANCE = 3;

/** What the draws say beside propagation by the slopes alone. */
export function agreementSentence({ agreement, draws }: Figures, units: Units): string {
  const { mass, x } = agreement;
  if (!mass || !x) return '';
  const both = (one: Agreement, quantity: Quantity) =>
    `${units.doubt(one.drawn, quantity, { fine: true, bare: true })} drawn and ${units.doubt(one.firstOrder, quantity, { fine: true })} to first order`;
  const figures = `± ${both(mass, 'mass')} for the mass, ± ${both(x, 'length')} for the balance`;
  const worst = [mass, x].reduce((a, b) => (Math.abs(b.apart ?? 0) > Math.abs(a.apart ?? 0) ? b : a));
  if (worst.firstOrder === 0 || worst.apart === null) return 'Nothing in the plan is in doubt.';
  const count = formatNumber(draws, 0);
  const apart = formatQuantity(Math.abs(worst.apart), 'fineShare');
  const able = formatQuantity(worst.bySampling, 'fineShare');
  return Math.abs(worst.apart) <= PAST_CHANCE * worst.bySampling
    ? `The draws agree with the sum of squares: ${figures}; at most ${apart} apart, where ${count} draws are good to ${able}.`
    : `The draws and the sum of squares differ: ${figures}; up to ${apart} apart, more than ${count} draws leave to chance (${able}). The spreads are so wide that the slopes do not tell the whole: trust the draws.`;
}

/** A material by its name; what has a mass of its own is an item. */
export function shareName(
  { material }: Pick<MaterialShares, 'material'>,
  plan: Pick<Plan, 'materials'>,
): string {
  return material === null ? 'Items' : (plan.materials[material]?.name ?? material);
}

export function sharesSentence(shares: readonly MaterialShares[], plan: Pick<Plan, 'materials'>): string {
  const [first] = shares;
  if (!first) return 'Nothing in the plan is in doubt.';
  const percent = (value: number) => formatQuantity(value, 'share');
  const name = shareName(first, plan);
  return `${name} ${first.material === null ? 'make' : 'makes'} ${percent(first.mass.drawn)} of the variance of the mass and ${percent(first.balance.drawn)} of that of the balance${adviceOf(first, plan)}. Grain: mass; cross-hatch: balance.`;
}

/** What makes the largest share smaller. */
function adviceOf({ material }: MaterialShares, { materials }: Pick<Plan, 'materials'>): string {
  if (material === null) return '; weigh these first';
  const category = materials[material]?.category;
  return category === 'wood' || category === 'sheet' ? '; weigh what is cut from it first' : '';
}
