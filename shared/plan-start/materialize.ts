import type { Part, Plan, PlanMaterial, Surface } from '#shared/core/plan.ts';
import { fitsPart, type Fits } from './fits.ts';
import { freshId, freshName } from './names.ts';
import type { NewPart, PartChoice } from './new-part.ts';
import type { SetPart } from './part-sets.ts';
import { WISHES, wished, type KeyedMaterial } from './wishes.ts';

/** Gathers a plan's materials while its parts are made; where nothing fits, what needs it is left out. */
export class Woodpile {
  readonly materials: Record<string, PlanMaterial> = {};
  readonly #offered: readonly KeyedMaterial[];

  constructor(offered: readonly KeyedMaterial[]) {
    this.#offered = offered;
  }

  /** Key of what fits best; null where nothing does. */
  take(fits: Fits, wishes: readonly string[]): string | null {
    const found = wished(this.#offered, fits, wishes);
    if (!found) return null;
    this.materials[found.key] = found.material;
    return found.key;
  }

  /** Puts parts into a surface one after the other, each seeing those before it. */
  build(
    surface: Surface,
    steps: readonly ((surface: Surface) => readonly SetPart[])[],
    mend: (part: NewPart, choice: PartChoice) => NewPart = (part) => part,
  ): Surface {
    let built = surface;
    for (const step of steps) {
      for (const { choice, part } of step(built)) {
        const made = this.#part(built, mend(part, choice), choice);
        if (made) built = { ...built, parts: [...built.parts, made] };
      }
    }
    return built;
  }

  #part(surface: Surface, bare: NewPart, choice: PartChoice): Part | null {
    const material = this.take(fitsPart(bare), WISHES[choice]);
    if (material === null) return null;
    const id = freshId(
      bare.name.toLowerCase().replace(/[^a-z0-9]+/g, '-'),
      surface.parts.map((part) => part.id),
    );
    const name = freshName(
      bare.name,
      surface.parts.map((part) => part.name),
    );
    return { ...bare, id, name, material };
  }
}

/** The parts of a plan with the materials that were taken for them. */
export type Built = Pick<Plan, 'surfaces' | 'solids' | 'items'>;
