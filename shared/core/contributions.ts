import type { Estimate, Line } from './result.ts';
import { sheetGroups } from './sheet-groups.ts';

/** What one line adds to an uncertainty. */
export interface Contribution {
  /** id of the estimate's line */
  id: string;
  name: string;
  /** standard uncertainty that this line alone would leave: g of the mass, mm of the balance point */
  u: number;
  /** share of the variance, 0–1; all shares add up to 1 */
  share: number;
}

/**
 * The lines that make the mass uncertain, the largest first, each with its own uᵢ in g; those that add nothing are
 * left out. All are taken as independent (JCGM 100:2008, 5.1.2).
 * @example massContributions(EXAMPLE_ESTIMATE)[0].name // → 'Sheeting'
 */
export function massContributions(estimate: Pick<Estimate, 'lines'>): Contribution[] {
  return ranked(estimate.lines, (line) => line.u);
}

/**
 * The lines that make the balance point uncertain, the largest first: |(xᵢ − x)/M|·uᵢ in mm, to first order
 * (JCGM 100:2008, 5.1.2). A heavy part on the balance point adds nothing, however little is known of it. Empty
 * where nothing has a mass.
 * @example balanceContributions(EXAMPLE_ESTIMATE)[0].name // → 'Boom'
 */
export function balanceContributions(estimate: Pick<Estimate, 'lines' | 'totals'>): Contribution[] {
  const { mass, at } = estimate.totals;
  if (!at || mass <= 0) return [];
  return ranked(estimate.lines, (line) => Math.abs((line.at[0] - at[0]) / mass) * line.u);
}

function ranked(lines: readonly Line[], uOf: (line: Line) => number): Contribution[] {
  const all = lines.map((line) => ({ id: line.id, name: line.name, u: uOf(line) })).filter(({ u }) => u > 0);
  const variance = all.reduce((sum, { u }) => sum + u * u, 0);
  return all.map((one) => ({ ...one, share: one.u ** 2 / variance })).sort((a, b) => b.u - a.u);
}

/** Moment of one group of the sheet about a point. */
export interface GroupMoment {
  key: string;
  name: string;
  mass: number;
  /** g·mm; positive where it pulls the tail down */
  moment: number;
}

/**
 * What each group of the sheet pulls about a point `x` mm aft of the datum, Σm·(xᵢ − x), sorted from what pulls the
 * nose down most to what pulls the tail down most.
 * @example momentsAbout(EXAMPLE_ESTIMATE, 0).map(({ name, moment }) => [name, moment]) // → [['Ballast', -200], ['Fuselage', 200], ['Wing', 266.4]]
 */
export function momentsAbout(estimate: Pick<Estimate, 'lines'>, x: number): GroupMoment[] {
  return sheetGroups(estimate.lines)
    .map(({ key, name, lines }) => ({
      key,
      name,
      mass: lines.reduce((sum, line) => sum + line.mass, 0),
      moment: lines.reduce((sum, line) => sum + line.moment - line.mass * x, 0),
    }))
    .sort((a, b) => a.moment - b.moment);
}
