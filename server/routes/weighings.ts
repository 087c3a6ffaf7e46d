import { weighing, weighingInput, weighingList } from '#shared/schemas/weighing.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { addWeighing, listWeighings } from '#server/services/weighings.ts';
import { idParams } from './inputs.ts';

const tag = 'As built';

export const weighingEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/gliders/:id/weighings',
    tag,
    summary: 'What was weighed while a glider was built, corrected weighings with it, in order',
    access: 'signed-in',
    params: idParams,
    answer: { status: 200, schema: weighingList },
    handle: async ({ actor, params }) => ({ body: await listWeighings(actor, params.id) }),
  }),
  endpoint({
    method: 'post',
    path: '/gliders/:id/weighings',
    tag,
    summary: 'Write a weighing down, or one that corrects another; neither ever changes',
    access: 'signed-in',
    idempotent: true,
    params: idParams,
    body: weighingInput,
    answer: { status: 201, schema: weighing },
    problems: ['corrected_already'],
    handle: async ({ actor, params, body, idempotencyKey }) => ({
      body: await addWeighing(actor, params.id, body, idempotencyKey),
    }),
  }),
];
