import { estimate } from '../estimate.ts';
import type { Vec3 } from '../frame.ts';
import { mirrorSide, type Half } from './half-plan.ts';
import type { Plan } from '../plan.ts';
import type { Line } from '../result.ts';

/** Which half of the model something hangs on; `middle` is all that is not half of a mirrored surface. */
export type BuiltSide = 'port' | 'starboard' | 'middle';

/** A line of the estimate as far as one half of the model carries it: the smallest thing that is weighed. */
export interface SidedLine {
  /** id of the estimate's line, `wing/ribs` */
  line: string;
  side: BuiltSide;
  name: string;
  group: string;
  surface: string | null;
  /** key of the material, null for items */
  material: string | null;
  /** g */
  mass: number;
  /** standard uncertainty of the mass, g */
  u: number;
  /** centre of mass, mm */
  at: Vec3;
}

/**
 * The lines of an estimate taken apart into port, starboard and middle, in the order of the lines. All of them
 * together weigh what the estimate weighs.
 * @throws RangeError when a part or solid names a material that the plan does not hold
 * @example sidedLines(EXAMPLE_PLAN).map(({ line, side, mass }) => [line, side, mass]).slice(0, 2) // → [['wing/ribs', 'port', 1.128], ['wing/ribs', 'starboard', 1.128]]
 */
export function sidedLines(plan: Plan): SidedLine[] {
  const port = halfLines(plan, 'port');
  const starboard = halfLines(plan, 'starboard');
  const mirrored = new Set(plan.surfaces.filter((s) => s.mirrored).map(({ key }) => key));
  return estimate(plan).lines.flatMap((line): SidedLine[] => {
    if (line.surface === null || !mirrored.has(line.surface)) return [sided(line, 'middle')];
    const [left, right] = [port.get(line.id), starboard.get(line.id)];
    return [
      ...(left ? [sided({ ...left, at: [left.at[0], -left.at[1], left.at[2]] }, 'port')] : []),
      ...(right ? [sided(right, 'starboard')] : []),
    ];
  });
}

/** Lines of the mirrored surfaces with one half standing, as its starboard half. */
function halfLines(plan: Plan, half: Half): Map<string, Line> {
  const surfaces = plan.surfaces.filter(({ mirrored }) => mirrored).map((s) => mirrorSide(s, half));
  const { lines } = estimate({ ...plan, surfaces, items: [], solids: [] });
  return new Map(lines.map((line) => [line.id, line]));
}

function sided({ id, name, group, surface, material, mass, u, at }: Line, side: BuiltSide): SidedLine {
  return { line: id, side, name, group, surface, material, mass, u, at };
}
