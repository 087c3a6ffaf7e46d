import {
  balanceContributions,
  massContributions,
  momentsAbout,
  type Contribution,
} from '#shared/core/contributions.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { sheetGroups } from '#shared/core/sheet-groups.ts';
import { groupHatch, lineHatch } from './hatches.ts';

/** One bar: what it is called, how long it is, what it is filled with. */
export interface Bar {
  key: string;
  name: string;
  value: number;
  fill: string;
}

/** Bars of the uncertainty drawn at most; the rest is one bar. */
const MOST = 7;

/** Mass of each group of the sheet, heaviest first. */
export function massBars(plan: Plan, { lines }: Pick<Estimate, 'lines'>): Bar[] {
  return sheetGroups(lines)
    .map(({ key, name, lines: own }) => ({
      key,
      name,
      value: own.reduce((sum, line) => sum + line.mass, 0),
      fill: groupHatch(plan, own),
    }))
    .filter(({ value }) => value > 0)
    .sort((a, b) => b.value - a.value);
}

/** Moment of each group about a point, nose-heavy ones first. */
export function momentBars(plan: Plan, result: Pick<Estimate, 'lines'>, about: number): Bar[] {
  const fills = new Map(sheetGroups(result.lines).map(({ key, lines }) => [key, groupHatch(plan, lines)]));
  return momentsAbout(result, about)
    .filter(({ mass }) => mass > 0)
    .map(({ key, name, moment }) => ({ key, name, value: moment, fill: fills.get(key) ?? '' }));
}

export interface DoubtBars {
  bars: Bar[];
  /** all contributions, for the table */
  all: (Contribution & { group: string })[];
}

/** The lines that make the mass (g) or the balance point (mm) uncertain, largest first, the small ones together. */
export function doubtBars(plan: Plan, result: Estimate, of: 'mass' | 'balance'): DoubtBars {
  const all = of === 'mass' ? massContributions(result) : balanceContributions(result);
  const lineOf = new Map(result.lines.map((line) => [line.id, line]));
  const named = all.map((one) => {
    const line = lineOf.get(one.id);
    return { ...one, group: line?.surface ?? line?.group ?? '' };
  });
  const clashes = new Set(all.map(({ name }) => name).filter((name, i, names) => names.indexOf(name) !== i));
  const bars = named.slice(0, MOST).map(({ id, name, u, group }): Bar => {
    const line = lineOf.get(id);
    return {
      key: id,
      name: clashes.has(name) ? `${name}, ${group}` : name,
      value: u,
      fill: line ? lineHatch(plan, line) : '',
    };
  });
  const rest = all.slice(MOST);
  if (rest.length > 0) {
    bars.push({
      key: 'rest',
      name: `${rest.length} others together`,
      value: Math.hypot(...rest.map(({ u }) => u)),
      fill: 'var(--rule)',
    });
  }
  return { bars, all: named };
}
