import type { CutPart } from '#shared/core/cut/cut-parts.ts';
import { sheetSold, stickSold, type ShopSizes } from '#shared/core/cut/shop-sizes.ts';
import type { SheetGroup } from './sheet-groups.ts';
import type { StickGroup } from './stick-groups.ts';

/** One line of the list for the shop. Lengths mm. */
export interface ShoppingLine {
  key: string;
  material: string;
  form: 'sheet' | 'stick' | 'block';
  count: number;
  /** as it is sold; of a block as large as it has to be */
  sold: { length: number; width: number; thickness: number };
  /** as it is drawn, across the grain */
  drawn: { width: number | null; thickness: number };
  /** sold thicker or wider than drawn: to be sanded or stripped down */
  isThicker: boolean;
}

/** Sizes this near are one size, mm. */
const ALIKE = 0.15;

/** What has to be bought, in the sizes that shops sell: sheets, sticks, blocks, thin before thick. */
export function shoppingList(
  sheets: readonly SheetGroup[],
  sticks: readonly StickGroup[],
  blocks: readonly CutPart[],
  { sizes, stick: stickLength }: { sizes: ShopSizes; stick: number },
): ShoppingLine[] {
  const ofSheet = sheets.flatMap(({ key, material, thickness, packing }): ShoppingLine[] => {
    const count = packing.bought;
    const sold = sheetSold(thickness, sizes);
    if (count === 0 || sold === null) return [];
    return [
      {
        key,
        material,
        form: 'sheet',
        count,
        sold: { ...sizes.sheet, thickness: sold },
        drawn: { width: null, thickness },
        isThicker: sold > thickness + ALIKE,
      },
    ];
  });
  const ofStick = sticks.flatMap(({ key, material, width, thickness, packing }): ShoppingLine[] => {
    if (packing.bought === 0) return [];
    // No shop has so stout a stick: it is cut from a block of its own size.
    const [wide, thick] = stickSold(width, thickness, sizes) ?? [width, thickness];
    const isThicker = wide > width + ALIKE || thick > thickness + ALIKE;
    return [
      {
        key,
        material,
        form: 'stick',
        count: packing.bought,
        sold: { length: stickLength, width: wide, thickness: thick },
        drawn: { width, thickness },
        isThicker,
      },
    ];
  });
  const rising = (lines: readonly ShoppingLine[]) =>
    lines.toSorted((a, b) => a.drawn.thickness - b.drawn.thickness);
  const ofBlock = blocks.map(({ id, material, length, width, thickness }): ShoppingLine => {
    const sold = { length, width, thickness };
    return {
      key: id,
      material,
      form: 'block',
      count: 1,
      sold,
      drawn: { width, thickness },
      isThicker: false,
    };
  });
  return [...rising(ofSheet), ...rising(ofStick), ...rising(ofBlock)];
}
