import type { GliderSaveDto, GliderStateDto } from '#shared/schemas/glider-save.ts';
import type { GliderSave } from '#server/models/glider-save.ts';
import { presentFigures } from './figures.ts';

export function presentGliderSave(row: GliderSave, savedBy: string, name: string | null): GliderSaveDto {
  return {
    version: row.version,
    savedAt: row.savedAt.toISOString(),
    savedBy,
    figures: presentFigures(row),
    name,
    restoredFrom: row.restoredFrom,
    changes: row.changes,
  };
}

export function presentGliderState(row: GliderSave, savedBy: string, name: string | null): GliderStateDto {
  return { ...presentGliderSave(row, savedBy, name), plan: row.plan };
}
