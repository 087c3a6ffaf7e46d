import { z } from 'zod';
import { loadFactorAt } from '#shared/core/load-cases.ts';

/** Ways of loading a wing whose load factor comes from a speed: it stalls before it gives more lift. */
export const SPEED_CASES = ['tow', 'throw', 'gust'] as const;
export type SpeedCase = (typeof SPEED_CASES)[number];
export type LoadCase = 'stated' | SpeedCase;

/** Fastest a light model is towed or thrown, m/s. */
export const SPEED_MAX = 100;

const speed = z.number().min(0).max(SPEED_MAX).nullable();

/** What is kept of the cases of one glider: speeds in m/s, and the case that is drawn. */
export const keptCases = z.object({
  speeds: z.object({ tow: speed, throw: speed, gust: speed }),
  shown: z.enum(['stated', ...SPEED_CASES]),
});
export type KeptCases = z.infer<typeof keptCases>;
export const NO_CASES: KeptCases = { speeds: { tow: null, throw: null, gust: null }, shown: 'stated' };

export const CASE_NAMES: Record<LoadCase, { name: string; note: string }> = {
  stated: { name: 'As stated', note: 'load factor asked for' },
  tow: { name: 'Tow', note: 'fastest on the line' },
  throw: { name: 'Hand launch', note: 'as it leaves the hand' },
  gust: { name: 'Gust', note: 'flying speed as it strikes' },
};

export interface CaseRow {
  key: LoadCase;
  /** m/s; null where none is typed, and for the stated case */
  speed: number | null;
  /** null where a speed is missing, or is none */
  loadFactor: number | null;
}

/** All cases with their load factors; `stall` in m/s. */
export function caseRows({ speeds }: KeptCases, stated: number, stall: number | null): CaseRow[] {
  return [
    { key: 'stated', speed: null, loadFactor: stated },
    ...SPEED_CASES.map((key): CaseRow => {
      const typed = speeds[key];
      const n = typed === null ? null : loadFactorAt(typed, stall);
      return { key, speed: typed, loadFactor: n !== null && n > 0 ? n : null };
    }),
  ];
}

/** The case that is drawn: the one picked, or the stated one while the picked one has no load factor. */
export function shownCase(rows: readonly CaseRow[], picked: LoadCase): CaseRow & { loadFactor: number } {
  const found = rows.find(({ key, loadFactor }) => key === picked && loadFactor !== null);
  const stated = rows.find(({ key }) => key === 'stated');
  const row = found ?? stated ?? { key: 'stated', speed: null, loadFactor: 1 };
  return { ...row, loadFactor: row.loadFactor ?? 1 };
}
