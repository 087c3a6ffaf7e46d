import { divideMeasure, shareMass } from '#shared/core/stock-split.ts';
import { volumeOfStock } from '#shared/core/stock.ts';
import type { SplitInput } from '#shared/schemas/rack.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';

export interface PlannedPiece {
  /** in the measure that is divided, mm */
  measure: number;
  /** g, by its share of the volume */
  mass: number | null;
  /** what is left behind the last cut */
  rest: boolean;
}
export type SplitPlan = { pieces: PlannedPiece[]; lost: number | null } | { missing: number };

/** What a split would give, by the rules that the server cuts by; null while something is still to be typed. */
export function planSplit(piece: StockPieceDto, { along, wanted, kerf }: SplitInput): SplitPlan | null {
  if (wanted.length === 0 || !wanted.every((one) => one > 0) || !(kerf >= 0)) return null;
  const cuts = divideMeasure({ whole: piece[along], wanted, kerf });
  if ('missing' in cuts) return cuts;
  const volumes = cuts.pieces.map((measure) => volumeOfStock({ ...piece, [along]: measure }));
  const { masses, lost } = shareMass(piece.mass, volumes, volumeOfStock(piece));
  return {
    pieces: cuts.pieces.map((measure, i) => ({
      measure,
      mass: masses[i] ?? null,
      rest: i >= wanted.length,
    })),
    lost,
  };
}
