import { parentPort } from 'node:worker_threads';
import { estimate } from '#shared/core/estimate.ts';
import type { Plan } from '#shared/core/plan.ts';

/** In a worker thread: answers each plan with its estimate. */
parentPort?.on('message', (plan: Plan) => parentPort?.postMessage(estimate(plan)));
