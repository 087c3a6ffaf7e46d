import { randomUUID } from 'node:crypto';
import { ClassEdition } from '#server/models/class-edition.ts';
import { canonicalJson } from '#server/services/canonical-json.ts';
import { database, inTransaction } from '#server/services/transaction.ts';
import { readClassEditions } from './seed-files.ts';
import { SEED_LOCK } from './seed-materials.ts';

/**
 * Brings everybody's editions of classes up to `data/classes.json`. One that is in use, or that an admin has changed
 * since, stays as it is.
 */
export async function seedClasses(): Promise<{ added: number; renewed: number }> {
  const editions = await readClassEditions();
  return inTransaction(async (transaction) => {
    await database().query(`SELECT pg_advisory_xact_lock(${SEED_LOCK})`, { transaction });
    const done = { added: 0, renewed: 0 };
    for (const input of editions) {
      const { key, edition } = input;
      const row = await ClassEdition.findOne({ where: { clubId: null, key, edition }, transaction });
      if (!row) {
        await ClassEdition.create({ id: randomUUID(), clubId: null, ...input }, { transaction });
        done.added += 1;
      } else if (row.usedAt === null && row.version === 1 && differs(row, input)) {
        await row.update(input, { transaction });
        done.renewed += 1;
      }
    }
    return done;
  });
}

function differs({ name, issuedBy, note, limits }: ClassEdition, input: object): boolean {
  return canonicalJson({ ...input, name, issuedBy, note, limits }) !== canonicalJson(input);
}
