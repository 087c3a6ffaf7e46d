import { tokenInput } from '#shared/schemas/account.ts';
import {
  invitation,
  invitationAccepted,
  invitationInput,
  invitationList,
  invitationPreview,
} from '#shared/schemas/sharing.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import {
  acceptInvitation,
  declineInvitation,
  invite,
  listInvitations,
  previewInvitation,
  withdrawInvitation,
} from '#server/services/invitations.ts';
import { idParams } from './inputs.ts';

const tag = 'Sharing';

export const invitationEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/gliders/:id/invitations',
    tag,
    summary: 'Invitations that nobody has answered yet, newest first',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: invitationList },
    handle: async ({ actor, params }) => ({ body: await listInvitations(actor, params.id) }),
  }),
  endpoint({
    method: 'post',
    path: '/gliders/:id/invitations',
    tag,
    summary: 'Invite somebody by e-mail; the same address again gets a new link in place of the old',
    access: 'signed-in',
    limits: ['mailsByUser'],
    params: idParams,
    body: invitationInput,
    answer: { status: 201, schema: invitation },
    problems: ['email_unverified', 'already_member'],
    handle: async ({ actor, params, body }) => ({ body: await invite(actor, params.id, body) }),
  }),
  endpoint({
    method: 'delete',
    path: '/invitations/:id',
    tag,
    summary: 'Withdraw an invitation; its link no longer works',
    access: 'signed-in',
    params: idParams,
    answer: { status: 204 },
    handle: async ({ actor, params }) => {
      await withdrawInvitation(actor, params.id);
      return {};
    },
  }),
  endpoint({
    method: 'post',
    path: '/invitations/preview',
    tag,
    summary: 'What an invitation says to whoever holds its link; by POST, so that the token is in no log',
    access: 'public',
    limits: ['linkGuesses'],
    body: tokenInput,
    answer: { status: 200, schema: invitationPreview },
    problems: ['link_dead'],
    handle: async ({ body }) => ({ body: await previewInvitation(body.token) }),
  }),
  endpoint({
    method: 'post',
    path: '/invitations/accept',
    tag,
    summary: 'Become a member by an invitation',
    access: 'signed-in',
    limits: ['linkGuesses'],
    body: tokenInput,
    answer: { status: 200, schema: invitationAccepted },
    problems: ['link_dead'],
    handle: async ({ actor, body }) => ({ body: await acceptInvitation(actor, body.token) }),
  }),
  endpoint({
    method: 'post',
    path: '/invitations/decline',
    tag,
    summary: 'Decline an invitation; its link no longer works',
    access: 'public',
    limits: ['linkGuesses'],
    body: tokenInput,
    answer: { status: 204 },
    problems: ['link_dead'],
    handle: async ({ body }) => {
      await declineInvitation(body.token);
      return {};
    },
  }),
];
