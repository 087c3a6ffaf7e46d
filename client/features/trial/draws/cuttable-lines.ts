import type { Plan } from '#shared/core/plan.ts';

/** A line that is cut from a sheet, a stick or a block. */
export interface CuttableLine {
  id: string;
  name: string;
  /** name of the group of the list that it stands in: its surface, or the rest */
  of: string;
}

const CUT: readonly string[] = ['wood', 'sheet', 'composite', 'metal'];

/** Lines that may be cut from one weighed piece, in the order of the plan: no glue, covering or finish, no items. */
export function cuttableLines({ surfaces, solids, materials }: Plan): CuttableLine[] {
  const isCut = (material: string) => CUT.includes(materials[material]?.category ?? '');
  return [
    ...surfaces.flatMap(({ key, parts }) =>
      parts
        .filter(
          ({ kind, material }) =>
            kind !== 'glue' && kind !== 'covering' && kind !== 'finish' && isCut(material),
        )
        .map(({ id, name }) => ({ id: `${key}/${id}`, name, of: key })),
    ),
    ...solids
      .filter(({ material }) => isCut(material))
      .map(({ id, name, group }) => ({ id: `solid/${id}`, name, of: group })),
  ];
}
