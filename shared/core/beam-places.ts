/** A round weight on a string with its label, in the units of the drawing; y = 0 is the bar, y grows downward. */
export interface HungLabel {
  key: string;
  x: number;
  /** of the weight */
  radius: number;
  /** size of the label */
  width: number;
  height: number;
}

/** Where a label stands, seen from its weight. */
export type LabelSide = 'right' | 'left' | 'below';

/** Where a weight and its label hang. */
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

/** A weight at one of the places that it may take. */
export interface Placed {
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
/** How many places each may take: every row with every side. */
export const CHOICES = ROWS * SIDES.length;

/**
 * How far a weight with its label may reach to either side of its string, the air around it included.
 * @example reach({ key: 'a', x: 100, radius: 10, width: 40, height: 12 }) // → 62
 */
export function reach({ radius, width }: HungLabel): number {
  return radius + BESIDE + width + GAP;
}

/**
 * Every place that a weight may take, `CHOICES` in all: row by row from the shallowest, in each the label to the
 * right, to the left and below.
 * @example candidates({ key: 'a', x: 100, radius: 10, width: 40, height: 12 })[0].place // → { key: 'a', string: 30, side: 'right', labelX: 117, labelY: 34, bottom: 50 }
 */
export function candidates(of: HungLabel): Placed[] {
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

/**
 * What a place costs by itself, in rows: its depth, its side, a label that leaves the drawing (0 to `width`) or
 * lies over an upright line (`posts`, each an x).
 * @example ownCost(candidates({ key: 'a', x: 100, radius: 10, width: 40, height: 12 })[4], 200, []) // → 1.4
 */
export function ownCost(mine: Placed, width: number, posts: readonly number[]): number {
  let cost = (mine.place.string - SHORTEST) / ROW + SIDES.indexOf(mine.place.side) * COST.side;
  if (mine.label.x0 < 0 || mine.label.x1 > width) cost += COST.outside;
  for (const post of posts) if (crosses(mine.label, post)) cost += COST.postOverLabel;
  return cost;
}

/**
 * What two cost, in rows, by standing in each other's way: weights and labels that overlap, strings over them. The
 * order of the two makes no difference.
 * @example between(...[100, 160].map((x) => candidates({ key: 'a', x, radius: 10, width: 40, height: 12 })[0])) // → 400
 */
export function between(a: Placed, b: Placed): number {
  let cost = stringCost(a, b) + stringCost(b, a);
  if (overlap(a.weight, b.weight)) cost += COST.overlap;
  if (overlap(a.weight, b.label)) cost += COST.overlap;
  if (overlap(a.label, b.weight)) cost += COST.overlap;
  if (overlap(a.label, b.label)) cost += COST.overlap;
  return cost;
}

/** What it costs that the string of one passes over the other. */
function stringCost(of: Placed, over: Placed): number {
  const { x } = of.of;
  const { string } = of.place;
  let cost = 0;
  if (string > over.label.y0 && crosses(over.label, x)) cost += COST.stringOverLabel;
  if (string > over.weight.y0 && crosses(over.weight, x)) cost += COST.stringOverWeight;
  return cost;
}

function overlap(a: Box, b: Box): boolean {
  return a.x0 < b.x1 + GAP && b.x0 < a.x1 + GAP && a.y0 < b.y1 + GAP && b.y0 < a.y1 + GAP;
}

function crosses(box: Box, x: number): boolean {
  return x > box.x0 - 3 && x < box.x1 + 3;
}
