import { z } from 'zod';
import { endpoint, type Endpoint } from '#server/http/endpoint.ts';
import { checkHealth } from '#server/services/health.ts';

export const health = z.strictObject({ status: z.literal('ok') });

export const healthEndpoints: Endpoint[] = [
  endpoint({
    method: 'get',
    path: '/health',
    tag: 'Service',
    summary: 'Whether the service and its database answer',
    access: 'public',
    answer: { status: 200, schema: health },
    problems: ['unavailable'],
    handle: async () => ({ body: await checkHealth() }),
  }),
];
