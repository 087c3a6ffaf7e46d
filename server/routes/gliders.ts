import { glider, gliderInput, gliderList } from '#shared/schemas/glider.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { listGliders } from '#server/services/glider-lists.ts';
import { saveGlider } from '#server/services/glider-saving.ts';
import { createGlider, deleteGlider, getGlider } from '#server/services/gliders.ts';
import { gliderQuery, idParams } from './inputs.ts';

const tag = 'Gliders';

export const gliderEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/gliders',
    tag,
    summary: 'Your gliders and those shared with you, in the order asked for',
    access: 'signed-in',
    query: gliderQuery,
    answer: { status: 200, schema: gliderList },
    handle: async ({ actor, query }) => ({ body: await listGliders(actor, query) }),
  }),
  endpoint({
    method: 'post',
    path: '/gliders',
    tag,
    summary: 'Make a glider from a plan',
    access: 'signed-in',
    idempotent: true,
    body: gliderInput,
    answer: { status: 201, schema: glider, etag: true },
    handle: async ({ actor, body, idempotencyKey }) => {
      const made = await createGlider(actor, body.plan, idempotencyKey);
      return { body: made, version: made.version, location: `/api/gliders/${made.id}` };
    },
  }),
  endpoint({
    method: 'get',
    path: '/gliders/:id',
    tag,
    summary: 'A glider with its plan',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: glider, etag: true },
    handle: async ({ actor, params }) => {
      const found = await getGlider(actor, params.id);
      return { body: found, version: found.version };
    },
  }),
  endpoint({
    method: 'put',
    path: '/gliders/:id',
    tag,
    summary: 'Save a glider’s plan; a stale version is answered with the current glider as `current`',
    access: 'signed-in',
    ifMatch: true,
    params: idParams,
    body: gliderInput,
    answer: { status: 200, schema: glider, etag: true },
    handle: async ({ actor, params, ifMatch, body }) => {
      const saved = await saveGlider(actor, params.id, { version: ifMatch, plan: body.plan });
      return { body: saved, version: saved.version };
    },
  }),
  endpoint({
    method: 'delete',
    path: '/gliders/:id',
    tag,
    summary: 'Delete a glider with its saves and sheets',
    access: 'signed-in',
    params: idParams,
    answer: { status: 204 },
    handle: async ({ actor, params }) => {
      await deleteGlider(actor, params.id);
      return {};
    },
  }),
];
