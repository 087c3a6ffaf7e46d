import { passwordForgotten, passwordReset, tokenInput, verifiedEmail } from '#shared/schemas/account.ts';
import { mailList } from '#shared/schemas/mail.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { shownMails } from '#server/mail/outbox.ts';
import { verifyEmail } from '#server/services/email-verification.ts';
import { forgetPassword, resetPassword } from '#server/services/password-reset.ts';

const tag = 'Account';

export const mailedLinkEndpoints: Endpoint[] = [
  endpoint({
    method: 'post',
    path: '/email-verifications',
    tag,
    summary: 'Confirm an address by the mailed link',
    access: 'public',
    limits: ['linkGuesses'],
    body: tokenInput,
    answer: { status: 200, schema: verifiedEmail },
    problems: ['link_dead', 'email_taken'],
    handle: async ({ body }) => ({ body: await verifyEmail(body.token) }),
  }),
  endpoint({
    method: 'post',
    path: '/password-resets',
    tag,
    summary: 'Mail a link to set a new password by, where the address has an account',
    access: 'public',
    limits: ['mailsByAddress', 'mailsByAccount'],
    body: passwordForgotten,
    answer: { status: 204 },
    handle: async ({ body }) => {
      await forgetPassword(body.email);
      return {};
    },
  }),
  endpoint({
    method: 'put',
    path: '/password-resets',
    tag,
    summary: 'Set a new password by the mailed link; every browser is signed out',
    access: 'public',
    limits: ['linkGuesses'],
    body: passwordReset,
    answer: { status: 204 },
    problems: ['link_dead'],
    handle: async ({ body }) => {
      await resetPassword(body);
      return {};
    },
  }),
  endpoint({
    method: 'get',
    path: '/dev/mails',
    tag: 'House',
    summary:
      'Mails that were written, where there is no mail server and only this machine is served; else 404',
    access: 'public',
    answer: { status: 200, schema: mailList },
    handle: async () => ({ body: await shownMails() }),
  }),
];
