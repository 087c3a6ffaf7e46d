import { BalancePlace } from '#client/features/balance/balance-place.tsx';
import { useWorkspace } from '#client/features/gliders/workspace-context.ts';

export function BalancePage() {
  return <BalancePlace workspace={useWorkspace()} />;
}
