import { Op } from 'sequelize';
import { z } from 'zod';
import type { GliderSaveListDto } from '#shared/schemas/glider-save.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import { presentGliderSave } from '#server/presenters/glider-save.ts';
import { allowOnGlider } from './glider-access.ts';
import { decodeCursor, pageOf, type PageQuery } from './paging.ts';

const savePlace = z.tuple([z.int32()]);

/** Saves of a glider, newest first. */
export async function listGliderSaves(
  actor: UserDto,
  gliderId: string,
  query: PageQuery,
): Promise<GliderSaveListDto> {
  await allowOnGlider(actor, gliderId, 'read');
  const after = decodeCursor(query.cursor, savePlace);
  const found = await GliderSave.findAll({
    attributes: { exclude: ['plan'] },
    include: [{ association: 'author', attributes: ['name'] }],
    where: { gliderId, ...(after && { version: { [Op.lt]: after[0] } }) },
    order: [['version', 'DESC']],
    limit: query.limit + 1,
  });
  const { rows, nextCursor } = pageOf(found, query.limit, (row) => [row.version]);
  return { saves: rows.map((row) => presentGliderSave(row, row.author?.name ?? '')), nextCursor };
}
