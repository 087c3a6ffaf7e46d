import { buildTerms, buildTermsInput } from '#shared/schemas/weighing.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { getBuildTerms, saveBuildTerms } from '#server/services/build-terms.ts';
import { idParams } from './inputs.ts';

const tag = 'As built';

export const buildTermsEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/gliders/:id/build-terms',
    tag,
    summary: 'Target mass, class window and the ballast at hand; version 1 and empty while nobody has said',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: buildTerms, etag: true },
    handle: async ({ actor, params }) => {
      const found = await getBuildTerms(actor, params.id);
      return { body: found, version: found.version };
    },
  }),
  endpoint({
    method: 'put',
    path: '/gliders/:id/build-terms',
    tag,
    summary: 'Say what a glider is built to; a stale version is answered with the current terms as `current`',
    access: 'signed-in',
    ifMatch: true,
    params: idParams,
    body: buildTermsInput,
    answer: { status: 200, schema: buildTerms, etag: true },
    handle: async ({ actor, params, ifMatch, body }) => {
      const saved = await saveBuildTerms(actor, params.id, ifMatch, body);
      return { body: saved, version: saved.version };
    },
  }),
];
