import { Op, type WhereOptions } from 'sequelize';
import { z } from 'zod';
import type { GliderListDto, GliderSaveListDto } from '#shared/schemas/glider.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import { Glider } from '#server/models/glider.ts';
import { presentGliderSave, presentGliderSummary } from '#server/presenters/glider.ts';
import { allowOnGlider } from './glider-access.ts';
import { decodeCursor, pageOf, type PageQuery } from './paging.ts';

const gliderPlace = z.tuple([z.iso.datetime(), z.uuid()]);
const savePlace = z.tuple([z.int32()]);

const escapeLike = (text: string) => text.replace(/[\\%_]/g, (sign) => `\\${sign}`);

/** Gliders that the asker has any role on, newest change first. */
export async function listGliders(
  actor: UserDto,
  query: PageQuery & { search?: string | undefined },
): Promise<GliderListDto> {
  const after = decodeCursor(query.cursor, gliderPlace);
  const conditions: WhereOptions<Glider>[] = [];
  if (query.search) conditions.push({ name: { [Op.iLike]: `%${escapeLike(query.search)}%` } });
  if (after) {
    const updatedAt = new Date(after[0]);
    conditions.push({
      [Op.or]: [{ updatedAt: { [Op.lt]: updatedAt } }, { updatedAt, id: { [Op.lt]: after[1] } }],
    });
  }
  const found = await Glider.findAll({
    attributes: { exclude: ['plan'] },
    include: [
      { association: 'members', where: { userId: actor.id }, required: true },
      { association: 'owner', attributes: ['name'] },
    ],
    where: { [Op.and]: conditions },
    order: [
      ['updatedAt', 'DESC'],
      ['id', 'DESC'],
    ],
    limit: query.limit + 1,
    // Each glider joins one row of members, the asker's, so that the limit may count joined rows.
    subQuery: false,
  });
  const { rows, nextCursor } = pageOf(found, query.limit, (row) => [row.updatedAt.toISOString(), row.id]);
  return {
    gliders: rows.map((row) =>
      presentGliderSummary(row, row.members?.[0]?.role ?? 'reader', row.owner?.name ?? ''),
    ),
    nextCursor,
  };
}

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
