import { tokenInput } from '#shared/schemas/account.ts';
import {
  clubInvitation,
  clubInvitationAccepted,
  clubInvitationInput,
  clubInvitationList,
  clubInvitationPreview,
} from '#shared/schemas/club.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import {
  acceptClubInvitation,
  declineClubInvitation,
  inviteToClub,
  listClubInvitations,
  previewClubInvitation,
  withdrawClubInvitation,
} from '#server/services/club-invitations.ts';
import { idParams } from './inputs.ts';

const tag = 'Clubs';

export const clubInvitationEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/clubs/:id/invitations',
    tag,
    summary: 'Invitations to a club that nobody has answered yet, newest first',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: clubInvitationList },
    handle: async ({ actor, params }) => ({ body: await listClubInvitations(actor, params.id) }),
  }),
  endpoint({
    method: 'post',
    path: '/clubs/:id/invitations',
    tag,
    summary:
      'Invite somebody to a club by e-mail; the same address again gets a new link in place of the old',
    access: 'signed-in',
    limits: ['mailsByUser'],
    params: idParams,
    body: clubInvitationInput,
    answer: { status: 201, schema: clubInvitation },
    problems: ['email_unverified', 'already_member'],
    handle: async ({ actor, params, body }) => ({ body: await inviteToClub(actor, params.id, body) }),
  }),
  endpoint({
    method: 'delete',
    path: '/club-invitations/:id',
    tag,
    summary: 'Withdraw an invitation to a club; its link no longer works',
    access: 'signed-in',
    params: idParams,
    answer: { status: 204 },
    handle: async ({ actor, params }) => {
      await withdrawClubInvitation(actor, params.id);
      return {};
    },
  }),
  endpoint({
    method: 'post',
    path: '/club-invitations/preview',
    tag,
    summary:
      'What an invitation to a club says to whoever holds its link; by POST, so that the token is in no log',
    access: 'public',
    limits: ['linkGuesses'],
    body: tokenInput,
    answer: { status: 200, schema: clubInvitationPreview },
    problems: ['link_dead'],
    handle: async ({ body }) => ({ body: await previewClubInvitation(body.token) }),
  }),
  endpoint({
    method: 'post',
    path: '/club-invitations/accept',
    tag,
    summary: 'Become a member of a club by an invitation',
    access: 'signed-in',
    limits: ['linkGuesses'],
    body: tokenInput,
    answer: { status: 200, schema: clubInvitationAccepted },
    problems: ['link_dead'],
    handle: async ({ actor, body }) => ({ body: await acceptClubInvitation(actor, body.token) }),
  }),
  endpoint({
    method: 'post',
    path: '/club-invitations/decline',
    tag,
    summary: 'Decline an invitation to a club; its link no longer works',
    access: 'public',
    limits: ['linkGuesses'],
    body: tokenInput,
    answer: { status: 204 },
    problems: ['link_dead'],
    handle: async ({ body }) => {
      await declineClubInvitation(body.token);
      return {};
    },
  }),
];
