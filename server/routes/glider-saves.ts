import { glider } from '#shared/schemas/glider.ts';
import { gliderSave, gliderSaveList, gliderState, saveNameInput } from '#shared/schemas/glider-save.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { getGliderState, listGliderSaves, nameGliderSave } from '#server/services/glider-log.ts';
import { restoreGlider } from '#server/services/glider-saving.ts';
import { idParams, pageQuery, versionParams } from './inputs.ts';

const tag = 'Log';

export const gliderSaveEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/gliders/:id/saves',
    tag,
    summary: 'Every saved state of a glider, newest first: who, when, and what changed',
    access: 'signed-in',
    params: idParams,
    query: pageQuery,
    answer: { status: 200, schema: gliderSaveList },
    handle: async ({ actor, params, query }) => ({ body: await listGliderSaves(actor, params.id, query) }),
  }),
  endpoint({
    method: 'get',
    path: '/gliders/:id/saves/:version',
    tag,
    summary: 'A saved state with its plan',
    access: 'signed-in',
    params: versionParams,
    answer: { status: 200, schema: gliderState },
    handle: async ({ actor, params }) => ({ body: await getGliderState(actor, params.id, params.version) }),
  }),
  endpoint({
    method: 'post',
    path: '/gliders/:id/saves/:version/restore',
    tag,
    summary: 'Bring a saved state back as a new save',
    access: 'signed-in',
    ifMatch: true,
    params: versionParams,
    answer: { status: 200, schema: glider, etag: true },
    handle: async ({ actor, params, ifMatch }) => {
      const saved = await restoreGlider(actor, params.id, params.version, ifMatch);
      return { body: saved, version: saved.version };
    },
  }),
  endpoint({
    method: 'put',
    path: '/gliders/:id/saves/:version/name',
    tag,
    summary: 'Name a saved state; an empty name takes its name away',
    access: 'signed-in',
    params: versionParams,
    body: saveNameInput,
    answer: { status: 200, schema: gliderSave },
    handle: async ({ actor, params, body }) => ({
      body: await nameGliderSave(actor, params.id, params.version, body.name),
    }),
  }),
];
