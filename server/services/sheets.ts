import { createHash } from 'node:crypto';
import { Op, type Transaction } from 'sequelize';
import { z } from 'zod';
import type { Estimate } from '#shared/core/result.ts';
import { CALCULATOR_VERSION } from '#shared/core/version.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import type { SheetDto, SheetListDto } from '#shared/schemas/sheet.ts';
import { notFound } from '#server/errors.ts';
import { estimatePlan } from '#server/estimating/estimate-plan.ts';
import { Glider } from '#server/models/glider.ts';
import { Sheet } from '#server/models/sheet.ts';
import { authorizeGlider } from '#server/policies/glider.ts';
import { presentSheet, presentSheetSummary } from '#server/presenters/sheet.ts';
import { canonicalJson } from './canonical-json.ts';
import { figuresOf } from './figures.ts';
import { allowOnGlider, gliderRoleOf, lockGlider } from './glider-access.ts';
import { makeOnce } from './idempotency.ts';
import { decodeCursor, pageOf, type PageQuery } from './paging.ts';
import { inTransaction } from './transaction.ts';

const sheetPlace = z.tuple([z.int32()]);

/** What a sheet's check code is made over, in canonical JSON. */
export function sheetDigest(sheet: Pick<SheetDto, 'calculator' | 'plan' | 'result'>): string {
  const { calculator, plan, result } = sheet;
  return createHash('sha256').update(canonicalJson({ calculator, plan, result })).digest('hex');
}

/** Freezes the saved plan of a glider as a numbered sheet; the same key of the same user freezes it once. */
export async function createSheet(
  actor: UserDto,
  gliderId: string,
  note: string,
  key: string | undefined,
): Promise<SheetDto> {
  await allowOnGlider(actor, gliderId, 'saveSheet');
  const seen = await Glider.findByPk(gliderId);
  if (!seen) throw notFound('glider');
  const early = await estimatePlan(seen.plan);
  const id = await inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'saveSheet', transaction);
    // Saved in between: the sheet is of what is saved now.
    const result = glider.version === seen.version ? early : await estimatePlan(glider.plan);
    return makeOnce({ userId: actor.id, key, purpose: `sheet of ${gliderId}`, transaction }, (newId) =>
      insertSheet({ id: newId, glider, result, note, savedBy: actor, transaction }),
    );
  });
  return getSheet(actor, id);
}

interface NewSheet {
  id: string;
  /** locked, so that no two sheets take one number */
  glider: Glider;
  result: Estimate;
  note: string;
  savedBy: { id: string; name: string };
  transaction: Transaction;
}

export async function insertSheet({
  id,
  glider,
  result,
  note,
  savedBy,
  transaction,
}: NewSheet): Promise<void> {
  const last = await Sheet.max<number | null, Sheet>('number', {
    where: { gliderId: glider.id },
    transaction,
  });
  const frozen = { plan: glider.plan, result, calculator: CALCULATOR_VERSION };
  await Sheet.create(
    {
      id,
      ownerId: glider.ownerId,
      gliderId: glider.id,
      number: (last ?? 0) + 1,
      gliderName: glider.name,
      note,
      ...frozen,
      sha256: sheetDigest(frozen),
      ...figuresOf(result),
      savedBy: savedBy.id,
      savedByName: savedBy.name,
    },
    { transaction },
  );
}

/** @throws AppError `not_found` also for a sheet of a glider that the asker has no role on */
export async function getSheet(actor: UserDto, id: string): Promise<SheetDto> {
  const sheet = await Sheet.findByPk(id);
  if (!sheet) throw notFound('sheet');
  authorizeGlider(await gliderRoleOf(actor, sheet.gliderId, 'sheet'), 'read');
  return presentSheet(sheet);
}

/** Sheets of a glider, newest first. */
export async function listSheets(actor: UserDto, gliderId: string, query: PageQuery): Promise<SheetListDto> {
  await allowOnGlider(actor, gliderId, 'read');
  const after = decodeCursor(query.cursor, sheetPlace);
  const found = await Sheet.findAll({
    attributes: { exclude: ['plan', 'result'] },
    where: { gliderId, ...(after && { number: { [Op.lt]: after[0] } }) },
    order: [['number', 'DESC']],
    limit: query.limit + 1,
  });
  const { rows, nextCursor } = pageOf(found, query.limit, (row) => [row.number]);
  return { sheets: rows.map(presentSheetSummary), nextCursor };
}
