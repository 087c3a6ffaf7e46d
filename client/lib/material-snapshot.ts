import type { PlanMaterial } from '#shared/core/plan.ts';
import type { MaterialDto } from '#shared/schemas/material.ts';

/** A material as a plan would hold it, under the key of the table that it comes from. */
export interface TableMaterial {
  key: string;
  material: PlanMaterial;
}

/** The snapshot that a plan keeps of a row of the materials table: what is not known is left out. */
export function snapshotOf(
  row: Omit<MaterialDto, 'id' | 'form' | 'basis' | 'shared' | 'version' | 'usedBy' | 'can'>,
): TableMaterial {
  const { key, name, category, density, areal, spread, cv, modulus, strength, moisture, source } = row;
  const known = { density, areal, spread, moistureAtDensity: moisture, modulus, strength };
  const figures = Object.fromEntries(Object.entries(known).filter(([, value]) => value !== null));
  return { key, material: { name, category, cv, ...figures, source } };
}
