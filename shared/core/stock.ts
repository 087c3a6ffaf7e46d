/** A piece of stock as it is measured, mm. */
export interface StockSize {
  kind: 'sheet' | 'stick' | 'block' | 'tube';
  length: number;
  width: number;
  thickness: number;
  /** of a tube, half its diameter for a solid rod */
  wall: number | null;
}

/**
 * Volume in mm³: length × width × thickness, and of a tube π·wall·(diameter − wall)·length.
 * @example volumeOfStock({ kind: 'sheet', length: 1000, width: 100, thickness: 2, wall: null }) // → 200000
 */
export function volumeOfStock({ kind, length, width, thickness, wall }: StockSize): number {
  if (kind !== 'tube') return length * width * thickness;
  const round = wall ?? width / 2;
  return Math.PI * round * (width - round) * length;
}
