import type { TableMaterial } from '#client/lib/material-snapshot.ts';
import type { Part, Plan, Surface } from '#shared/core/plan.ts';
import { fitsPart } from '#shared/plan-start/fits.ts';
import { freshId, freshName } from '#shared/plan-start/names.ts';
import type { SetChoice, SetPart } from '#shared/plan-start/part-sets.ts';
import type { PartChoice } from '#shared/plan-start/new-part.ts';
import { WISHES } from '#shared/plan-start/wishes.ts';
import { preferred } from './materials.ts';
import { changeParts, inTurn, keepMaterial, type Recipe } from './plan-edits.ts';

/** What can be added to a surface, in the words of the trade and in the order in which a wing is built. */
export const PART_CHOICES: readonly { choice: PartChoice; label: string }[] = [
  { choice: 'ribs', label: 'Ribs' },
  { choice: 'spar', label: 'Spar' },
  { choice: 'stringer', label: 'Stringer' },
  { choice: 'leadingEdge', label: 'Leading edge' },
  { choice: 'trailingEdge', label: 'Trailing edge' },
  { choice: 'sheeting', label: 'Nose sheeting' },
  { choice: 'capStrips', label: 'Cap strips' },
  { choice: 'web', label: 'Shear web' },
  { choice: 'tipBlock', label: 'Tip block' },
  { choice: 'sheet', label: 'Sheet, a plate of the whole outline' },
  { choice: 'covering', label: 'Covering' },
  { choice: 'finish', label: 'Finish' },
  { choice: 'glue', label: 'Glue' },
];

/** Parts that go in together. */
export const SET_CHOICES: readonly { choice: SetChoice; label: string }[] = [
  { choice: 'ribSet', label: 'Ribs at every bay and break' },
  { choice: 'sparPair', label: 'Spars, top and bottom' },
  { choice: 'dBox', label: 'D-box: nose sheeting and shear web' },
  { choice: 'stringerPair', label: 'Stringers, top and bottom' },
  { choice: 'edges', label: 'Leading and trailing edge' },
  { choice: 'tip', label: 'Tip' },
];

interface Added {
  recipe: Recipe;
  /** lines of the new parts */
  lines: string[];
}

/** Adds new parts to a surface, under ids and names of their own, in the wood that a builder would reach for. */
export function withParts(
  plan: Plan,
  surface: Surface,
  index: number,
  added: readonly SetPart[],
  table: readonly TableMaterial[],
): Added {
  const parts: Part[] = [];
  const keeps: Recipe[] = [];
  for (const { choice, part: bare } of added) {
    const all = [...surface.parts, ...parts];
    const material = preferred(plan, table, fitsPart(bare), WISHES[choice]);
    if (material) keeps.push(keepMaterial(material.key, material.material));
    parts.push({
      ...bare,
      id: freshId(
        idOf(bare.name),
        all.map(({ id }) => id),
      ),
      name: freshName(
        bare.name,
        all.map(({ name }) => name),
      ),
      material: material?.key ?? '',
    });
  }
  return {
    recipe: inTurn(
      ...keeps,
      changeParts(index, (before) => [...before, ...parts]),
    ),
    lines: parts.map(({ id }) => `${surface.key}/${id}`),
  };
}

const idOf = (name: string) =>
  name
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '');
