import { randomUUID } from 'node:crypto';
import { Op, type Transaction } from 'sequelize';
import type { MailListDto } from '#shared/schemas/mail.ts';
import { nothingHere } from '#server/errors.ts';
import { Mail } from '#server/models/mail.ts';
import { surroundings } from '#server/surroundings.ts';
import { letterHtml, letterText, type Letter } from './letter.ts';

/** One line, for what somebody typed must not begin another header. */
const oneLine = (text: string) => text.replace(/\s+/g, ' ').slice(0, 400);

/** Writes a mail with what it is about: it is sent if and only if the transaction is kept. */
export async function post(to: string, letter: Letter, transaction: Transaction): Promise<void> {
  await Mail.create(
    {
      id: randomUUID(),
      to,
      subject: oneLine(letter.subject),
      text: letterText(letter),
      html: letterHtml(letter),
      // Without a mail server it waits to be read here.
      dueAt: surroundings().mailsAreShown ? null : new Date(),
    },
    { transaction },
  );
  transaction.afterCommit(() => surroundings().mailWaits());
}

const MOST_SHOWN = 100;

/**
 * What was written, newest first, where there is no mail server and nobody else can reach the service.
 * @throws AppError `not_found` anywhere else
 */
export async function shownMails(): Promise<MailListDto> {
  if (!surroundings().mailsAreShown) throw nothingHere();
  const rows = await Mail.findAll({ order: [['writtenAt', 'DESC']], limit: MOST_SHOWN });
  return {
    mails: rows.map(({ id, to, subject, text, html, writtenAt }) => ({
      id,
      to,
      subject,
      text,
      html,
      writtenAt: writtenAt.toISOString(),
    })),
  };
}

const DAY_MS = 86_400_000;

/** Mails that were sent, shown or given up go after a week. */
export async function forgetOldMails(now: Date): Promise<void> {
  await Mail.destroy({
    where: { dueAt: null, writtenAt: { [Op.lt]: new Date(now.getTime() - 7 * DAY_MS) } },
  });
}
