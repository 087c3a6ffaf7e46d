import { cutParts, THICKEST_SHEET, woodOf, type CutPart } from '#shared/core/cut/cut-parts.ts';
import { packSheets, type SheetPacking } from '#shared/core/cut/pack-sheets.ts';
import { sheetSold, type ShopSizes } from '#shared/core/cut/shop-sizes.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import type { CutTerms } from './cut-terms.ts';

/** Blanks of one material and thickness, and the sheets that they are cut from. */
export interface SheetGroup {
  key: string;
  material: string;
  thickness: number;
  blanks: BlankRow[];
  packing: SheetPacking;
}

/** Blanks of one part that are alike, port and starboard together. */
export interface BlankRow {
  name: string;
  /** of several alike, which, from the root; null where there is one */
  number: number | null;
  ids: string[];
  length: number;
  width: number;
  grain: CutPart['grain'];
}

/** Thicknesses this near are one size, mm. */
const ALIKE = 0.15;

/** What a plan cuts from sheet, by material and thickness, laid on sheets of the rack and on sheets to buy. */
export function sheetGroups(
  plan: Plan,
  terms: CutTerms,
  { rack, sizes }: { rack: readonly StockPieceDto[]; sizes: ShopSizes },
): SheetGroup[] {
  const byKey = new Map<string, CutPart[]>();
  for (const part of cutParts(plan)) {
    if (part.form !== 'sheet' || part.thickness > THICKEST_SHEET) continue;
    const key = `${part.material} ${part.thickness.toFixed(2)}`;
    byKey.set(key, [...(byKey.get(key) ?? []), part]);
  }
  return [...byKey].map(([key, parts]): SheetGroup => {
    const { material = '', thickness = 0 } = parts[0] ?? {};
    const wood = woodOf(plan.materials[material]?.name ?? material);
    const atHand = rack
      .filter((piece) => {
        const alike = Math.abs(piece.thickness - thickness) <= ALIKE;
        return piece.kind === 'sheet' && piece.state === 'free' && alike && isSame(piece, material, wood);
      })
      .map(({ number, length, width }) => ({ id: `No. ${number}`, length, width }));
    const sold = sheetSold(thickness, sizes) === null ? null : sizes.sheet;
    const packing = packSheets(parts, { atHand, bought: sold, kerf: terms.kerf });
    return { key, material, thickness, blanks: rowsOf(parts), packing };
  });
}

/** Of the grade that is drawn: which other one would do is for “Which piece for which part”. */
const isSame = ({ material }: StockPieceDto, key: string, wood: string): boolean =>
  material.key === null ? woodOf(material.name) === wood : material.key === key;

function rowsOf(parts: readonly CutPart[]): BlankRow[] {
  const rows = new Map<string, BlankRow>();
  for (const { id, line, name, number, length, width, grain } of parts) {
    const key = `${line} ${number ?? ''} ${length.toFixed(1)} ${width.toFixed(1)}`;
    const row = rows.get(key) ?? { name, number, ids: [], length, width, grain };
    row.ids.push(id);
    rows.set(key, row);
  }
  return [...rows.values()];
}
