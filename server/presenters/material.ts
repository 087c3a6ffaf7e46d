import type { MaterialDto } from '#shared/schemas/material.ts';
import type { Material } from '#server/models/material.ts';
import { mayOnMaterial } from '#server/policies/material.ts';
import type { MaterialStanding } from '#server/policies/table.ts';

export function presentMaterial(row: Material, standing: MaterialStanding, usedBy: number): MaterialDto {
  return {
    id: row.id,
    key: row.key,
    shared: row.ownerId === null,
    name: row.name,
    category: row.category,
    density: row.density,
    areal: row.areal,
    spread: row.spread,
    cv: row.cv,
    modulus: row.modulus,
    strength: row.strength,
    moisture: row.moisture,
    form: row.form,
    source: row.source,
    basis: row.basis,
    version: row.version,
    usedBy,
    can: { edit: mayOnMaterial(standing, 'edit'), delete: mayOnMaterial(standing, 'delete') },
  };
}
