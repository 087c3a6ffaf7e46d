import { randomUUID } from 'node:crypto';
import { estimatePlan } from '#server/estimating/estimate-plan.ts';
import type { Glider } from '#server/models/glider.ts';
import { Sheet } from '#server/models/sheet.ts';
import type { User } from '#server/models/user.ts';
import { insertSheet } from '#server/services/sheets.ts';
import { inTransaction } from '#server/services/transaction.ts';

/** A balance sheet of a glider as it is saved now. */
export async function makeSheet(glider: Glider, by: User, note = ''): Promise<Sheet> {
  const id = randomUUID();
  const result = await estimatePlan(glider.plan);
  const savedBy = { id: by.id, name: by.name };
  await inTransaction((transaction) => insertSheet({ id, glider, result, note, savedBy, transaction }));
  return Sheet.findByPk(id, { rejectOnEmpty: true });
}
