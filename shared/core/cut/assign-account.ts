import type { CutPart } from './cut-parts.ts';
import { laySheet, type Laid } from './lay-sheet.ts';
import { misfit, type CutStock, type Misfit } from './stock-fit.ts';

export type AssignAim = 'lightest' | 'matched' | 'strongest';

export interface AssignTerms {
  aim: AssignAim;
  /** mm */
  kerf: number;
  /** port against starboard: g, and g·mm about the middle; null where it does not matter */
  massTolerance: number | null;
  momentTolerance: number | null;
}

export interface AssignProblem {
  parts: readonly CutPart[];
  stock: readonly CutStock[];
  terms: AssignTerms;
  /** put there by hand: part to piece */
  fixed: Choice;
}

/** From which piece each part is cut; null, or not named, for what is to be bought. */
export type Choice = ReadonlyMap<string, string | null>;

/** What the two halves of a surface come to, of the wood that was chosen. g and g·mm. */
export interface HalvesAccount {
  surface: string;
  port: { mass: number; moment: number };
  starboard: { mass: number; moment: number };
  /** beyond the tolerance; 0 within */
  massOver: number;
  momentOver: number;
  /** mean arm of its parts, mm: makes a moment a mass to compare */
  arm: number;
}

export type AssignFault =
  | { code: 'misfit'; part: string; stock: string; miss: Misfit }
  | { code: 'crowded'; stock: string; parts: string[] };

export interface AssignAccount {
  /** of all parts, g */
  mass: number;
  bought: string[];
  halves: HalvesAccount[];
  /** of the lightest spar piece, kg/m³; null without spars */
  leastSpar: number | null;
  faults: AssignFault[];
  /** where parts lie on the pieces that hold theirs, by piece; of sticks one after the other */
  laid: Map<string, Laid[]>;
  /** what the search makes least */
  score: number;
}

/** One gram over a tolerance weighs as much as this of wood, g; a part without a piece as ten of those. */
export const OVER_WEIGHT = 1000;
export const BUY_WEIGHT = 10_000;
/** Of two answers that match as well the lighter one is better, of two as strong likewise. */
export const MATCHED_MASS_WEIGHT = 0.01;

/**
 * What a choice comes to, and what is wrong with it: it need not be a good one, nor one that can be cut.
 * @example accountOf(EXAMPLE_ASSIGNMENT, new Map([['rib port', '1'], ['rib starboard', '1']])).mass // → 0.4
 */
export function accountOf(problem: AssignProblem, choice: Choice): AssignAccount {
  const { parts, stock, terms } = problem;
  const stockOf = new Map(stock.map((piece) => [piece.id, piece]));
  const held = new Map<string, CutPart[]>();
  const faults: AssignFault[] = [];
  const bought: string[] = [];
  let [mass, leastSpar] = [0, Number.POSITIVE_INFINITY];
  const densities = new Map<string, number>();
  for (const part of parts) {
    const piece = stockOf.get(choice.get(part.id) ?? '');
    const density = piece?.density ?? part.density;
    densities.set(part.id, density);
    mass += grams(part, density);
    if (part.isSpar) leastSpar = Math.min(leastSpar, density);
    if (!piece) {
      bought.push(part.id);
      continue;
    }
    const miss = misfit(part, piece);
    if (miss) faults.push({ code: 'misfit', part: part.id, stock: piece.id, miss });
    held.set(piece.id, [...(held.get(piece.id) ?? []), part]);
  }
  const laid = new Map<string, Laid[]>();
  for (const [id, own] of held) {
    const piece = stockOf.get(id);
    const places = piece && layOn(piece, own, terms.kerf);
    if (places) laid.set(id, places);
    else faults.push({ code: 'crowded', stock: id, parts: own.map((part) => part.id) });
  }
  const halves = halvesOf(parts, densities, terms);
  const account = {
    mass,
    bought,
    halves,
    leastSpar: Number.isFinite(leastSpar) ? leastSpar : null,
    faults,
    laid,
  };
  return { ...account, score: scoreOf(account, terms.aim) };
}

