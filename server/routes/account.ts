import {
  account,
  accountChanges,
  accountDeletion,
  accountDeletionInput,
  accountSessionList,
  emailChange,
  passwordChange,
} from '#shared/schemas/account.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import {
  changeAccount,
  changeEmail,
  changePassword,
  getAccount,
  verifyAgain,
} from '#server/services/account.ts';
import { deleteAccount } from '#server/services/account-deletion.ts';
import { exportAccount } from '#server/services/account-export.ts';
import { endOneSession, endOtherSessions, listSessions } from '#server/services/account-sessions.ts';
import { lucia } from '#server/auth/lucia.ts';
import { idParams } from './inputs.ts';

const tag = 'Account';
const access = 'signed-in';

export const accountEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/account',
    tag,
    summary: 'The account of who asks',
    access,
    answer: { status: 200, schema: account },
    handle: async ({ actor }) => ({ body: await getAccount(actor) }),
  }),
  endpoint({
    method: 'patch',
    path: '/account',
    tag,
    summary: 'Change name, units or theme; what is not named stays',
    access,
    body: accountChanges,
    answer: { status: 200, schema: account },
    handle: async ({ actor, body }) => ({ body: await changeAccount(actor, body) }),
  }),
  endpoint({
    method: 'post',
    path: '/account/email',
    tag,
    summary: 'Begin a change of address: the new one is mailed a link to confirm it by',
    access,
    limits: ['passwordGuesses', 'mailsByUser'],
    body: emailChange,
    answer: { status: 200, schema: account },
    problems: ['wrong_password', 'email_taken'],
    handle: async ({ actor, body }) => ({ body: await changeEmail(actor, body) }),
  }),
  endpoint({
    method: 'post',
    path: '/account/verification',
    tag,
    summary: 'Mail the link that confirms the address again',
    access,
    limits: ['mailsByUser'],
    answer: { status: 204 },
    handle: async ({ actor }) => {
      await verifyAgain(actor);
      return {};
    },
  }),
  endpoint({
    method: 'put',
    path: '/account/password',
    tag,
    summary: 'Set another password; every other browser is signed out',
    access,
    limits: ['passwordGuesses'],
    body: passwordChange,
    answer: { status: 204 },
    problems: ['wrong_password'],
    handle: async ({ actor, body, req }) => {
      await changePassword(actor, body, req.get('Cookie'));
      return {};
    },
  }),
  endpoint({
    method: 'get',
    path: '/account/sessions',
    tag,
    summary: 'Browsers that are signed in',
    access,
    answer: { status: 200, schema: accountSessionList },
    handle: async ({ actor, req }) => ({ body: await listSessions(actor, req.get('Cookie')) }),
  }),
  endpoint({
    method: 'delete',
    path: '/account/sessions',
    tag,
    summary: 'Sign every other browser out',
    access,
    answer: { status: 204 },
    handle: async ({ actor, req }) => {
      await endOtherSessions(actor.id, lucia.readSessionCookie(req.get('Cookie') ?? ''));
      return {};
    },
  }),
  endpoint({
    method: 'delete',
    path: '/account/sessions/:id',
    tag,
    summary: 'Sign one browser out',
    access,
    params: idParams,
    answer: { status: 204 },
    handle: async ({ actor, params }) => {
      await endOneSession(actor, params.id);
      return {};
    },
  }),
  endpoint({
    method: 'get',
    path: '/account/export',
    tag,
    summary: 'Everything of the account as one file',
    access,
    answer: { status: 200, file: 'application/json' },
    handle: ({ actor }) => ({ file: { text: exportAccount(actor), name: 'featherbeam account.json' } }),
  }),
  endpoint({
    method: 'post',
    path: '/account/deletion',
    tag,
    summary: 'Delete the account with its gliders; refused while one of them has other members',
    access,
    limits: ['passwordGuesses'],
    body: accountDeletionInput,
    answer: { status: 200, schema: accountDeletion },
    problems: ['wrong_password', 'shared_gliders', 'last_secretary'],
    handle: async ({ actor, body }) => ({
      body: await deleteAccount(actor, body.password),
      cookie: lucia.createBlankSessionCookie(),
    }),
  }),
];
