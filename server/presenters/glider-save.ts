import type { GliderSaveDto } from '#shared/schemas/glider-save.ts';
import type { GliderSave } from '#server/models/glider-save.ts';
import { presentFigures } from './figures.ts';

export function presentGliderSave(row: GliderSave, savedBy: string): GliderSaveDto {
  return {
    version: row.version,
    savedAt: row.savedAt.toISOString(),
    savedBy,
    figures: presentFigures(row),
    name: null,
    restoredFrom: null,
    changes: null,
  };
}