/**
 * What a part weighs of a density in kg/m³, g.
 * @example grams({ volume: 2000 }, 100) // → 0.2
 */
export const grams = ({ volume }: Pick<CutPart, 'volume'>, density: number): number =>
  volume * density * 1e-6;

/**
 * Parts laid on a sheet by strips, or on a stick one after the other; null where they find no room.
 * @example layOn(EXAMPLE_ASSIGNMENT.stock[0], EXAMPLE_ASSIGNMENT.parts, 1) // → [{ id: 'rib port', at: [0, 0] }, { id: 'rib starboard', at: [101, 0] }]
 */
export function layOn(piece: CutStock, parts: readonly CutPart[], kerf: number): Laid[] | null {
  if (piece.form === 'sheet') return laySheet(parts, piece, kerf);
  return laySheet(
    parts.map(({ id, length }) => ({ id, length, width: 1 })),
    { length: piece.length, width: 1 },
    kerf,
  );
}

/**
 * Surfaces of which both halves are cut here.
 * @example matchedSurfaces(EXAMPLE_ASSIGNMENT.parts) // → ['wing']
 */
export function matchedSurfaces(parts: readonly CutPart[]): string[] {
  const on = (side: CutPart['side']) =>
    new Set(parts.flatMap((part) => (part.side === side && part.surface !== null ? [part.surface] : [])));
  const starboard = on('starboard');
  return [...on('port')].filter((surface) => starboard.has(surface));
}

/**
 * Mean arm of a surface's parts by volume, mm; never 0.
 * @example meanArm(EXAMPLE_ASSIGNMENT.parts, 'wing') // → 100
 */
export function meanArm(parts: readonly CutPart[], surface: string): number {
  let [volume, moment] = [0, 0];
  for (const part of parts) {
    if (part.surface !== surface) continue;
    volume += part.volume;
    moment += part.volume * part.y;
  }
  return volume > 0 && moment > 0 ? moment / volume : 1;
}

function halvesOf(
  parts: readonly CutPart[],
  densities: ReadonlyMap<string, number>,
  { massTolerance, momentTolerance }: AssignTerms,
): HalvesAccount[] {
  return matchedSurfaces(parts).map((surface) => {
    const half = (side: CutPart['side']) => {
      const sum = { mass: 0, moment: 0 };
      for (const part of parts) {
        if (part.surface !== surface || part.side !== side) continue;
        const mass = grams(part, densities.get(part.id) ?? 0);
        sum.mass += mass;
        sum.moment += mass * part.y;
      }
      return sum;
    };
    const [port, starboard] = [half('port'), half('starboard')];
    const over = (difference: number, tolerance: number | null) =>
      tolerance === null ? 0 : Math.max(0, Math.abs(difference) - tolerance);
    return {
      surface,
      port,
      starboard,
      massOver: over(port.mass - starboard.mass, massTolerance),
      momentOver: over(port.moment - starboard.moment, momentTolerance),
      arm: meanArm(parts, surface),
    };
  });
}

function scoreOf({ mass, bought, halves, leastSpar }: Omit<AssignAccount, 'score'>, aim: AssignAim): number {
  let score = BUY_WEIGHT * bought.length;
  for (const { massOver, momentOver, arm } of halves) score += OVER_WEIGHT * (massOver + momentOver / arm);
  if (aim === 'lightest') return score + mass;
  if (aim === 'strongest') return score + mass - (leastSpar ?? 0);
  const apart = halves.reduce(
    (sum, { port, starboard, arm }) =>
      sum + Math.abs(port.mass - starboard.mass) + Math.abs(port.moment - starboard.moment) / arm,
    0,
  );
  return score + apart + MATCHED_MASS_WEIGHT * mass;
}
