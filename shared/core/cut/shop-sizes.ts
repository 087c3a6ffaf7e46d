/** Sizes that model shops sell wood in, mm; common practice, no source. Own woodworking shops sell others. */
export interface ShopSizes {
  thicknesses: readonly number[];
  /** sides that sticks are sold in; a stick has any two */
  sides: readonly number[];
  sheet: { length: number; width: number };
  stick: number;
}

const INCH = 25.4;

export const METRIC_SIZES: ShopSizes = {
  thicknesses: [0.8, 1, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10],
  sides: [1.5, 2, 3, 4, 5, 6, 8, 10, 12, 15],
  sheet: { length: 1000, width: 100 },
  stick: 1000,
};

export const INCH_SIZES: ShopSizes = {
  thicknesses: [1 / 32, 1 / 20, 1 / 16, 3 / 32, 1 / 8, 3 / 16, 1 / 4, 3 / 8, 1 / 2].map(
    (inches) => inches * INCH,
  ),
  sides: [1 / 16, 3 / 32, 1 / 8, 3 / 16, 1 / 4, 5 / 16, 3 / 8, 1 / 2].map((inches) => inches * INCH),
  sheet: { length: 36 * INCH, width: 3 * INCH },
  stick: 36 * INCH,
};

/** Sizes this near are one size, mm. */
const ALIKE = 0.15;

const leastOf = (sizes: readonly number[], wanted: number): number | null =>
  sizes.find((size) => size >= wanted - ALIKE) ?? null;

/**
 * The thickness of sheet to buy for a part: the same, or the next that can be sanded down; null where none is sold.
 * @example sheetSold(1.6, INCH_SIZES) // → 1.5875
 */
export const sheetSold = (thickness: number, { thicknesses }: ShopSizes): number | null =>
  leastOf(thicknesses, thickness);

/**
 * The section of stick to buy, the larger side first; null where none is sold.
 * @example stickSold(5, 3, INCH_SIZES) // → [6.35, 3.175]
 */
export function stickSold(
  width: number,
  thickness: number,
  { sides }: ShopSizes,
): [width: number, thickness: number] | null {
  const [large, small] = [leastOf(sides, width), leastOf(sides, thickness)];
  return large === null || small === null ? null : [large, small];
}
