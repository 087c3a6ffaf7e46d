import { Op, type Transaction } from 'sequelize';
import { hashToken, newToken } from '#server/auth/tokens.ts';
import { AppError } from '#server/errors.ts';
import { MailedLink } from '#server/models/mailed-link.ts';

type Purpose = MailedLink['purpose'];

const HOUR_MS = 3_600_000;
const LIFE_MS: Record<Purpose, number> = { verify: 24 * HOUR_MS, reset: HOUR_MS };

interface NewLink {
  userId: string;
  purpose: Purpose;
  email: string;
  transaction: Transaction;
}

/** Makes a link; an older one of the same kind no longer works. @returns its token */
export async function makeLink({ userId, purpose, email, transaction }: NewLink): Promise<string> {
  const token = newToken();
  await MailedLink.destroy({ where: { userId, purpose }, transaction });
  const expiresAt = new Date(Date.now() + LIFE_MS[purpose]);
  await MailedLink.create(
    { tokenHash: hashToken(token), userId, purpose, email, expiresAt },
    { transaction },
  );
  return token;
}

export const deadLink = () =>
  new AppError('link_dead', 'This link was used, has run out, or a newer one has taken its place.');

/**
 * Uses a link up and says whose it was.
 * @throws AppError `link_dead`
 */
export async function useLink(
  token: string,
  purpose: Purpose,
  transaction: Transaction,
): Promise<MailedLink> {
  const link = await MailedLink.findOne({
    where: { tokenHash: hashToken(token), purpose, expiresAt: { [Op.gt]: new Date() } },
    include: { association: 'user', required: true },
    lock: { level: transaction.LOCK.UPDATE, of: MailedLink },
    transaction,
  });
  if (!link) throw deadLink();
  await link.destroy({ transaction });
  return link;
}

/** The address that is to become a user's, or was mailed to be confirmed; null for none. */
export async function awaitedAddress(userId: string): Promise<string | null> {
  const link = await MailedLink.findOne({
    where: { userId, purpose: 'verify', expiresAt: { [Op.gt]: new Date() } },
  });
  return link?.email ?? null;
}

export async function forgetDeadLinks(now: Date): Promise<void> {
  await MailedLink.destroy({ where: { expiresAt: { [Op.lte]: now } } });
}
