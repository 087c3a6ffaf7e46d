import type { Transaction } from 'sequelize';
import type { UserDto } from '#shared/schemas/session.ts';
import type { BuildTermsDto, BuildTermsInput } from '#shared/schemas/weighing.ts';
import { BuildTerms } from '#server/models/build-terms.ts';
import { presentBuildTerms } from '#server/presenters/weighing.ts';
import { allowOnGlider, lockGlider } from './glider-access.ts';
import { savedAlready } from './saved-already.ts';
import { inTransaction } from './transaction.ts';

const editor = { association: 'editor', attributes: ['name'] };

async function currentTerms(gliderId: string, transaction?: Transaction): Promise<BuildTermsDto> {
  const within = transaction ? { transaction } : {};
  return presentBuildTerms(await BuildTerms.findByPk(gliderId, { include: [editor], ...within }));
}

/** What a glider is built to; empty while nobody has said. */
export async function getBuildTerms(actor: UserDto, gliderId: string): Promise<BuildTermsDto> {
  await allowOnGlider(actor, gliderId, 'read');
  return currentTerms(gliderId);
}

/** @throws AppError `stale_version` with the current terms when somebody saved in between */
export function saveBuildTerms(
  actor: UserDto,
  gliderId: string,
  version: number,
  body: BuildTermsInput,
): Promise<BuildTermsDto> {
  return inTransaction(async (transaction) => {
    const { glider } = await lockGlider(actor, gliderId, 'weigh', transaction);
    const current = await currentTerms(gliderId, transaction);
    if (current.version !== version) {
      return savedAlready(current, body, 'Target and ballast were changed in the meantime.');
    }
    const row = { ownerId: glider.ownerId, gliderId, body, version: version + 1 };
    await BuildTerms.upsert({ ...row, updatedBy: actor.id, updatedAt: new Date() }, { transaction });
    return currentTerms(gliderId, transaction);
  });
}
