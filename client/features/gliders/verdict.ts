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
  const wanted = formatNumber(target.percentMac, 1);
  const toEdge = target.tolerance - Math.abs(percentMac - target.percentMac);
  if (uPercentMac !== null && toEdge < uPercentMac) {
    return {
      kind: 'close',
      text: `near the edge of ${wanted} ±${NARROW_SPACE}${formatNumber(target.tolerance, 1)}`,
    };
  }
  return { kind: 'inside', text: `wanted ${wanted}` };
}
