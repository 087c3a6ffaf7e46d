import { QueryTypes, Transaction } from 'sequelize';
import type { GliderRole } from '#shared/schemas/glider.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { notFound, type Noun } from '#server/errors.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { Glider } from '#server/models/glider.ts';
import { authorizeGlider } from '#server/policies/glider.ts';
import type { GliderAction } from '#server/policies/table.ts';
import { database } from './transaction.ts';

/**
 * The asker's role on a glider: a reader's also where its owner lets a club see it that the asker is in.
 * @throws AppError `not_found` where there is none
 */
export async function gliderRoleOf(
  actor: UserDto,
  gliderId: string,
  noun: Noun = 'glider',
  transaction?: Transaction,
): Promise<GliderRole> {
  const member = await GliderMember.findOne({
    where: { gliderId, userId: actor.id },
    ...(transaction && { transaction }),
  });
  if (member) return member.role;
  if (await isShownTo(actor, gliderId, transaction)) return 'reader';
  throw notFound(noun);
}

async function isShownTo(
  actor: UserDto,
  gliderId: string,
  transaction: Transaction | undefined,
): Promise<boolean> {
  const rows = await database().query(
    `SELECT FROM club_gliders JOIN club_members USING (club_id)
     WHERE glider_id = $1 AND user_id = $2 LIMIT 1`,
    { type: QueryTypes.SELECT, bind: [gliderId, actor.id], ...(transaction && { transaction }) },
  );
  return rows.length > 0;
}

/** Refuses unless the asker may do this with the glider. */
export async function allowOnGlider(actor: UserDto, gliderId: string, action: GliderAction): Promise<void> {
  authorizeGlider(await gliderRoleOf(actor, gliderId), action);
}

/**
 * A glider locked for a change, so that two changes at once are made one after the other.
 * @throws AppError `not_found` for a glider that the asker has no role on, `forbidden` for too low a role
 */
export async function lockGlider(
  actor: UserDto,
  gliderId: string,
  action: GliderAction,
  transaction: Transaction,
): Promise<{ glider: Glider; role: GliderRole }> {
  const role = await gliderRoleOf(actor, gliderId, 'glider', transaction);
  authorizeGlider(role, action);
  const glider = await Glider.findByPk(gliderId, { transaction, lock: Transaction.LOCK.UPDATE });
  if (!glider) throw notFound('glider');
  return { glider, role };
}
