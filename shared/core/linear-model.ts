import type { Vec3 } from './frame.ts';
import { itemLine, solidLine, surfaceLines } from './lines.ts';
import type { Part, Plan, PlanMaterial, Solid } from './plan.ts';
import { surfaceLine } from './stations.ts';
import { wingReference, type WingReference } from './wing-reference.ts';

/** What a line's mass is made of: a figure of its material times an amount, a share of wood, or a mass as typed. */
export type MadeOf = 'density' | 'areal' | 'spread' | 'share' | 'mass';

/** A line of the estimate as far as it does not depend on what the wood weighs. */
export interface FoldedLine {
  id: string;
  name: string;
  group: string;
  surface: string | null;
  material: string | null;
  /** its material is a wood, which glue by share counts */
  wood: boolean;
  by: MadeOf;
  /** mm³ by density, mm² by areal mass or spread, g by mass, the share itself by share */
  amount: number;
  /** amount × arm about the datum, in body axes; of nothing by share, which lies where its wood lies */
  first: Vec3;
  /** g per unit of the amount; 1 by share and by mass */
  figure: number;
  /** relative standard deviation of the figure */
  cv: number;
  /** standard uncertainty beside it, g: that of an item */
  u: number;
  /** mm of a part that is cut from sheet and weighs by its volume; null of any other */
  thickness: number | null;
  /** the lines whose mass a share is of, by their place; empty of any other */
  of: readonly number[];
}

/** A plan measured once: all its masses and moments are linear in the figures of its lines. */
export interface FoldedPlan {
  lines: FoldedLine[];
  wing: WingReference | null;
  /** keys of the surfaces that are wings */
  wings: string[];
}

/** Density 1 g/mm³, and areal mass and spread 1 g/mm², wherever the material has such a figure. */
function unitOf(material: PlanMaterial): PlanMaterial {
  return { ...material, density: material.density === undefined ? undefined : 1e6, areal: 1e6, spread: 1e6 };
}

/** Thickness of the sheet that a part is cut from, mm; null of sticks, blocks and what has none. */
function sheetThickness(part: Part | Solid): number | null {
  if ('shape' in part) return part.shape === 'plate' ? part.thickness : null;
  return 'thickness' in part ? part.thickness : null;
}

function madeOf(part: Part | Solid, material: PlanMaterial): MadeOf {
  if ('kind' in part) {
    if (part.kind === 'glue') return part.method === 'share' ? 'share' : 'spread';
    if (part.kind === 'covering' || part.kind === 'finish') return 'areal';
  } else if (part.shape === 'bar') return 'density';
  return material.density === undefined ? 'areal' : 'density';
}

/**
 * Grams per mm³ or mm² of a material by one of its figures; 0 where it does not have it.
 * @example figureOf({ name: 'Balsa', category: 'wood', density: 112, cv: 0.1 }, 'density') // → 0.000112
 */
export function figureOf(material: PlanMaterial, by: MadeOf): number {
  if (by === 'share' || by === 'mass') return 1;
  return (material[by] ?? 0) * 1e-6;
}

/**
 * Folds a plan: measures it once with every figure of its materials set to one, so that another wood, a draw or a
 * slider costs one product instead of a new estimate. Lines are those of `estimate`, in their order; `weigh` makes
 * its masses and balance of them.
 * @throws RangeError when a part or solid names a material that the plan does not hold
 * @example foldPlan(EXAMPLE_PLAN).lines.map(({ by, amount }) => [by, amount]) // → [['density', 22_560], ['density', 10_000], ['density', 50_000], ['density', 10_000], ['mass', 10]]
 */
export function foldPlan(plan: Plan): FoldedPlan {
  const keys = Object.entries(plan.materials);
  const unit = { ...plan, materials: Object.fromEntries(keys.map(([key, m]) => [key, unitOf(m)])) };
  const lines: FoldedLine[] = [];
  const add = (part: Part | Solid, measured: ReturnType<typeof solidLine>) => {
    const { id, name, group, surface } = measured.line;
    const material = plan.materials[part.material];
    if (!material) throw new RangeError(`the plan has no material “${part.material}”`);
    const by = madeOf(part, material);
    lines.push({
      id,
      name,
      group,
      surface,
      material: part.material,
      by,
      wood: material.category === 'wood',
      amount: by === 'share' && 'share' in part ? (part.share ?? 0) : measured.lump.amount,
      first: by === 'share' ? [0, 0, 0] : measured.lump.first,
      figure: figureOf(material, by),
      cv: material.cv,
      u: 0,
      thickness: by === 'density' ? sheetThickness(part) : null,
      of: [],
    });
  };
  for (const surface of unit.surfaces) {
    const start = lines.length;
    const measured = surfaceLines(unit, surface, surfaceLine(surface), () => undefined);
    surface.parts.forEach((part, i) => measured[i] && add(part, measured[i]));
    const wood = surface.parts.flatMap(({ kind }, i) =>
      kind !== 'glue' && lines[start + i]?.wood ? [start + i] : [],
    );
    for (const line of lines.slice(start)) if (line.by === 'share') line.of = wood;
  }
  for (const solid of unit.solids)
    add(
      solid,
      solidLine(unit, solid, () => undefined),
    );
  for (const { line, lump } of plan.items.map(itemLine)) {
    const { id, name, group, surface, material, u } = line;
    const none = { wood: false, figure: 1, cv: 0, thickness: null, of: [] };
    lines.push({
      id,
      name,
      group,
      surface,
      material,
      u,
      ...none,
      by: 'mass',
      amount: lump.amount,
      first: lump.first,
    });
  }
  const wings = plan.surfaces.filter(({ role }) => role === 'wing').map(({ key }) => key);
  return { lines, wing: wingReference(plan), wings };
}
