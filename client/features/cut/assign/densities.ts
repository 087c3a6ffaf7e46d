import { grams, type AssignProblem, type Choice } from '#shared/core/cut/assign-account.ts';
import type { Plan, PlanMaterial } from '#shared/core/plan.ts';
import type { TrialWood } from '#shared/core/wood-groups.ts';
import type { AtHand } from './problem.ts';

/** What a weighing on the workshop scale and a rule leave in doubt of a density (common practice, no source). */
const WEIGHED_CV = 0.02;

/**
 * The wood of each line whose parts were found pieces: of the density that they come to together. A part that is
 * bought counts as it is drawn. Modulus and strength go with density, as both do of balsa about its mean.
 */
export function measuredWoods(
  plan: Plan,
  { parts, stock }: AssignProblem,
  choice: Choice,
  pieces: readonly AtHand[],
): Record<string, TrialWood> {
  const densityOf = new Map(stock.map(({ id, density }) => [id, density]));
  const numberOf = new Map(pieces.map(({ id, number }) => [id, number]));
  const lines = new Map<string, { mass: number; volume: number; numbers: Set<number>; material: string }>();
  for (const part of parts) {
    const piece = choice.get(part.id) ?? '';
    const density = densityOf.get(piece) ?? part.density;
    const line = lines.get(part.line) ?? { mass: 0, volume: 0, numbers: new Set(), material: part.material };
    line.mass += grams(part, density);
    line.volume += part.volume;
    const number = numberOf.get(piece);
    if (number !== undefined) line.numbers.add(number);
    lines.set(part.line, line);
  }
  return Object.fromEntries(
    [...lines].flatMap(([line, { mass, volume, numbers, material }]): [string, TrialWood][] => {
      const drawn = plan.materials[material];
      if (!drawn || numbers.size === 0 || !(volume > 0)) return [];
      const sorted = [...numbers].toSorted((a, b) => a - b);
      const density = (mass / volume) * 1e6;
      return [
        [line, { key: `rack-${sorted.join('-')}`.slice(0, 60), material: measured(drawn, density, sorted) }],
      ];
    }),
  );
}

function measured(drawn: PlanMaterial, density: number, numbers: readonly number[]): PlanMaterial {
  const scaled = (figure: number | undefined) =>
    figure === undefined || drawn.density === undefined ? undefined : (figure * density) / drawn.density;
  const [modulus, strength] = [scaled(drawn.modulus), scaled(drawn.strength)];
  const wood = drawn.name.replace(/^(?:No\. [\d, ]+, )+/, '');
  return {
    ...drawn,
    name: `No. ${numbers.join(', ')}, ${wood}`.slice(0, 120),
    density,
    cv: WEIGHED_CV,
    ...(modulus !== undefined && { modulus }),
    ...(strength !== undefined && { strength }),
    source: 'Weighed',
  };
}
