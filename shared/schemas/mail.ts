import { z } from 'zod';

/** A mail that was written; where there is no mail server it is kept to be read here. */
export const mail = z.strictObject({
  id: z.uuid(),
  to: z.string(),
  subject: z.string(),
  text: z.string(),
  html: z.string(),
  writtenAt: z.iso.datetime(),
});
export const mailList = z.strictObject({ mails: z.array(mail) });

export type MailDto = z.infer<typeof mail>;
export type MailListDto = z.infer<typeof mailList>;
