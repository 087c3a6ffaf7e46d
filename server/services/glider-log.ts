import { Op, type Transaction } from 'sequelize';
import { z } from 'zod';
import type { GliderSaveDto, GliderSaveListDto, GliderStateDto } from '#shared/schemas/glider-save.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { notFound } from '#server/errors.ts';
import { GliderSaveName } from '#server/models/glider-save-name.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import { presentGliderSave, presentGliderState } from '#server/presenters/glider-save.ts';
import { allowOnGlider, lockGlider } from './glider-access.ts';
import { decodeCursor, pageOf, type PageQuery } from './paging.ts';
import { inTransaction } from './transaction.ts';

const savePlace = z.tuple([z.int32()]);
const author = { association: 'author', attributes: ['name'] };

async function namesOf(gliderId: string, versions: number[]): Promise<Map<number, string>> {
  const rows = await GliderSaveName.findAll({ where: { gliderId, version: versions } });
  return new Map(rows.map(({ version, name }) => [version, name]));
}

/** Saves of a glider, newest first, every one of them. */
export async function listGliderSaves(
  actor: UserDto,
  gliderId: string,
  query: PageQuery,
): Promise<GliderSaveListDto> {
  await allowOnGlider(actor, gliderId, 'read');
  const after = decodeCursor(query.cursor, savePlace);
  const found = await GliderSave.findAll({
    attributes: { exclude: ['plan'] },
    include: [author],
    where: { gliderId, ...(after && { version: { [Op.lt]: after[0] } }) },
    order: [['version', 'DESC']],
    limit: query.limit + 1,
  });
  const { rows, nextCursor } = pageOf(found, query.limit, (row) => [row.version]);
  const names = await namesOf(
    gliderId,
    rows.map(({ version }) => version),
  );
  return {
    saves: rows.map((row) => presentGliderSave(row, row.author?.name ?? '', names.get(row.version) ?? null)),
    nextCursor,
  };
}

/** @throws AppError `not_found` for a version that never was */
async function findSave(gliderId: string, version: number, transaction?: Transaction): Promise<GliderSave> {
  const save = await GliderSave.findOne({
    where: { gliderId, version },
    include: [author],
    ...(transaction && { transaction }),
  });
  if (!save) throw notFound('saved state');
  return save;
}

/** One saved state with its plan. */
export async function getGliderState(
  actor: UserDto,
  gliderId: string,
  version: number,
): Promise<GliderStateDto> {
  await allowOnGlider(actor, gliderId, 'read');
  const save = await findSave(gliderId, version);
  const names = await namesOf(gliderId, [version]);
  return presentGliderState(save, save.author?.name ?? '', names.get(version) ?? null);
}

/** Gives a saved state a name; an empty one takes it away. */
export async function nameGliderSave(
  actor: UserDto,
  gliderId: string,
  version: number,
  name: string,
): Promise<GliderSaveDto> {
  return inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'nameSave', transaction);
    const save = await findSave(gliderId, version, transaction);
    if (name === '') await GliderSaveName.destroy({ where: { gliderId, version }, transaction });
    else await GliderSaveName.upsert({ ownerId: glider.ownerId, gliderId, version, name }, { transaction });
    return presentGliderSave(save, save.author?.name ?? '', name === '' ? null : name);
  });
}
