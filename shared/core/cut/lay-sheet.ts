/** A rectangle to be cut, grain along its length. Lengths mm. */
export interface Rectangle {
  id: string;
  length: number;
  width: number;
}

/** Where a rectangle lies on its sheet: from the sheet's end and from its edge, mm. */
export interface Laid {
  id: string;
  at: [along: number, across: number];
}

interface Row {
  across: number;
  left: number;
  laid: Laid[];
}

/** Rectangles that are tried in every way; of more the usual ways stand. */
const EXACT_UP_TO = 9;
const MOST_WAYS = 20_000;
const SAME = 1e-6;

/**
 * Lays rectangles on a sheet by strips: the sheet is ripped along the grain, and each strip cut across. Every cut
 * takes its kerf; the last one of a strip may end with the sheet. Null where no such way is found; of nine and fewer
 * every way is tried.
 * @example laySheet([{ id: 'a', length: 60, width: 40 }, { id: 'b', length: 30, width: 30 }], { length: 100, width: 40 }, 1) // → [{ id: 'a', at: [0, 0] }, { id: 'b', at: [61, 0] }]
 */
export function laySheet(
  rectangles: readonly Rectangle[],
  sheet: { length: number; width: number },
  kerf: number,
): Laid[] | null {
  // Each is as large as it is with its cut, and the sheet with one: so the last cut may be no cut.
  const [long, wide] = [sheet.length + kerf + SAME, sheet.width + kerf + SAME];
  const sizes = rectangles.map(({ id, length, width }) => ({
    id,
    length: length + kerf,
    width: width + kerf,
  }));
  if (sizes.some(({ length, width }) => length > long || width > wide)) return null;
  if (sizes.reduce((sum, { length, width }) => sum + length * width, 0) > long * wide) return null;
  const falling = sizes.toSorted((a, b) => b.width - a.width || b.length - a.length);
  const first = firstFit(falling, long, wide);
  if (first || falling.length > EXACT_UP_TO) return first;
  return everyWay(falling, long, wide);
}

/** Widest first, each into the first strip with room: the usual way at the bench. */
function firstFit(falling: readonly Rectangle[], long: number, wide: number): Laid[] | null {
  const rows: Row[] = [];
  let across = 0;
  for (const { id, length, width } of falling) {
    let row = rows.find(({ left }) => left >= length);
    if (!row) {
      if (across + width > wide) return null;
      row = { across, left: long, laid: [] };
      rows.push(row);
      across += width;
    }
    row.laid.push({ id, at: [long - row.left, row.across] });
    row.left -= length;
  }
  return inOrder(rows);
}

/** Widest first, each into every strip with room and into a new one, until one way holds all. */
function everyWay(falling: readonly Rectangle[], long: number, wide: number): Laid[] | null {
  let ways = 0;
  const rows: Row[] = [];
  const place = (i: number, across: number): boolean => {
    const piece = falling[i];
    if (!piece) return true;
    if (++ways > MOST_WAYS) return false;
    const tried = new Set<number>();
    for (const row of rows) {
      if (row.left < piece.length || tried.has(row.left)) continue;
      tried.add(row.left);
      row.laid.push({ id: piece.id, at: [long - row.left, row.across] });
      row.left -= piece.length;
      if (place(i + 1, across)) return true;
      row.left += piece.length;
      row.laid.pop();
    }
    if (across + piece.width > wide) return false;
    rows.push({ across, left: long - piece.length, laid: [{ id: piece.id, at: [0, across] }] });
    if (place(i + 1, across + piece.width)) return true;
    rows.pop();
    return false;
  };
  return place(0, 0) ? inOrder(rows) : null;
}

const inOrder = (rows: readonly Row[]): Laid[] => rows.flatMap(({ laid }) => laid);
