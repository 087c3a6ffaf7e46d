/** A stick that has to be cut, mm along the grain. */
export interface StickWanted {
  id: string;
  length: number;
}

/** Sticks at hand of one length. */
export interface StickStock {
  id: string;
  length: number;
  count: number;
}

export interface PackingTerms {
  atHand: readonly StickStock[];
  /** length that a shop sells; null where nothing is to be bought */
  bought: number | null;
  /** what a saw cut takes away */
  kerf: number;
  /** what is shorter is waste */
  shortestOffcut: number;
}

/** One stick of stock with what is cut from it, one after the other from its end. */
export interface CutStick {
  /** id of the stock at hand; null for one that is bought */
  stock: string | null;
  length: number;
  cuts: { id: string; from: number; to: number }[];
  /** what is left and long enough to keep; 0 where it is waste */
  offcut: number;
}

export interface StickPacking {
  sticks: CutStick[];
  /** how many have to be bought, and how few it could be at best */
  bought: number;
  bound: number;
  /** what is longer than any stick, and by how much; it has to be spliced */
  tooLong: { id: string; by: number }[];
  /** what finds no place where nothing may be bought */
  unplaced: string[];
}

interface Bin {
  stock: string | null;
  length: number;
  left: number;
  cuts: StickWanted[];
}

/** Sticks that are tried in every way; beyond, first fit in falling order stands, with the bound told. */
const EXACT_UP_TO = 14;
/** Ways tried at most; a stick more takes tens of times as many. */
const MOST_WAYS = 200_000;
const SAME = 1e-9;

/**
 * Packs sticks on stock, what is at hand first, so that the fewest have to be bought: first fit in falling order, and
 * for few sticks every other way that could do with less (branch and bound). Each cut takes its kerf; the last one of
 * a stick that comes out even does not. `bound` is what the lengths alone ask for, so that `bought − bound` is how
 * much better it could be at most.
 * @example packSticks([{ id: 'a', length: 600 }, { id: 'b', length: 390 }], { atHand: [], bought: 1000, kerf: 1, shortestOffcut: 50 }).bought // → 1
 */
export function packSticks(wanted: readonly StickWanted[], terms: PackingTerms): StickPacking {
  const longest = Math.max(0, terms.bought ?? 0, ...terms.atHand.map(({ length }) => length));
  const fits = wanted.filter(({ length }) => length <= longest + SAME).sort((a, b) => b.length - a.length);
  const tooLong = wanted
    .filter(({ length }) => length > longest + SAME)
    .map(({ id, length }) => ({ id, by: length - longest }));
  const bound = boundOf(fits, terms);
  const first = firstFit(fits, terms);
  const best =
    isBetter(first, bound) && fits.length <= EXACT_UP_TO ? everyWay(fits, terms, first, bound) : first;
  return {
    sticks: best.bins.filter(({ cuts }) => cuts.length > 0).map((bin) => laid(bin, terms)),
    bought: boughtIn(best.bins),
    bound,
    tooLong,
    unplaced: best.unplaced,
  };
}

interface Packed {
  bins: Bin[];
  unplaced: string[];
}

const boughtIn = (bins: readonly Bin[]) =>
  bins.filter(({ stock, cuts }) => stock === null && cuts.length > 0).length;
const isBetter = ({ bins, unplaced }: Packed, bound: number) => unplaced.length > 0 || boughtIn(bins) > bound;

function boundOf(fits: readonly StickWanted[], { atHand, bought, kerf }: PackingTerms): number {
  if (bought === null) return 0;
  const asked = fits.reduce((sum, { length }) => sum + length + kerf, 0);
  const had = atHand.reduce((sum, { length, count }) => sum + count * (length + kerf), 0);
  const byLength = Math.ceil((asked - had) / (bought + kerf) - SAME);
  // What is too long for everything at hand needs a bought stick, and more than half of one needs one alone.
  const most = Math.max(0, ...atHand.map(({ length }) => length));
  const alone = fits.filter(({ length }) => length > most + SAME && 2 * length + kerf > bought + SAME).length;
  return Math.max(0, byLength, alone);
}

const binsAtHand = ({ atHand, kerf }: PackingTerms): Bin[] =>
  atHand
    .flatMap(({ id, length, count }) =>
      Array.from({ length: count }, () => ({ stock: id, length, left: length + kerf, cuts: [] })),
    )
    .sort((a, b) => a.length - b.length);

function firstFit(fits: readonly StickWanted[], terms: PackingTerms): Packed {
  const { bought, kerf } = terms;
  const bins = binsAtHand(terms);
  const unplaced: string[] = [];
  for (const stick of fits) {
    const need = stick.length + kerf;
    let bin = bins.find(({ left }) => left >= need - SAME);
    if (!bin && bought !== null && stick.length <= bought + SAME) {
      bin = { stock: null, length: bought, left: bought + kerf, cuts: [] };
      bins.push(bin);
    }
    if (!bin) unplaced.push(stick.id);
    else {
      bin.cuts.push(stick);
      bin.left -= need;
    }
  }
  return { bins, unplaced };
}

/** Tries every placing that could come out better than the best known; gives up after so many ways. */
function everyWay(fits: readonly StickWanted[], terms: PackingTerms, known: Packed, bound: number): Packed {
  const { bought, kerf } = terms;
  const bins = binsAtHand(terms);
  let best = known;
  let ways = 0;
  const cost = ({ bins: of, unplaced }: Packed) => unplaced.length * 1e6 + boughtIn(of);
  const place = (at: number, unplaced: string[]): void => {
    if (cost({ bins, unplaced }) >= cost(best) || ways++ > MOST_WAYS) return;
    const stick = fits[at];
    if (!stick) {
      best = { bins: bins.map((bin) => ({ ...bin, cuts: [...bin.cuts] })), unplaced: [...unplaced] };
      return;
    }
    const need = stick.length + kerf;
    const tried = new Set<string>();
    for (const bin of bins) {
      const alike = `${bin.left.toFixed(6)} ${bin.stock === null}`;
      if (bin.left < need - SAME || tried.has(alike)) continue;
      tried.add(alike);
      bin.cuts.push(stick);
      bin.left -= need;
      place(at + 1, unplaced);
      bin.left += need;
      bin.cuts.pop();
      if (cost(best) <= bound) return;
    }
    if (bought !== null && stick.length <= bought + SAME) {
      bins.push({ stock: null, length: bought, left: bought + kerf - need, cuts: [stick] });
      place(at + 1, unplaced);
      bins.pop();
    } else if (tried.size === 0) place(at + 1, [...unplaced, stick.id]);
  };
  place(0, []);
  return best;
}

function laid({ stock, length, cuts }: Bin, { kerf, shortestOffcut }: PackingTerms): CutStick {
  let at = 0;
  const places = cuts.map(({ id, length: of }) => {
    const from = at;
    at = from + of + kerf;
    return { id, from, to: from + of };
  });
  const left = Math.max(0, length - at);
  return { stock, length, cuts: places, offcut: left >= shortestOffcut ? left : 0 };
}
