/** A round weight on a string with its label, in the units of the drawing; y = 0 is the bar, y grows downward. */
export interface HungLabel {
  key: string;
  x: number;
  radius: number;
  /** size of the label */
  width: number;
  height: number;
}

export type LabelSide = 'right' | 'left' | 'below';

export interface HungPlace {
  key: string;
  /** from the bar to the top of the weight */
  string: number;
  side: LabelSide;
  /** upper left corner of the label */
  labelX: number;
  labelY: number;
  /** lowest point of weight and label */
  bottom: number;
}

interface Box {
  x0: number;
  x1: number;
  y0: number;
  y1: number;
}

interface Placed {
  of: HungLabel;
  place: HungPlace;
  weight: Box;
  label: Box;
}

/** Shortest string, and how much longer each deeper row is. */
const SHORTEST = 30;
const ROW = 15;
const ROWS = 16;
/** Air between two things. */
const GAP = 5;
const BESIDE = 7;
const SIDES: readonly LabelSide[] = ['right', 'left', 'below'];
/** What a fault of a place costs, in rows. Overlaps cost more than any depth. */
const COST = {
  overlap: 400,
  outside: 400,
  stringOverLabel: 60,
  stringOverWeight: 24,
  postOverLabel: 30,
  side: 0.4,
};
const PASSES = 4;

/**
 * Depth and side of the label for weights hung from one bar, so that no weight or label covers another and, where
 * it can be helped, no string crosses one. Deeper rows are used only where the shallow ones are taken. `posts` are
 * upright lines through the drawing that labels keep clear of. Same input, same answer.
 */
export function layHung(
  hung: readonly HungLabel[],
  width: number,
  posts: readonly number[] = [],
): HungPlace[] {
  const placed: Placed[] = [];
  hung.forEach((of, i) => {
    placed[i] = best(of, placed.slice(0, i), { width, posts });
  });
  for (let pass = 0; pass < PASSES; pass++) {
    const one = moveOne(placed, { width, posts });
    const two = moveTwo(placed, { width, posts });
    if (!one && !two) break;
  }
  return placed.map(({ place }) => place);
}

interface Ground {
  width: number;
  posts: readonly number[];
}

/** Gives each its best place among the others as they are; true where that changed one. */
function moveOne(placed: Placed[], ground: Ground): boolean {
  let moved = false;
  placed.forEach((before, i) => {
    const others = placed.filter((_, j) => j !== i);
    const next = best(before.of, others, ground);
    if (costOf(next, others, ground) >= costOf(before, others, ground)) return;
    placed[i] = next;
    moved = true;
  });
  return moved;
}

/** Two that stand in each other's way may both have to move; true where that helped. */
function moveTwo(placed: Placed[], ground: Ground): boolean {
  let moved = false;
  placed.forEach((_, i) => {
    placed.forEach((__, j) => {
      const [a, b] = [placed[i], placed[j]];
      if (!a || !b || i === j || between(a, b) === 0) return;
      const others = placed.filter((___, k) => k !== i && k !== j);
      let least = costOf(a, others, ground) + costOf(b, others, ground) + between(a, b);
      for (const next of candidates(a.of)) {
        const alone = costOf(next, others, ground);
        if (alone >= least) continue;
        const other = best(b.of, [...others, next], ground);
        const cost = alone + costOf(other, others, ground) + between(next, other);
        if (cost >= least - 1e-9) continue;
        least = cost;
        [placed[i], placed[j]] = [next, other];
        moved = true;
      }
    });
  });
  return moved;
}

function best(of: HungLabel, others: readonly Placed[], ground: Ground): Placed {
  let found = placeAt(of, 0, 'right');
  let least = costOf(found, others, ground);
  for (const candidate of candidates(of)) {
    const cost = costOf(candidate, others, ground);
    if (cost < least) [found, least] = [candidate, cost];
  }
  return found;
}

function candidates(of: HungLabel): Placed[] {
  return Array.from({ length: ROWS }, (_, row) => SIDES.map((side) => placeAt(of, row, side))).flat();
}

function placeAt(of: HungLabel, row: number, side: LabelSide): Placed {
  const { key, x, radius, width, height } = of;
  const string = SHORTEST + row * ROW;
  const middle = string + radius;
  const labelX =
    side === 'right' ? x + radius + BESIDE : side === 'left' ? x - radius - BESIDE - width : x - width / 2;
  const labelY = side === 'below' ? middle + radius + 3 : middle - height / 2;
  const weight = { x0: x - radius, x1: x + radius, y0: string, y1: string + 2 * radius };
  const label = { x0: labelX, x1: labelX + width, y0: labelY, y1: labelY + height };
  return {
    of,
    place: { key, string, side, labelX, labelY, bottom: Math.max(weight.y1, label.y1) },
    weight,
    label,
  };
}

function costOf(mine: Placed, others: readonly Placed[], { width, posts }: Ground): number {
  let cost = (mine.place.string - SHORTEST) / ROW + SIDES.indexOf(mine.place.side) * COST.side;
  if (mine.label.x0 < 0 || mine.label.x1 > width) cost += COST.outside;
  for (const post of posts) if (crosses(mine.label, post)) cost += COST.postOverLabel;
  for (const other of others) cost += between(mine, other);
  return cost;
}

/** What two cost by standing in each other's way. */
function between(a: Placed, b: Placed): number {
  let cost = stringCost(a, b) + stringCost(b, a);
  for (const mine of [a.weight, a.label]) {
    for (const other of [b.weight, b.label]) if (overlap(mine, other)) cost += COST.overlap;
  }
  return cost;
}

/** What it costs that the string of one passes over the other. */
function stringCost(of: Placed, over: Placed): number {
  const reaches = (box: Box) => of.place.string > box.y0 && crosses(box, of.of.x);
  return (
    (reaches(over.label) ? COST.stringOverLabel : 0) + (reaches(over.weight) ? COST.stringOverWeight : 0)
  );
}

function overlap(a: Box, b: Box): boolean {
  return a.x0 < b.x1 + GAP && b.x0 < a.x1 + GAP && a.y0 < b.y1 + GAP && b.y0 < a.y1 + GAP;
}

function crosses(box: Box, x: number): boolean {
  return x > box.x0 - 3 && x < box.x1 + 3;
}
