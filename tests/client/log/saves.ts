import { planChanges } from '#shared/core/plan-changes.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderSaveDto, SaveChanges } from '#shared/schemas/glider-save.ts';

export const changesBetween = (before: Plan, after: Plan): SaveChanges => ({
  list: planChanges(before, after),
  more: 0,
  massBy: 1,
  balanceBy: -0.5,
});

/** A save in the log, a minute after another for each version. */
export function saveAt(version: number, changes: Partial<GliderSaveDto> = {}): GliderSaveDto {
  const savedAt = new Date(Date.UTC(2026, 10, 30, 10, version)).toISOString();
  return {
    version,
    savedAt,
    savedBy: 'Ines',
    figures: { mass: 220, percentMac: 52, wingLoading: 12 },
    name: null,
    restoredFrom: null,
    changes: version === 1 ? null : { list: [], more: 0, massBy: 1, balanceBy: 0.1 },
    ...changes,
  };
}
