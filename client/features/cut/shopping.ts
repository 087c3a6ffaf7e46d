import { sheetSold, stickSold, type ShopSizes } from '#shared/core/cut/shop-sizes.ts';
import type { SheetGroup } from './sheet-groups.ts';
import type { StickGroup } from './stick-groups.ts';

/** One line of the list for the shop. Lengths mm. */
export interface ShoppingLine {
  key: string;
  material: string;
  form: 'sheet' | 'stick';
  count: number;
  /** as it is sold; null where no shop sells such a size */
  sold: { length: number; width: number; thickness: number } | null;
  /** as it is drawn, across the grain */
  drawn: { width: number | null; thickness: number };
  /** sold thicker or wider than drawn: to be sanded or stripped down */
  isThicker: boolean;
}

/** Sizes this near are one size, mm. */
const ALIKE = 0.15;

/** What has to be bought, in the sizes that shops sell: sheets first, thin before thick. */
export function shoppingList(
  sheets: readonly SheetGroup[],
  sticks: readonly StickGroup[],
  { sizes, stick: stickLength }: { sizes: ShopSizes; stick: number },
): ShoppingLine[] {
  const ofSheet = sheets.flatMap(({ key, material, thickness, packing }): ShoppingLine[] => {
    const count = packing.bought;
    const sold = sheetSold(thickness, sizes);
    if (count === 0 && sold !== null) return [];
    return [
      {
        key,
        material,
        form: 'sheet',
        count,
        sold: sold === null ? null : { ...sizes.sheet, thickness: sold },
        drawn: { width: null, thickness },
        isThicker: sold !== null && sold > thickness + ALIKE,
      },
    ];
  });
  const ofStick = sticks.flatMap(({ key, material, width, thickness, packing }): ShoppingLine[] => {
    if (packing.bought === 0) return [];
    const sold = stickSold(width, thickness, sizes);
    const isThicker = sold !== null && (sold[0] > width + ALIKE || sold[1] > thickness + ALIKE);
    return [
      {
        key,
        material,
        form: 'stick',
        count: packing.bought,
        sold: sold && { length: stickLength, width: sold[0], thickness: sold[1] },
        drawn: { width, thickness },
        isThicker,
      },
    ];
  });
  const rising = (lines: readonly ShoppingLine[]) =>
    lines.toSorted((a, b) => a.drawn.thickness - b.drawn.thickness);
  return [...rising(ofSheet), ...rising(ofStick)];
}
