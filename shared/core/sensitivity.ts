import { weigh } from './linear-model-weigh.ts';
import type { FoldedPlan } from './linear-model.ts';

/** What one gram more on a line does. */
export interface GramEffect {
  /** id of the estimate's line */
  id: string;
  name: string;
  /** key of its surface, null of items and solids */
  surface: string | null;
  /** as it is, g */
  mass: number;
  /** mm of balance for each gram more on it; positive aft */
  shift: number;
  /** g of ballast for each gram more; negative where it saves some; null where the arm lies on the wanted point */
  ballast: number | null;
  /** g all up for each gram more: itself and its ballast */
  allUp: number | null;
}

/** What a denser material does. */
export interface DensityEffect {
  /** key in the plan's materials */
  material: string;
  /** as it is, g, with the glue that is a share of it */
  mass: number;
  /** g */
  heavier: number;
  /** mm of balance; positive aft */
  shift: number;
  ballast: number | null;
  /** g all up: heavier and its ballast */
  allUp: number | null;
}

/** Where ballast goes and what it trims to, both mm aft of the datum. */
interface Trim {
  arm: number;
  wanted: number;
}

/** Ballast for a mass more at x, from m = (Σmx − Mx₁)/(x₁ − b): exact, for it is linear in the mass. */
function ballastOf(mass: number, moment: number, { arm, wanted }: Trim): number | null {
  return arm === wanted ? null : (moment - mass * wanted) / (wanted - arm);
}

const size = ({ allUp, shift }: { allUp: number | null; shift: number }) => [
  Math.abs(allUp ?? 0),
  Math.abs(shift),
];
const largestFirst = (a: Parameters<typeof size>[0], b: Parameters<typeof size>[0]) => {
  const [[massA = 0, shiftA = 0], [massB = 0, shiftB = 0]] = [size(a), size(b)];
  return massB - massA || shiftB - shiftA;
};

/**
 * What one gram more on each line costs, dearest first: balance by ∂x/∂mᵢ = (xᵢ − x)/M, and the ballast that then
 * trims it. Lines without a mass are left out; none where nothing has one.
 * @example perGram(foldPlan(EXAMPLE_PLAN), { arm: -20, wanted: 40 }).map(({ name, ballast }) => [name, ballast?.toFixed(3)])[0] // → ['Boom', '2.667']
 */
export function perGram(fold: FoldedPlan, trim: Trim): GramEffect[] {
  const { masses, mass, at, moments } = weigh(fold);
  if (!at) return [];
  return fold.lines
    .flatMap(({ id, name, surface }, i): GramEffect[] => {
      const own = masses[i] ?? 0;
      if (own <= 0) return [];
      const x = (moments[i]?.[0] ?? 0) / own;
      const ballast = ballastOf(1, x, trim);
      const allUp = ballast === null ? null : 1 + ballast;
      return [{ id, name, surface, mass: own, shift: (x - at[0]) / mass, ballast, allUp }];
    })
    .sort(largestFirst);
}

/**
 * What each material costs when it is denser by a share, 0.1 by default, dearest first; what has no material is left
 * out. The shift is exact, not only to first order; ballast that is negative comes off.
 * @example perDensity(foldPlan(EXAMPLE_PLAN), { arm: -20, wanted: 40 }).map(({ material, heavier }) => [material, heavier.toFixed(4)]) // → [['balsa', '0.9256']]
 */
export function perDensity(fold: FoldedPlan, trim: Trim, by = 0.1): DensityEffect[] {
  const before = weigh(fold);
  const keys = new Set(
    fold.lines.flatMap(({ material, by: madeOf }) => (material && madeOf !== 'share' ? [material] : [])),
  );
  const x = before.at?.[0];
  if (x === undefined) return [];
  return [...keys]
    .map((material): DensityEffect => {
      const figures = fold.lines.map(
        (line) => line.figure * (line.material === material && line.by !== 'share' ? 1 + by : 1),
      );
      const after = weigh(fold, figures);
      const heavier = after.mass - before.mass;
      const moment = after.mass * (after.at?.[0] ?? 0) - before.mass * x;
      const ballast = ballastOf(heavier, moment, trim);
      return {
        material,
        mass: heavier / by,
        heavier,
        shift: (after.at?.[0] ?? x) - x,
        ballast,
        allUp: ballast === null ? null : heavier + ballast,
      };
    })
    .filter(({ mass }) => mass > 0)
    .sort(largestFirst);
}
