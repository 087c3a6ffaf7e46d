import { randomUUID } from 'node:crypto';
import { QueryTypes, type Transaction } from 'sequelize';
import type { AccountDeletionDto } from '#shared/schemas/account.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { AppError } from '#server/errors.ts';
import { ClubInvitation } from '#server/models/club-invitation.ts';
import { ClubMember } from '#server/models/club-member.ts';
import { Club } from '#server/models/club.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { Glider } from '#server/models/glider.ts';
import { IdempotencyKey } from '#server/models/idempotency-key.ts';
import { Invitation } from '#server/models/invitation.ts';
import { MailedLink } from '#server/models/mailed-link.ts';
import { Session } from '#server/models/session.ts';
import type { User } from '#server/models/user.ts';
import { confirmPassword, ownRow } from './account.ts';
import { part } from './club-members.ts';
import { removeUnusedFiles } from './stored-files.ts';
import { database, inTransaction } from './transaction.ts';

type Named = AccountDeletionDto['left'][number];

/**
 * Deletes an account with its gliders. Rows of others that name the user (saved states, sheets, weighings) stay true:
 * of the user a husk without name and address stays behind them.
 * @throws AppError `wrong_password`, `shared_gliders` while a glider of theirs has other members, `last_secretary`
 */
export async function deleteAccount(actor: UserDto, password: string): Promise<AccountDeletionDto> {
  const user = await ownRow(actor);
  await confirmPassword(user, password);
  const gone = await inTransaction(async (transaction) => {
    const members = await GliderMember.findAll({
      where: { userId: user.id },
      include: [{ association: 'glider', attributes: ['id', 'name'], required: true }],
      transaction,
    });
    const named = (rows: readonly GliderMember[]): Named[] =>
      rows.flatMap(({ glider }) => (glider ? [{ id: glider.id, name: glider.name }] : []));
    const own = named(members.filter(({ role }) => role === 'owner'));
    await refuseShared(own, transaction);
    await leaveClubs(user, transaction);
    await Glider.destroy({ where: { id: own.map(({ id }) => id) }, transaction });
    await GliderMember.destroy({ where: { userId: user.id }, transaction });
    await forget(user, transaction);
    return { deleted: own, left: named(members.filter(({ role }) => role !== 'owner')) };
  });
  await removeUnusedFiles().catch(() => undefined);
  return gone;
}

async function refuseShared(own: readonly Named[], transaction: Transaction): Promise<void> {
  const others = await database().query<{ gliderId: string }>(
    `SELECT DISTINCT glider_id AS "gliderId" FROM glider_members
     WHERE glider_id = ANY($1::uuid[]) AND role <> 'owner'`,
    { type: QueryTypes.SELECT, bind: [own.map(({ id }) => id)], transaction },
  );
  if (others.length === 0) return;
  const shared = new Set(others.map(({ gliderId }) => gliderId));
  const gliders = own.filter(({ id }) => shared.has(id));
  const detail = 'Gliders of yours have other members: hand them over, or remove the members.';
  throw new AppError('shared_gliders', detail, { members: { gliders } });
}

/** @throws AppError `last_secretary` for a club that would be left without one */
async function leaveClubs(user: User, transaction: Transaction): Promise<void> {
  const where = { userId: user.id };
  const clubIds = (await ClubMember.findAll({ where, transaction })).map(({ clubId }) => clubId);
  const lock = transaction.LOCK.UPDATE;
  await Club.findAll({ where: { id: clubIds }, order: [['id', 'ASC']], lock, transaction });
  const rows = await ClubMember.findAll({ where, transaction });
  for (const row of rows) await part(row, transaction);
}

/** Takes everything personal out of a user's row, and the rest of what was only theirs. */
async function forget(user: User, transaction: Transaction): Promise<void> {
  const where = { userId: user.id };
  await Session.destroy({ where, transaction });
  await MailedLink.destroy({ where, transaction });
  await IdempotencyKey.destroy({ where, transaction });
  await Invitation.destroy({ where: { invitedBy: user.id }, transaction });
  await ClubInvitation.destroy({ where: { invitedBy: user.id }, transaction });
  await database().query('DELETE FROM stock_pieces WHERE user_id = $1', { bind: [user.id], transaction });
  // A material that others' plans were made with keeps its row; only its keeper could see it in a list.
  await database().query(
    `DELETE FROM materials WHERE owner_id = $1
       AND NOT EXISTS (SELECT FROM glider_materials WHERE material_id = materials.id)`,
    { bind: [user.id], transaction },
  );
  await database().query('DELETE FROM mails WHERE recipient = $1', { bind: [user.email], transaction });
  await user.update(
    {
      name: 'Former member',
      email: `${randomUUID()}@deleted.invalid`,
      passwordHash: '$argon2id$deleted',
      role: 'user',
      verifiedAt: null,
      preferences: { units: {}, theme: 'system' },
      deletedAt: new Date(),
    },
    { transaction },
  );
}
