import type { Transaction } from 'sequelize';
import type { UserDto } from '#shared/schemas/session.ts';
import type { GliderTrialsDto, TrialsInput } from '#shared/schemas/trials.ts';
import { GliderTrials } from '#server/models/glider-trials.ts';
import { presentGliderTrials } from '#server/presenters/glider-trials.ts';
import { allowOnGlider, lockGlider } from './glider-access.ts';
import { savedAlready } from './saved-already.ts';
import { inTransaction } from './transaction.ts';

const editor = { association: 'editor', attributes: ['name'] };

async function currentTrials(gliderId: string, transaction?: Transaction): Promise<GliderTrialsDto> {
  const within = transaction ? { transaction } : {};
  return presentGliderTrials(await GliderTrials.findByPk(gliderId, { include: [editor], ...within }));
}

/** Wood trials of a glider; an empty list while nobody has kept any. */
export async function getGliderTrials(actor: UserDto, gliderId: string): Promise<GliderTrialsDto> {
  await allowOnGlider(actor, gliderId, 'read');
  return currentTrials(gliderId);
}

/**
 * Keeps the whole list of trials.
 * @throws AppError `stale_version` with the current list when somebody saved in between
 */
export function saveGliderTrials(
  actor: UserDto,
  gliderId: string,
  version: number,
  { trials, terms }: TrialsInput,
): Promise<GliderTrialsDto> {
  return inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'edit', transaction);
    const current = await currentTrials(gliderId, transaction);
    if (current.version !== version) {
      return savedAlready(current, { trials, terms }, 'These trials were changed in the meantime.');
    }
    await GliderTrials.upsert(
      {
        ownerId: glider.ownerId,
        gliderId,
        trials,
        terms,
        version: version + 1,
        updatedBy: actor.id,
        updatedAt: new Date(),
      },
      { transaction },
    );
    return currentTrials(gliderId, transaction);
  });
}
