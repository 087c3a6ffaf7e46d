import { createHash } from 'node:crypto';
import { QueryTypes, type Transaction } from 'sequelize';
import type { ImportPreviewDto, ImportResultDto } from '#shared/schemas/rack.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import type { StockMaterial, StockPieceInput } from '#shared/schemas/stock-piece.ts';
import { invalidInput } from '#server/errors.ts';
import { authorizeSite } from '#server/policies/site.ts';
import { readRack } from '#server/rack-file/read-rack.ts';
import { canonicalJson } from './canonical-json.ts';
import { makeOnce } from './idempotency.ts';
import { listMaterials } from './materials.ts';
import { insertPieces } from './stock-rows.ts';
import { database, inTransaction } from './transaction.ts';

const plainName = (name: string) => name.normalize('NFKD').replace(/\p{M}/gu, '').toLowerCase().trim();

/**
 * What a file would bring in, every bad line with its reasons; nothing is stored.
 * @throws AppError `invalid_input` for what is no table of stock
 */
export async function previewImport(actor: UserDto, bytes: Buffer): Promise<ImportPreviewDto> {
  authorizeSite(actor, 'addStockPiece');
  const { materials } = await listMaterials(actor);
  const byName = new Map<string, StockMaterial>(
    materials.map(({ key, name, category }) => [plainName(name), { key, name, category }]),
  );
  const preview = readRack(bytes, (name) => byName.get(plainName(name)));
  if ('problem' in preview) throw invalidInput([{ pointer: '#/file', detail: preview.problem }]);
  return preview;
}

/** Takes pieces in, all of them or none; the same key of the same user takes them in once. */
export async function importPieces(
  actor: UserDto,
  rows: readonly StockPieceInput[],
  key: string | undefined,
): Promise<ImportResultDto> {
  authorizeSite(actor, 'addStockPiece');
  const asked = createHash('sha256').update(canonicalJson(rows)).digest('hex');
  return inTransaction(async (transaction) => {
    const purpose = `import of ${asked}`;
    const id = await makeOnce({ userId: actor.id, key, purpose, transaction }, async (newId) => {
      const made = await insertPieces(
        actor.id,
        rows.map((fields) => ({ fields })),
        transaction,
      );
      const numbers = [made.at(0)?.number, made.at(-1)?.number];
      await database().query(
        `INSERT INTO rack_imports (user_id, id, count, first_number, last_number) VALUES ($1, $2, $3, $4, $5)`,
        { bind: [actor.id, newId, made.length, ...numbers], transaction },
      );
    });
    return resultOf(actor.id, id, transaction);
  });
}

async function resultOf(userId: string, id: string, transaction: Transaction): Promise<ImportResultDto> {
  const [row] = await database().query<ImportResultDto>(
    `SELECT count, first_number AS "firstNumber", last_number AS "lastNumber"
     FROM rack_imports WHERE user_id = $1 AND id = $2`,
    { type: QueryTypes.SELECT, bind: [userId, id], transaction },
  );
  if (!row) throw new Error('An import leaves its row.');
  return row;
}
