import type { GliderDto, GliderRole, GliderSummaryDto } from '#shared/schemas/glider.ts';
import type { Glider } from '#server/models/glider.ts';
import { gliderAbilities } from '#server/policies/glider.ts';
import { presentFigures } from './figures.ts';

/** `updatedBy` is the name of who saved last. */
export function presentGlider(row: Glider, role: GliderRole, updatedBy: string): GliderDto {
  return {
    id: row.id,
    name: row.name,
    role,
    can: gliderAbilities(role),
    version: row.version,
    plan: row.plan,
    updatedAt: row.updatedAt.toISOString(),
    updatedBy,
    archivedAt: row.archivedAt?.toISOString() ?? null,
  };
}

export function presentGliderSummary(row: Glider, role: GliderRole, ownerName: string): GliderSummaryDto {
  return {
    id: row.id,
    name: row.name,
    role,
    ownerName,
    version: row.version,
    figures: presentFigures(row),
    outline: row.outline,
    updatedAt: row.updatedAt.toISOString(),
    archivedAt: row.archivedAt?.toISOString() ?? null,
  };
}
