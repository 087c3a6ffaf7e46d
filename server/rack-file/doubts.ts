import { volumeOfStock } from '#shared/core/stock.ts';
import type { StockPieceInput } from '#shared/schemas/stock-piece.ts';

/**
 * Densities of the lightest and the heaviest that is sold, kg/m³, with room to either side: balsa is graded from about
 * 64 to 264 and is found from 40 to 340; the heaviest timbers sink in water at about 1300. Common practice, no source.
 */
const BALSA = { from: 40, to: 350 };
const WOOD = { from: 40, to: 1_350 };

const times = (ratio: number) => `${Number(ratio.toPrecision(2))} times`;

/** What should be looked at before a piece is taken in; null where nothing should. */
export function doubtOf(piece: StockPieceInput): string | null {
  if (piece.mass === null || piece.material.category !== 'wood') return null;
  const density = (piece.mass / volumeOfStock(piece)) * 1e6;
  const isBalsa = /balsa/i.test(piece.material.name);
  const { from, to } = isBalsa ? BALSA : WOOD;
  if (density >= from && density <= to) return null;
  const wood = isBalsa ? 'balsa' : 'wood';
  // As a multiple, which is the same in every unit.
  const word =
    density < from
      ? `${times(from / density)} as light as the lightest ${wood}`
      : `${times(density / to)} as heavy as the heaviest ${wood}`;
  return `Would be ${word}. Check sizes, mass and their units.`;
}
