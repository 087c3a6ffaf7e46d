import { standingOf, type Standing } from '#shared/core/standing.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';

/** How the balance point stands to the wanted one. */
export interface BalanceVerdict {
  kind: Standing;
  text: string;
}

/** The standing of the balance point with its words; null where nothing is wanted or nothing balances. */
export function balanceVerdict(
  { target }: Pick<Plan, 'target'>,
  { balance, notices }: Pick<Estimate, 'balance' | 'notices'>,
  units: Units,
): BalanceVerdict | null {
  const { percentMac, uPercentMac } = balance;
  if (!target || percentMac === null) return null;
  const kind = standingOf(target, percentMac, uPercentMac);
  const outside = notices.find((notice) => notice.code === 'balance_outside_target');
  if (kind === 'outside' && outside) {
    const by = units.format(Math.abs(outside.byMm), 'length');
    return { kind, text: `${by} ${outside.byMm > 0 ? 'behind' : 'ahead of'} wanted` };
  }
  const [low, high] = [target.percentMac - target.tolerance, target.percentMac + target.tolerance];
  const range = `${formatNumber(low, 1)}–${formatNumber(high, 1)}${NARROW_SPACE}%`;
  if (kind === 'close') return { kind, text: `near the edge of ${range}` };
  return { kind, text: `wanted ${formatNumber(target.percentMac, 1)}` };
}
