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
const PASSES = 6;

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
    placed[i] = best(of, placed.slice(0, i), width, posts);
  });
  for (let pass = 0; pass < PASSES; pass++) {
    let moved = false;
    hung.forEach((of, i) => {
      const others = placed.filter((_, j) => j !== i);
      const next = best(of, others, width, posts);
      const before = placed[i];
      if (before && next.place.string === before.place.string && next.place.side === before.place.side)
        return;
      if (before && costOf(next, others, width, posts) >= costOf(before, others, width, posts)) return;
      placed[i] = next;
      moved = true;
    });
    if (!moved) break;
  }
  return placed.map(({ place }) => place);
}

function best(of: HungLabel, others: readonly Placed[], width: number, posts: readonly number[]): Placed {
  let found = placeAt(of, 0, 'right');
  let least = costOf(found, others, width, posts);
  for (let row = 0; row < ROWS; row++) {
    for (const side of SIDES) {
      const candidate = placeAt(of, row, side);
      const cost = costOf(candidate, others, width, posts);
      if (cost < least) [found, least] = [candidate, cost];
    }
  }
  return found;
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

function costOf(mine: Placed, others: readonly Placed[], width: number, posts: readonly number[]): number {
  let cost = (mine.place.string - SHORTEST) / ROW + SIDES.indexOf(mine.place.side) * COST.side;
  if (mine.label.x0 < 0 || mine.label.x1 > width) cost += COST.outside;
  for (const post of posts) if (crosses(mine.label, post)) cost += COST.postOverLabel;
  for (const other of others) {
    for (const a of [mine.weight, mine.label]) {
      for (const b of [other.weight, other.label]) if (overlap(a, b)) cost += COST.overlap;
    }
    cost += stringCost(mine, other) + stringCost(other, mine);
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
