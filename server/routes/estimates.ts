import { estimate as estimateSchema, estimateInput } from '#shared/schemas/estimate.ts';
import { estimatePlan } from '#server/estimating/estimate-plan.ts';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';

export const estimateEndpoints: Endpoint[] = [
  endpoint({
    method: 'post',
    path: '/estimates',
    tag: 'Estimates',
    summary: 'Mass, balance and loading of a plan; nothing is kept',
    access: 'public',
    limits: ['estimates'],
    body: estimateInput,
    answer: { status: 200, schema: estimateSchema },
    handle: async ({ body }) => ({ body: await estimatePlan(body.plan) }),
  }),
];
