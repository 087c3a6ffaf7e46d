import type { GliderTrialsDto } from '#shared/schemas/trials.ts';
import type { GliderTrials } from '#server/models/glider-trials.ts';

const NONE: GliderTrialsDto = {
  trials: [],
  terms: { arm: null, minimumMass: null },
  version: 1,
  updatedAt: null,
  updatedBy: null,
};

/** `updatedBy` is the name of who saved last. */
export function presentGliderTrials(row: GliderTrials | null): GliderTrialsDto {
  if (!row) return NONE;
  return {
    trials: row.trials,
    terms: row.terms,
    version: row.version,
    updatedAt: row.updatedAt.toISOString(),
    updatedBy: row.editor?.name ?? null,
  };
}
