import { z } from 'zod';
import { token } from '#shared/schemas/account.ts';
import { glider } from '#shared/schemas/glider.ts';
import {
  member,
  memberInput,
  memberList,
  ownershipInput,
  readLinkState,
  sharedGlider,
} from '#shared/schemas/sharing.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { getReadLink, readShared, switchReadLinkOff, switchReadLinkOn } from '#server/services/read-links.ts';
import { changeMember, handOver, leaveGlider, listMembers, removeMember } from '#server/services/sharing.ts';
import { idParams } from './inputs.ts';

const tag = 'Sharing';
const access = 'signed-in';
const memberParams = z.object({ id: z.uuid(), userId: z.uuid() });
const tokenParams = z.object({ token });

export const sharingEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/gliders/:id/members',
    tag,
    summary: 'Who is what to a glider',
    access,
    params: idParams,
    answer: { status: 200, schema: memberList },
    handle: async ({ actor, params }) => ({ body: await listMembers(actor, params.id) }),
  }),
  endpoint({
    method: 'put',
    path: '/gliders/:id/members/:userId',
    tag,
    summary: 'Give a member another role',
    access,
    params: memberParams,
    body: memberInput,
    answer: { status: 200, schema: member },
    handle: async ({ actor, params, body }) => ({
      body: await changeMember(actor, params.id, params.userId, body.role),
    }),
  }),
  endpoint({
    method: 'delete',
    path: '/gliders/:id/members/:userId',
    tag,
    summary: 'Remove a member',
    access,
    params: memberParams,
    answer: { status: 204 },
    handle: async ({ actor, params }) => {
      await removeMember(actor, params.id, params.userId);
      return {};
    },
  }),
  endpoint({
    method: 'delete',
    path: '/gliders/:id/membership',
    tag,
    summary: 'Leave a glider of somebody else',
    access,
    params: idParams,
    answer: { status: 204 },
    handle: async ({ actor, params }) => {
      await leaveGlider(actor, params.id);
      return {};
    },
  }),
  endpoint({
    method: 'post',
    path: '/gliders/:id/ownership',
    tag,
    summary: 'Hand a glider over to a member; who owned it becomes a builder',
    access,
    params: idParams,
    body: ownershipInput,
    answer: { status: 200, schema: glider },
    problems: ['already_member'],
    handle: async ({ actor, params, body }) => ({ body: await handOver(actor, params.id, body.userId) }),
  }),
  endpoint({
    method: 'get',
    path: '/gliders/:id/link',
    tag,
    summary: 'The read-only link of a glider; null while it is off',
    access,
    params: idParams,
    answer: { status: 200, schema: readLinkState },
    handle: async ({ actor, params }) => ({ body: await getReadLink(actor, params.id) }),
  }),
  endpoint({
    method: 'post',
    path: '/gliders/:id/link',
    tag,
    summary: 'Switch the read-only link on; the one that is there stays',
    access,
    params: idParams,
    answer: { status: 200, schema: readLinkState },
    handle: async ({ actor, params }) => ({ body: await switchReadLinkOn(actor, params.id) }),
  }),
  endpoint({
    method: 'delete',
    path: '/gliders/:id/link',
    tag,
    summary: 'Switch the read-only link off for good',
    access,
    params: idParams,
    answer: { status: 204 },
    handle: async ({ actor, params }) => {
      await switchReadLinkOff(actor, params.id);
      return {};
    },
  }),
  endpoint({
    method: 'get',
    path: '/shared/:token',
    tag,
    summary: 'The glider behind a read-only link',
    access: 'public',
    limits: ['linkGuesses'],
    params: tokenParams,
    answer: { status: 200, schema: sharedGlider },
    problems: ['not_found'],
    handle: async ({ params }) => ({ body: await readShared(params.token) }),
  }),
];
