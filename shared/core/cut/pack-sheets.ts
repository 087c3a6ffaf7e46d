import { laySheet, type Laid, type Rectangle } from './lay-sheet.ts';

/** A sheet at hand. Lengths mm. */
export interface SheetStock {
  id: string;
  length: number;
  width: number;
}

export interface SheetTerms {
  atHand: readonly SheetStock[];
  /** what a shop sells; null where nothing is to be bought */
  bought: { length: number; width: number } | null;
  kerf: number;
}

/** One sheet with what is cut from it. */
export interface CutSheet {
  /** id of the stock at hand; null for one that is bought */
  stock: string | null;
  length: number;
  width: number;
  laid: Laid[];
  /** share of its area that is cut out, 0–1 */
  used: number;
}

export interface SheetPacking {
  sheets: CutSheet[];
  /** how many have to be bought, and how few it could be at best: by area, and by what shares a sheet with nothing */
  bought: number;
  bound: number;
  /** what is larger than any sheet */
  tooLarge: string[];
  /** what finds no place where nothing may be bought */
  unplaced: string[];
}

/**
 * Packs rectangles on sheets by strips (`laySheet`), what is at hand first: the largest first, each on the first sheet
 * with room. The bound holds for what is at hand and what is bought together.
 * @example packSheets([{ id: 'a', length: 900, width: 60 }, { id: 'b', length: 900, width: 60 }], { atHand: [], bought: { length: 1000, width: 100 }, kerf: 1 }) // → { sheets: [{ stock: null, length: 1000, width: 100, laid: [{ id: 'a', at: [0, 0] }], used: 0.54 }, { stock: null, length: 1000, width: 100, laid: [{ id: 'b', at: [0, 0] }], used: 0.54 }], bought: 2, bound: 2, tooLarge: [], unplaced: [] }
 */
export function packSheets(blanks: readonly Rectangle[], { atHand, bought, kerf }: SheetTerms): SheetPacking {
  const falling = blanks.toSorted((a, b) => b.width - a.width || b.length - a.length);
  const open: { stock: string | null; length: number; width: number; own: Rectangle[]; laid: Laid[] }[] =
    atHand
      .toSorted((a, b) => a.length * a.width - b.length * b.width)
      .map(({ id, length, width }) => ({ stock: id, length, width, own: [], laid: [] }));
  const [tooLarge, unplaced]: [string[], string[]] = [[], []];
  for (const blank of falling) {
    const goesOn = (sheet: (typeof open)[number]): boolean => {
      const laid = laySheet([...sheet.own, blank], sheet, kerf);
      if (!laid) return false;
      sheet.own.push(blank);
      sheet.laid = laid;
      return true;
    };
    if (open.some(goesOn)) continue;
    const fresh = bought && { stock: null, ...bought, own: [], laid: [] };
    if (fresh && goesOn(fresh)) open.push(fresh);
    else (bought || !fitsAny(blank, atHand) ? tooLarge : unplaced).push(blank.id);
  }
  const sheets = open
    .filter(({ own }) => own.length > 0)
    .map(({ own, stock, length, width, laid }): CutSheet => {
      const area = own.reduce((sum, piece) => sum + piece.length * piece.width, 0);
      return { stock, length, width, laid, used: area / (length * width) };
    });
  const placed = falling.filter(({ id }) => !tooLarge.includes(id) && !unplaced.includes(id));
  return {
    sheets,
    bought: sheets.filter(({ stock }) => stock === null).length,
    bound: bought ? leastBought(placed, atHand, bought, kerf) : 0,
    tooLarge,
    unplaced,
  };
}

const fitsAny = ({ length, width }: Rectangle, stock: readonly SheetStock[]): boolean =>
  stock.some((sheet) => length <= sheet.length && width <= sheet.width);

/** How few sheets could do at best beside those at hand. */
function leastBought(
  blanks: readonly Rectangle[],
  atHand: readonly SheetStock[],
  bought: { length: number; width: number },
  kerf: number,
): number {
  const room = ({ length, width }: { length: number; width: number }) => (length + kerf) * (width + kerf);
  const missing = sum(blanks.map(room)) - sum(atHand.map(room));
  const byArea = Math.max(0, Math.ceil(missing / room(bought) - 1e-9));
  // No two of these lie on one sheet, of whatever is at hand or sold.
  const sizes = [...atHand, bought];
  const long = Math.max(...sizes.map(({ length }) => length));
  const wide = Math.max(...sizes.map(({ width }) => width));
  const alone = blanks.filter(({ length, width }) => length > long / 2 && width > wide / 2).length;
  return Math.max(byArea, alone - atHand.length);
}

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
