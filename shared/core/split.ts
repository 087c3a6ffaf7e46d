import type { PieceSize } from './grades.ts';

/** How a piece is cut into several, all cuts in one direction. Lengths mm. */
export interface SplitPlan {
  /** the measure that is divided: across the grain for `length`, along it for `width` */
  along: 'length' | 'width';
  /** of the pieces wanted, in that measure */
  wanted: readonly number[];
  /** what a cut takes away */
  kerf: number;
}

/** A piece cut from another. */
export interface SplitPart {
  size: PieceSize;
  /** in proportion to its volume, g; null where the whole was not weighed */
  mass: number | null;
}

/** What comes of a split; `lost` is what the saw takes. Or by how much the piece is too short, mm. */
export type SplitOutcome = { parts: SplitPart[]; rest: SplitPart | null; lost: number } | { shortBy: number };

/** A rest below this is dust, mm. */
const NOTHING_LEFT = 1e-6;

/**
 * Divides a piece. Each piece wanted costs its own measure and one cut, but for the last where nothing is left over;
 * what remains is the rest. Masses go by volume, as if the piece were even from end to end: weigh the parts to know.
 * @example splitPiece({ length: 1000, width: 100, thickness: 2 }, 20, { along: 'length', wanted: [400, 400], kerf: 1 }).rest // → { size: { length: 198, width: 100, thickness: 2 }, mass: 3.96 }
 */
export function splitPiece(size: PieceSize, mass: number | null, plan: SplitPlan): SplitOutcome {
  const whole = size[plan.along];
  const taken = plan.wanted.reduce((sum, one) => sum + one, 0);
  const between = Math.max(0, plan.wanted.length - 1) * plan.kerf;
  const spare = whole - taken - between;
  if (spare < -NOTHING_LEFT) return { shortBy: -spare };
  const partOf = (measure: number): SplitPart => ({
    size: { ...size, [plan.along]: measure },
    mass: mass === null ? null : (mass * measure) / whole,
  });
  const left = spare - plan.kerf;
  const parts = plan.wanted.map(partOf);
  const rest = left > NOTHING_LEFT ? partOf(left) : null;
  return { parts, rest, lost: Math.max(0, whole - taken - Math.max(0, rest ? left : 0)) };
}

/**
 * Measures of as many equal pieces as asked for, all cuts counted; none where the kerf leaves nothing.
 * @example equalParts(100, 3, 2) // → [32, 32, 32]
 */
export function equalParts(whole: number, count: number, kerf: number): number[] {
  const each = (whole - (count - 1) * kerf) / count;
  return count >= 1 && each > 0 ? Array.from({ length: Math.floor(count) }, () => each) : [];
}
