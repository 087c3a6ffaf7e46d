/** A grade of balsa by density; no standard fixes the grades, these are common practice of the trade. */
export interface BalsaGrade {
  /** its row in the materials table is `balsa-<key>` */
  key: 'contest' | 'light' | 'medium' | 'medium-hard' | 'hard';
  /** kg/m³, in */
  from: number;
  /** kg/m³, not in */
  to: number;
}

/** The grades from the lightest, as weighed in shop air; they join without a gap. */
export const BALSA_GRADES: readonly BalsaGrade[] = [
  { key: 'contest', from: 64, to: 96 },
  { key: 'light', from: 96, to: 128 },
  { key: 'medium', from: 128, to: 176 },
  { key: 'medium-hard', from: 176, to: 216 },
  { key: 'hard', from: 216, to: 264 },
];

/**
 * Grade of balsa of a density in kg/m³; `under` and `over` where it is lighter or heavier than what is sold by grade.
 * @example balsaGrade(112) // → 'light'
 * @example balsaGrade(300) // → 'over'
 */
export function balsaGrade(density: number): BalsaGrade['key'] | 'under' | 'over' {
  const [lightest] = BALSA_GRADES;
  if (lightest && density < lightest.from) return 'under';
  return BALSA_GRADES.find(({ to }) => density < to)?.key ?? 'over';
}

/** A piece of stock as it is measured, mm. */
export interface PieceSize {
  length: number;
  width: number;
  thickness: number;
}

/**
 * Density in kg/m³ of what was weighed, g, and has a volume in mm³; null without either.
 * @example densityOf(16, 100_000) // → 160
 */
export function densityOf(massG: number, volumeMm3: number): number | null {
  return volumeMm3 > 0 && massG > 0 && Number.isFinite(volumeMm3) ? (massG / volumeMm3) * 1e6 : null;
}
