import type { CutPart } from './cut-parts.ts';
import type { GrainWish } from './sheet-blanks.ts';

/** A sheet or stick at hand. Lengths mm. */
export interface CutStock {
  id: string;
  form: 'sheet' | 'stick';
  length: number;
  width: number;
  thickness: number;
  /** kg/m³, measured */
  density: number;
  /** how it was sawn; null where nobody looked */
  grainCut: 'A' | 'B' | 'C' | null;
  /** what wood it is, whatever its grade: `balsa` */
  wood: string;
}

/** Why a part cannot be cut from a piece. `by` is how much it is short, mm. */
export type Misfit =
  | { code: 'other_form' | 'other_wood' | 'other_grain' }
  | { code: 'other_thickness' | 'too_short' | 'too_narrow'; by: number };

/** Sizes this near are one size of stock, mm. */
const ALIKE = 0.15;
const SAME = 1e-6;

const BENT: Record<Exclude<GrainWish, null>, 'A' | 'C'> = { bends: 'C', stiff: 'A' };

/**
 * Why a part cannot be cut from a piece, the plainest reason first; null where it can. A sheet that bends is refused
 * for ribs and a stiff one for what is wrapped (common practice, no source); what nobody looked at is let through.
 * @example misfit({ form: 'sheet', length: 200, width: 20, thickness: 2, grain: 'stiff', wood: 'balsa' }, { id: '1', form: 'sheet', length: 150, width: 75, thickness: 2, density: 110, grainCut: 'C', wood: 'balsa' }) // → { code: 'too_short', by: 50 }
 */
export function misfit(
  part: Pick<CutPart, 'form' | 'length' | 'width' | 'thickness' | 'grain' | 'wood'>,
  stock: CutStock,
): Misfit | null {
  if (part.form !== stock.form) return { code: 'other_form' };
  if (part.wood !== stock.wood) return { code: 'other_wood' };
  const thin = Math.abs(part.thickness - Math.min(stock.thickness, stock.width));
  if (thin > ALIKE) return { code: 'other_thickness', by: thin };
  if (part.form === 'stick') {
    const wide = Math.abs(part.width - Math.max(stock.thickness, stock.width));
    if (wide > ALIKE) return { code: 'other_thickness', by: wide };
  }
  if (part.grain !== null && stock.grainCut === BENT[part.grain]) return { code: 'other_grain' };
  if (part.length > stock.length + SAME) return { code: 'too_short', by: part.length - stock.length };
  if (part.form === 'sheet' && part.width > stock.width + SAME) {
    return { code: 'too_narrow', by: part.width - stock.width };
  }
  return null;
}

/** From which of these reasons a part is told: the nearest miss says most. */
const NEARNESS: Record<Misfit['code'], number> = {
  too_narrow: 0,
  too_short: 1,
  other_grain: 2,
  other_thickness: 3,
  other_wood: 4,
  other_form: 5,
};

/**
 * The nearest miss of a part that no piece can be cut to; null where one can.
 * @example nearestMiss({ form: 'stick', length: 900, width: 5, thickness: 3, grain: null, wood: 'balsa' }, []) // → { code: 'other_form' }
 */
export function nearestMiss(part: Parameters<typeof misfit>[0], stock: readonly CutStock[]): Misfit | null {
  let nearest: Misfit = { code: 'other_form' };
  for (const piece of stock) {
    const miss = misfit(part, piece);
    if (!miss) return null;
    const order = NEARNESS[miss.code] - NEARNESS[nearest.code];
    if (order < 0 || (order === 0 && 'by' in miss && 'by' in nearest && miss.by < nearest.by)) nearest = miss;
  }
  return nearest;
}
