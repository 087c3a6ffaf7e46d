import { balanceAfter } from '../ballast.ts';

/** A piece of lead, or a lump of putty that can be cut to any size up to `mass`. g */
export interface BallastPiece {
  id: string;
  mass: number;
  divisible?: boolean;
}

/** What ballast is to do. Masses g, places mm aft of the datum. */
export interface BallastWish {
  /** the model before it */
  mass: number;
  x: number;
  /** where it is put */
  at: number;
  /** where the model is to balance; `aim` lies between */
  range: { from: number; to: number; aim: number };
  /** class window of the mass with ballast; null on a side without a limit */
  least: number | null;
  most: number | null;
  /** what the room for ballast holds; null where it does not matter */
  room: number | null;
}

/** The pieces to put in. */
export interface BallastChoice {
  /** piece and how much of it, g */
  pieces: { id: string; mass: number }[];
  /** g, in all */
  ballast: number;
  /** model with ballast: g, and mm aft of the datum */
  mass: number;
  x: number;
  /** still short of the class's least mass, g: it belongs at the balance point, where it moves nothing */
  missing: number;
}

/** Why no pieces do it. */
export type BallastChoiceRefusal =
  /** the place lies on the wrong side, or too near to the balance point, for any mass */
  | { refused: 'wrong_place' }
  /** the pieces together are too light; g still missing */
  | { refused: 'too_little'; missing: number }
  /** the room holds less than is needed; g over */
  | { refused: 'no_room'; over: number }
  /** the class mass is passed; g over */
  | { refused: 'too_heavy'; over: number }
  /** pieces add up only to less or more than the range allows; the nearest masses below and above, g */
  | { refused: 'no_sum'; below: number; above: number | null };

/** More pieces than this are not tried together; what is left out are the lightest. */
const MOST_PIECES = 18;

/**
 * Which pieces bring the balance into its range: of all sets that do, the one that comes nearest to the aim, and of
 * several equally near the lightest. Every set is tried; a divisible piece fills up
 * to the aim. First what balances, then what the class still asks for, as far as the range allows it here.
 * @example chooseBallast([{ id: 'a', mass: 4 }, { id: 'b', mass: 6 }], { mass: 120, x: 82, at: -60, range: { from: 74, to: 76, aim: 75 }, least: null, most: null, room: null }).pieces // → [{ id: 'b', mass: 6 }]
 */
export function chooseBallast(
  pieces: readonly BallastPiece[],
  wish: BallastWish,
): BallastChoice | BallastChoiceRefusal {
  const window = massWindow(wish);
  if ('refused' in window) return window;
  const { least, most, best } = window;
  const solid = pieces
    .filter(({ divisible }) => !divisible)
    .sort((a, b) => b.mass - a.mass)
    .slice(0, MOST_PIECES);
  const putty = pieces.filter(({ divisible }) => divisible);
  const soft = putty.reduce((sum, { mass }) => sum + mass, 0);
  const all = solid.reduce((sum, { mass }) => sum + mass, soft);
  if (all < least - EXACT) return { refused: 'too_little', missing: least - all };
  let found: { set: number; fill: number; miss: number; ballast: number } | null = null;
  let [below, above] = [0, Number.POSITIVE_INFINITY];
  for (let set = 0; set < 2 ** solid.length; set++) {
    const sum = solid.reduce((total, { mass }, i) => ((set >> i) & 1 ? total + mass : total), 0);
    const fill = Math.max(0, Math.min(soft, best - sum));
    const ballast = sum + fill;
    if (ballast < least - EXACT) below = Math.max(below, ballast);
    else if (ballast > most + EXACT) above = Math.min(above, ballast);
    else {
      const miss = Math.abs(ballast - best);
      const nearer = !found || miss < found.miss - EXACT;
      const lighter = found && miss <= found.miss + EXACT && ballast < found.ballast - EXACT;
      if (nearer || lighter) found = { set, fill, miss, ballast };
    }
  }
  if (!found) return { refused: 'no_sum', below, above: Number.isFinite(above) ? above : null };
  const { set, fill } = found;
  const taken = solid.filter((_, i) => (set >> i) & 1).map(({ id, mass }) => ({ id, mass }));
  const filled = spread(putty, fill);
  const ballast = [...taken, ...filled].reduce((sum, { mass }) => sum + mass, 0);
  const mass = wish.mass + ballast;
  const x = balanceAfter(wish.mass, wish.x, ballast, wish.at);
  const missing = Math.max(0, (wish.least ?? 0) - mass);
  return { pieces: [...taken, ...filled], ballast, mass, x, missing: missing > EXACT ? missing : 0 };
}

/** Grams that are nothing beside any scale. */
const EXACT = 1e-9;

function spread(putty: readonly BallastPiece[], fill: number): { id: string; mass: number }[] {
  let left = fill;
  return putty.flatMap(({ id, mass }) => {
    const taken = Math.min(mass, left);
    left -= taken;
    return taken > EXACT ? [{ id, mass: taken }] : [];
  });
}

/** How much ballast is allowed and which is best, g. */
function massWindow(wish: BallastWish): { least: number; most: number; best: number } | BallastChoiceRefusal {
  const { mass, x, at, range } = wish;
  /** ballast that balances at a place, g; negative where weight would have to come off */
  const needed = (to: number) => (to === at ? Number.POSITIVE_INFINITY : (mass * (x - to)) / (to - at));
  const inside = x >= range.from && x <= range.to;
  if (!inside && (at - x) * ((x < range.from ? range.from : range.to) - x) <= 0) {
    return { refused: 'wrong_place' };
  }
  // Towards the place: the near edge is reached first, the far edge bounds what may be put in.
  const towards = at < x ? [range.to, range.from] : [range.from, range.to];
  const [near = x, far = x] = towards;
  const reachable = (to: number) => (at < x ? at < to : at > to);
  if (!inside && !reachable(near)) return { refused: 'wrong_place' };
  const toNear = inside ? 0 : needed(near);
  const toFar = reachable(far) && at !== x ? needed(far) : Number.POSITIVE_INFINITY;
  const least = Math.max(0, toNear);
  if (wish.room !== null && least > wish.room + EXACT) return { refused: 'no_room', over: least - wish.room };
  const cap = wish.most === null ? Number.POSITIVE_INFINITY : wish.most - mass;
  if (least > cap + EXACT) return { refused: 'too_heavy', over: least - cap };
  const most = Math.min(toFar, wish.room ?? Number.POSITIVE_INFINITY, cap);
  const aimed = reachable(range.aim) && at !== x ? needed(range.aim) : 0;
  // What the class asks for is put here as far as the range allows.
  const wanted = Math.max(0, aimed, (wish.least ?? 0) - mass);
  return { least, most, best: Math.max(least, Math.min(most, wanted)) };
}
