import { Op, type Transaction } from 'sequelize';
import type { AccountSessionListDto } from '#shared/schemas/account.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { lucia } from '#server/auth/lucia.ts';
import { hashSessionId } from '#server/auth/session-adapter.ts';
import { notFound } from '#server/errors.ts';
import { Session } from '#server/models/session.ts';
import { presentAccountSession } from '#server/presenters/account.ts';

function currentHash(cookieHeader: string | undefined): string | null {
  const id = lucia.readSessionCookie(cookieHeader ?? '');
  return id === null ? null : hashSessionId(id);
}

/** Browsers that are signed in, the one that was used last first. */
export async function listSessions(
  actor: UserDto,
  cookieHeader: string | undefined,
): Promise<AccountSessionListDto> {
  const rows = await Session.findAll({
    where: { userId: actor.id, expiresAt: { [Op.gt]: new Date() } },
    order: [
      ['lastUsedAt', 'DESC'],
      ['createdAt', 'DESC'],
    ],
  });
  const current = currentHash(cookieHeader);
  return { sessions: rows.map((row) => presentAccountSession(row, current)) };
}

/** @throws AppError `not_found` also for a session of somebody else */
export async function endOneSession(actor: UserDto, id: string): Promise<void> {
  const ended = await Session.destroy({ where: { id, userId: actor.id } });
  if (ended === 0) throw notFound('session');
}

/** Ends every session of a user but the one given. */
export async function endOtherSessions(
  userId: string,
  keptId: string | null,
  transaction?: Transaction,
): Promise<void> {
  const idHash = { [Op.ne]: keptId === null ? '' : hashSessionId(keptId) };
  await Session.destroy({ where: { userId, idHash }, ...(transaction && { transaction }) });
}
