import { z } from 'zod';
import {
  club,
  clubGliderList,
  clubInput,
  clubList,
  clubMember,
  clubMemberInput,
  clubMemberList,
} from '#shared/schemas/club.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { hideFromClub, listClubGliders, showToClub } from '#server/services/club-gliders.ts';
import {
  changeClubMember,
  leaveClub,
  listClubMembers,
  removeClubMember,
} from '#server/services/club-members.ts';
import { changeClub, foundClub, getClub, listClubs } from '#server/services/clubs.ts';
import { idParams } from './inputs.ts';

const tag = 'Clubs';
const memberParams = z.object({ id: z.uuid(), userId: z.uuid() });
const gliderParams = z.object({ id: z.uuid(), gliderId: z.uuid() });

export const clubEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/clubs',
    tag,
    summary: 'Your clubs by name',
    access: 'signed-in',
    answer: { status: 200, schema: clubList },
    handle: async ({ actor }) => ({ body: await listClubs(actor) }),
  }),
  endpoint({
    method: 'post',
    path: '/clubs',
    tag,
    summary: 'Found a club; you are its secretary',
    access: 'signed-in',
    idempotent: true,
    body: clubInput,
    answer: { status: 201, schema: club, etag: true },
    handle: async ({ actor, body, idempotencyKey }) => {
      const found = await foundClub(actor, body, idempotencyKey);
      return { body: found, version: found.version, location: `/api/clubs/${found.id}` };
    },
  }),
  endpoint({
    method: 'get',
    path: '/clubs/:id',
    tag,
    summary: 'A club',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: club, etag: true },
    handle: async ({ actor, params }) => {
      const found = await getClub(actor, params.id);
      return { body: found, version: found.version };
    },
  }),
  endpoint({
    method: 'put',
    path: '/clubs/:id',
    tag,
    summary: 'Change name and place; a stale version is answered with the club as it is as `current`',
    access: 'signed-in',
    ifMatch: true,
    params: idParams,
    body: clubInput,
    answer: { status: 200, schema: club, etag: true },
    handle: async ({ actor, params, ifMatch, body }) => {
      const found = await changeClub(actor, params.id, ifMatch, body);
      return { body: found, version: found.version };
    },
  }),
  endpoint({
    method: 'get',
    path: '/clubs/:id/members',
    tag,
    summary: 'Who is what in a club',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: clubMemberList },
    handle: async ({ actor, params }) => ({ body: await listClubMembers(actor, params.id) }),
  }),
  endpoint({
    method: 'put',
    path: '/clubs/:id/members/:userId',
    tag,
    summary: 'Give a member another role',
    access: 'signed-in',
    params: memberParams,
    body: clubMemberInput,
    answer: { status: 200, schema: clubMember },
    problems: ['last_secretary'],
    handle: async ({ actor, params, body }) => ({
      body: await changeClubMember(actor, params.id, params.userId, body.role),
    }),
  }),
  endpoint({
    method: 'delete',
    path: '/clubs/:id/members/:userId',
    tag,
    summary: 'Put a member out of the club',
    access: 'signed-in',
    params: memberParams,
    answer: { status: 204 },
    problems: ['last_secretary'],
    handle: async ({ actor, params }) => {
      await removeClubMember(actor, params.id, params.userId);
      return {};
    },
  }),
  endpoint({
    method: 'delete',
    path: '/clubs/:id/membership',
    tag,
    summary: 'Leave a club',
    access: 'signed-in',
    params: idParams,
    answer: { status: 204 },
    problems: ['last_secretary'],
    handle: async ({ actor, params }) => {
      await leaveClub(actor, params.id);
      return {};
    },
  }),
  endpoint({
    method: 'get',
    path: '/clubs/:id/gliders',
    tag,
    summary: 'Gliders that members let the club see, newest first',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: clubGliderList },
    handle: async ({ actor, params }) => ({ body: await listClubGliders(actor, params.id) }),
  }),
  endpoint({
    method: 'put',
    path: '/clubs/:id/gliders/:gliderId',
    tag,
    summary: 'Let the whole club see a glider of yours',
    access: 'signed-in',
    params: gliderParams,
    answer: { status: 204 },
    handle: async ({ actor, params }) => {
      await showToClub(actor, params.id, params.gliderId);
      return {};
    },
  }),
  endpoint({
    method: 'delete',
    path: '/clubs/:id/gliders/:gliderId',
    tag,
    summary: 'Take a glider back from a club',
    access: 'signed-in',
    params: gliderParams,
    answer: { status: 204 },
    handle: async ({ actor, params }) => {
      await hideFromClub(actor, params.id, params.gliderId);
      return {};
    },
  }),
];
