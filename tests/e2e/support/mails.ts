import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { mailList, type MailDto } from '#shared/schemas/mail.ts';
import { PATIENT, type Visit } from './browser.ts';

/** The newest mail to an address with this in its subject; the service shows them for want of a mail server. */
export async function mailTo(
  { context }: Pick<Visit, 'context'>,
  to: string,
  subject: string,
): Promise<MailDto> {
  let found: MailDto | undefined;
  await expect
    .poll(async () => {
      const { mails } = mailList.parse(await (await context.request.get('/api/dev/mails')).json());
      found = mails.find((mail) => mail.to === to && mail.subject.includes(subject));
      return found !== undefined;
    }, PATIENT)
    .toBe(true);
  if (!found) throw new Error(`no mail “${subject}” to ${to}`);
  return found;
}

/** Where the mail's button leads. */
export function linkIn({ text }: MailDto): string {
  const link = /^https?:\/\/\S+$/m.exec(text)?.[0];
  if (!link) throw new Error(`no link in:\n${text}`);
  return new URL(link).pathname;
}

/** The mail as a mail program shows it, by itself. */
export async function showMail(page: Page, { html }: MailDto): Promise<void> {
  await page.setContent(html);
}
