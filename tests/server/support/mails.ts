import { expect } from 'vitest';
import { Mail } from '#server/models/mail.ts';

/** Mails to an address, the newest first. */
export const mailsTo = (to: string) => Mail.findAll({ where: { to }, order: [['writtenAt', 'DESC']] });

/** The token at the end of the newest mailed link of a kind. */
export async function mailedToken(
  to: string,
  path: 'verify-email' | 'reset-password' | 'invitations' | 'club-invitations',
) {
  const texts = (await mailsTo(to)).map(({ text }) => text);
  const pattern = new RegExp(`https://featherbeam\\.example/${path}/([\\w-]{43})`);
  const found = texts.map((text) => pattern.exec(text)?.[1]).find(Boolean);
  expect(found, `a link of ${path} to ${to}`).toBeDefined();
  return found ?? '';
}
