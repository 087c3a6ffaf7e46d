import type { Part, PlanMaterial, Solid } from '#shared/core/plan.ts';

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
