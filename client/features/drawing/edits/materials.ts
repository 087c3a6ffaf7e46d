import type { TableMaterial } from '#client/lib/material-snapshot.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Fits } from '#shared/plan-start/fits.ts';
import { wished } from '#shared/plan-start/wishes.ts';

/** Materials to choose from: the plan's own snapshots first, then what the table has besides; both as they fit. */
export function choices(
  plan: Pick<Plan, 'materials'>,
  table: readonly TableMaterial[],
  fits: Fits,
): TableMaterial[] {
  const own = Object.entries(plan.materials).map(([key, material]) => ({ key, material }));
  const others = table.filter(({ key }) => !Object.hasOwn(plan.materials, key));
  return [...own, ...others].filter(({ material }) => fits(material));
}

/** What a builder would reach for first: of the plan's own materials and the table's, as they fit. */
export function preferred(
  plan: Pick<Plan, 'materials'>,
  table: readonly TableMaterial[],
  fits: Fits,
  wishes: readonly string[],
): TableMaterial | null {
  return wished(choices(plan, table, fits), fits, wishes);
}

/** Whether the table could give a material back that the plan lets go. */
export const inTable = (table: readonly TableMaterial[]) => (key: string) =>
  table.some((row) => row.key === key);
