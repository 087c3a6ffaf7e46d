import { gliderTrials, trialsInput } from '#shared/schemas/trials.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { getGliderTrials, saveGliderTrials } from '#server/services/glider-trials.ts';
import { idParams } from './inputs.ts';

const tag = 'Wood';

export const gliderTrialsEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/gliders/:id/trials',
    tag,
    summary: 'Wood trials kept with a glider; version 1 and empty while nobody has kept any',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: gliderTrials, etag: true },
    handle: async ({ actor, params }) => {
      const found = await getGliderTrials(actor, params.id);
      return { body: found, version: found.version };
    },
  }),
  endpoint({
    method: 'put',
    path: '/gliders/:id/trials',
    tag,
    summary: 'Keep the whole list of trials; a stale version is answered with the current list as `current`',
    access: 'signed-in',
    ifMatch: true,
    params: idParams,
    body: trialsInput,
    answer: { status: 200, schema: gliderTrials, etag: true },
    handle: async ({ actor, params, ifMatch, body }) => {
      const saved = await saveGliderTrials(actor, params.id, ifMatch, body);
      return { body: saved, version: saved.version };
    },
  }),
];
