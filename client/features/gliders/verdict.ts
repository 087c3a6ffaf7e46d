import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { formatNumber, formatQuantity, NARROW_SPACE } from '#shared/format/numbers.ts';

/** How the balance point stands to the wanted one. */
export interface BalanceVerdict {
  kind: 'inside' | 'close' | 'outside';
  text: string;
}

/**
 * Outside where the balance point leaves the wanted range; close where one standard uncertainty would carry it
 * over the edge; null where nothing is wanted or nothing balances.
 */
export function balanceVerdict(
  { target }: Pick<Plan, 'target'>,
  { balance, notices }: Pick<Estimate, 'balance' | 'notices'>,
): BalanceVerdict | null {
  const { percentMac, uPercentMac } = balance;
  if (!target || percentMac === null) return null;
  const outside = notices.find((notice) => notice.code === 'balance_outside_target');
  if (outside) {
    const by = formatQuantity(Math.abs(outside.byMm), 'length');
    return { kind: 'outside', text: `${by} ${outside.byMm > 0 ? 'behind' : 'ahead of'} wanted` };
  }
  const toEdge = target.tolerance - Math.abs(percentMac - target.percentMac);
  const [low, high] = [target.percentMac - target.tolerance, target.percentMac + target.tolerance];
  const range = `${formatNumber(low, 1)}–${formatNumber(high, 1)}${NARROW_SPACE}%`;
  if (uPercentMac !== null && toEdge < uPercentMac)
    return { kind: 'close', text: `near the edge of ${range}` };
  return { kind: 'inside', text: `wanted ${formatNumber(target.percentMac, 1)}` };
}
