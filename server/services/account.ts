import type { AccountChanges, AccountDto, EmailChange, PasswordChange } from '#shared/schemas/account.ts';
import type { Preferences } from '#shared/schemas/preferences.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { lucia } from '#server/auth/lucia.ts';
import { commonPassword, isCommonPassword } from '#server/auth/common-passwords.ts';
import { hashPassword, passwordMatches } from '#server/auth/password.ts';
import { AppError, invalidInput, signedOut } from '#server/errors.ts';
import { addressChangeLetter, passwordChangedLetter, verifyLetter } from '#server/mail/letters.ts';
import { post } from '#server/mail/outbox.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { MailedLink } from '#server/models/mailed-link.ts';
import { User } from '#server/models/user.ts';
import { presentAccount } from '#server/presenters/account.ts';
import { endOtherSessions } from './account-sessions.ts';
import { awaitedAddress, makeLink } from './mailed-links.ts';
import { inTransaction } from './transaction.ts';

/** @throws AppError `signed_out` where the account went in the meantime */
export async function ownRow(actor: UserDto): Promise<User> {
  const user = await User.findOne({ where: { id: actor.id, deletedAt: null } });
  if (!user) throw signedOut();
  return user;
}

/**
 * The asker's row, for what sends mail to others in their name.
 * @throws AppError `email_unverified` until their own address is confirmed
 */
export async function verifiedRow(actor: UserDto): Promise<User> {
  const user = await ownRow(actor);
  if (user.verifiedAt !== null) return user;
  throw new AppError('email_unverified', 'Confirm your own address first; then you can invite others.');
}

/** @throws AppError `wrong_password` */
export async function confirmPassword(user: User, password: string): Promise<void> {
  if (await passwordMatches(user.passwordHash, password)) return;
  throw new AppError('wrong_password', 'That is not your password.');
}

/** How somebody wants to see everything. */
export async function preferencesOf(actor: UserDto): Promise<Preferences> {
  return (await ownRow(actor)).preferences;
}

export async function getAccount(actor: UserDto): Promise<AccountDto> {
  const user = await ownRow(actor);
  const [owned, all, awaited] = await Promise.all([
    GliderMember.count({ where: { userId: user.id, role: 'owner' } }),
    GliderMember.count({ where: { userId: user.id } }),
    awaitedAddress(user.id),
  ]);
  return presentAccount(user, { owned, shared: all - owned, awaited });
}

export async function changeAccount(actor: UserDto, changes: AccountChanges): Promise<AccountDto> {
  const { name, units, theme } = changes;
  const user = await ownRow(actor);
  const preferences = {
    units: units ?? user.preferences.units,
    theme: theme ?? user.preferences.theme,
  };
  await user.update({ preferences, ...(name !== undefined && { name }) });
  return getAccount(actor);
}

/** Sends the link that confirms the address, or the one that is to take its place, again. */
export async function verifyAgain(actor: UserDto): Promise<void> {
  const user = await ownRow(actor);
  const email = (await awaitedAddress(user.id)) ?? user.email;
  if (email === user.email && user.verifiedAt !== null) return;
  await inTransaction(async (transaction) => {
    const token = await makeLink({ userId: user.id, purpose: 'verify', email, transaction });
    await post(email, verifyLetter(user.name, token), transaction);
  });
}

/**
 * Begins a change of address; the new one is the user's once its link is followed. Both addresses are told.
 * @throws AppError `wrong_password`, `email_taken`
 */
export async function changeEmail(actor: UserDto, { email, password }: EmailChange): Promise<AccountDto> {
  const user = await ownRow(actor);
  await confirmPassword(user, password);
  if (email === user.email) {
    await MailedLink.destroy({ where: { userId: user.id, purpose: 'verify' } });
    return getAccount(actor);
  }
  if (await User.findOne({ where: { email } })) throw emailTaken();
  await inTransaction(async (transaction) => {
    const token = await makeLink({ userId: user.id, purpose: 'verify', email, transaction });
    await post(email, verifyLetter(user.name, token), transaction);
    await post(user.email, addressChangeLetter(user.name, email), transaction);
  });
  return getAccount(actor);
}

export const emailTaken = () => new AppError('email_taken', 'This address has an account already.');

/** Sets another password and signs every other browser out. @throws AppError `wrong_password` */
export async function changePassword(
  actor: UserDto,
  { current, password }: PasswordChange,
  cookieHeader: string | undefined,
): Promise<void> {
  const user = await ownRow(actor);
  await confirmPassword(user, current);
  if (isCommonPassword(password, user)) throw invalidInput([commonPassword]);
  const passwordHash = await hashPassword(password);
  await inTransaction(async (transaction) => {
    await user.update({ passwordHash }, { transaction });
    await MailedLink.destroy({ where: { userId: user.id, purpose: 'reset' }, transaction });
    await endOtherSessions(user.id, lucia.readSessionCookie(cookieHeader ?? ''), transaction);
    await post(user.email, passwordChangedLetter(user.name), transaction);
  });
}
