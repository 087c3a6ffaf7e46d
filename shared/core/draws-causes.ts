import type { FoldedPlan } from './linear-model.ts';
import { weigh } from './linear-model-weigh.ts';

/** A sheet or stick that was weighed: what is cut from it is wrong together, and by its own little. */
export interface MeasuredPiece {
  id: string;
  name: string;
  /** ids of the lines that are cut from it */
  lines: readonly string[];
  /** relative standard deviation of its density, from scale and rule */
  cv: number;
}

/** How much masses scatter. */
export interface Spreads {
  /** thickness of sheet, ± mm, evenly; 0.1 unless said otherwise (common practice, no source) */
  thickness?: number | undefined;
  /** relative standard deviations of materials by their keys, in place of the plan's own */
  materials?: Readonly<Record<string, number>> | undefined;
}

export interface ScatterOptions {
  spreads?: Spreads | undefined;
  pieces?: readonly MeasuredPiece[] | undefined;
}

/** Why a mass may be another than reckoned: one line, one measured piece, or one item. */
export interface Cause {
  /** of the line, or of the piece */
  id: string;
  name: string;
  kind: 'line' | 'piece' | 'item';
  /** key of the material; of a piece that of its first line; null of an item */
  material: string | null;
}

/** How a line's mass follows chance: (mass + slope · normal) · (1 + tolerance · even), never below 0. */
export interface Scatter {
  /** g per standard deviation of the cause */
  slope: number;
  /** of `causes` */
  cause: number;
  /** half width of the thickness, relative */
  tolerance: number;
}

/** What the lines of a folded plan scatter by, in their order. */
export interface Scatters {
  causes: Cause[];
  scatters: Scatter[];
  /** nominal masses, g */
  masses: Float64Array;
}

/** Half width of a sheet's thickness where nothing else is said, mm (common practice, no source). */
export const THICKNESS_TOLERANCE = 0.1;

/**
 * What each line of a folded plan scatters by. Lines are independent, but for those of one measured piece, which move
 * together: its weight is known, and so its thickness does not matter again. Where a line stands in several pieces
 * the first counts.
 * @example scattersOf(foldPlan(EXAMPLE_PLAN), {}).scatters[2] // → { slope: 0.5, cause: 2, tolerance: 0.1 }
 */
export function scattersOf(fold: FoldedPlan, { spreads = {}, pieces = [] }: ScatterOptions): Scatters {
  const { masses } = weigh(fold);
  const causes: Cause[] = [];
  const placeOf = new Map<MeasuredPiece, number>();
  const causeOf = (piece: MeasuredPiece, material: string | null) => {
    const known = placeOf.get(piece);
    if (known !== undefined) return known;
    placeOf.set(piece, causes.length);
    return causes.push({ id: piece.id, name: piece.name, kind: 'piece', material }) - 1;
  };
  const scatters = fold.lines.map((line, i): Scatter => {
    const { id, name, material, u } = line;
    const mass = masses[i] ?? 0;
    const piece = pieces.find(({ lines }) => lines.includes(id));
    if (piece) return { slope: mass * piece.cv, cause: causeOf(piece, material), tolerance: 0 };
    const cause = causes.push({ id, name, kind: line.by === 'mass' ? 'item' : 'line', material }) - 1;
    const cv = (material === null ? undefined : spreads.materials?.[material]) ?? line.cv;
    const half = spreads.thickness ?? THICKNESS_TOLERANCE;
    return {
      slope: Math.hypot(mass * cv, u),
      cause,
      tolerance: line.thickness ? Math.min(1, half / line.thickness) : 0,
    };
  });
  return { causes, scatters, masses };
}
