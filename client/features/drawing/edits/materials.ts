import type { TableMaterial } from '#client/lib/material-snapshot.ts';
import type { Part, Plan, PlanMaterial, Solid } from '#shared/core/plan.ts';

/** What a part can be made of: whether a material is sold in a way that the part can be weighed by. */
export type Fits = (material: PlanMaterial) => boolean;

export function fitsPart(part: Pick<Part, 'kind'> & { method?: 'share' | 'joints' }): Fits {
  switch (part.kind) {
    case 'covering':
      return ({ category, areal }) =>
        areal !== undefined && (category === 'covering' || category === 'composite');
    case 'finish':
      return ({ category, areal }) =>
        areal !== undefined && (category === 'finish' || category === 'covering');
    case 'glue':
      return ({ category, spread }) =>
        category === 'adhesive' && (part.method === 'share' || spread !== undefined);
    case 'tipBlock':
      return (material) => isStock(material) && material.density !== undefined;
    default:
      return isStock;
  }
}

export function fitsSolid(solid: Pick<Solid, 'shape'>): Fits {
  return (material) => isStock(material) && (solid.shape === 'plate' || material.density !== undefined);
}

const STOCK: readonly PlanMaterial['category'][] = ['wood', 'composite', 'metal', 'sheet'];
const isStock: Fits = ({ category, density, areal }) =>
  STOCK.includes(category) && (density !== undefined || areal !== undefined);

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

/** The first of the wished-for keys that can be had, or else whatever fits; null where nothing does. */
export function preferred(
  plan: Pick<Plan, 'materials'>,
  table: readonly TableMaterial[],
  fits: Fits,
  wishes: readonly string[],
): TableMaterial | null {
  const offered = choices(plan, table, fits);
  for (const wish of wishes) {
    const found = offered.find(({ key }) => key === wish);
    if (found) return found;
  }
  return offered[0] ?? null;
}

/** Whether the table could give a material back that the plan lets go. */
export const inTable = (table: readonly TableMaterial[]) => (key: string) =>
  table.some((row) => row.key === key);
