import { archiveInput, copiesInput, gliderCopies, gliderSummary } from '#shared/schemas/glider.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { archiveGlider, copyGliders } from '#server/services/glider-bench.ts';
import { idParams } from './inputs.ts';

const tag = 'Gliders';

export const gliderBenchEndpoints: Endpoint[] = [
  endpoint({
    method: 'post',
    path: '/gliders/copies',
    tag,
    summary: 'Copy gliders, all of them or none, as your own',
    access: 'signed-in',
    idempotent: true,
    body: copiesInput,
    answer: { status: 201, schema: gliderCopies },
    problems: ['not_found'],
    handle: async ({ actor, body, idempotencyKey }) => ({
      body: await copyGliders(actor, body.ids, idempotencyKey),
    }),
  }),
  endpoint({
    method: 'put',
    path: '/gliders/:id/archived',
    tag,
    summary: 'Put a glider out of the way, or take it back',
    access: 'signed-in',
    params: idParams,
    body: archiveInput,
    answer: { status: 200, schema: gliderSummary },
    handle: async ({ actor, params, body }) => ({
      body: await archiveGlider(actor, params.id, body.archived),
    }),
  }),
];
