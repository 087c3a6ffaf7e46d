import type { Transaction } from 'sequelize';
import type { MaterialUsesDto } from '#shared/schemas/material.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { GliderMaterial } from '#server/models/glider-material.ts';

/** In how many gliders each of the materials is used. */
export async function countUses(materialIds: string[]): Promise<Map<string, number>> {
  const counts = await GliderMaterial.count({ where: { materialId: materialIds }, group: ['materialId'] });
  return new Map(counts.map((row) => [String(row['materialId']), row.count]));
}

/** Where a material is used: by name where the asker has a role on the glider, else by number only. */
export async function findUses(
  actor: UserDto,
  materialId: string,
  transaction?: Transaction,
): Promise<MaterialUsesDto> {
  const within = transaction ? { transaction } : {};
  const total = await GliderMaterial.count({ where: { materialId }, ...within });
  const seen = await GliderMaterial.findAll({
    where: { materialId },
    include: [
      {
        association: 'glider',
        attributes: ['id', 'name'],
        required: true,
        include: [{ association: 'members', attributes: [], where: { userId: actor.id }, required: true }],
      },
    ],
    order: [['glider', 'name', 'ASC']],
    ...within,
  });
  const gliders = seen.flatMap(({ glider }) => (glider ? [{ id: glider.id, name: glider.name }] : []));
  return { gliders, others: total - gliders.length };
}

const naming = new Intl.ListFormat('en', { type: 'conjunction' });

/** “It is used in Dunlin, Plover and 2 gliders of others.” */
export function wordUses({ gliders, others }: MaterialUsesDto): string {
  const places = gliders.map(({ name }) => name);
  if (others > 0) places.push(others === 1 ? 'a glider of somebody else' : `${others} gliders of others`);
  return places.length > 0 ? `It is used in ${naming.format(places)}.` : 'It was in use until just now.';
}
