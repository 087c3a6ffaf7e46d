import { availableParallelism } from 'node:os';
import { Worker } from 'node:worker_threads';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { BoundedQueue } from '#server/bounded-queue.ts';

/** The estimate was given up. */
export class TookTooLong extends Error {}

/** Threads that estimate large plans, so that the rest of the service goes on meanwhile. Started when first needed. */
export class EstimateWorkers {
  readonly #patienceMs: number;
  readonly #queue: BoundedQueue;
  readonly #idle: Worker[] = [];

  constructor({
    atOnce = Math.max(1, availableParallelism() - 1),
    mostWaiting = 16,
    patienceMs = 10_000,
  } = {}) {
    this.#patienceMs = patienceMs;
    this.#queue = new BoundedQueue({ atOnce, mostWaiting });
  }

  /**
   * @throws TookTooLong
   * @throws QueueFull when as many plans are waiting already as may
   */
  estimate(plan: Plan): Promise<Estimate> {
    return this.#queue.run(() => this.#work(this.#idle.pop() ?? this.#start(), plan));
  }

  #start(): Worker {
    const worker = new Worker(new URL('./estimate-worker.mjs', import.meta.url), {
      resourceLimits: { maxOldGenerationSizeMb: 1_024 },
    });
    // Also between two plans a thread may die; it must not take the program with it.
    worker.on('error', () => {
      const place = this.#idle.indexOf(worker);
      if (place >= 0) this.#idle.splice(place, 1);
    });
    return worker;
  }

  async #work(worker: Worker, plan: Plan): Promise<Estimate> {
    worker.ref();
    try {
      const result = await this.#answer(worker, plan);
      // An idle thread does not keep the program from ending.
      worker.unref();
      this.#idle.push(worker);
      return result;
    } catch (error) {
      void worker.terminate();
      throw error;
    }
  }

  #answer(worker: Worker, plan: Plan): Promise<Estimate> {
    return new Promise<Estimate>((resolve, reject) => {
      const timer = setTimeout(() => settle(() => reject(new TookTooLong())), this.#patienceMs);
      const answered = (result: Estimate) => settle(() => resolve(result));
      const failed = (error: unknown) => settle(() => reject(error));
      const settle = (done: () => void) => {
        clearTimeout(timer);
        worker.off('message', answered).off('error', failed);
        done();
      };
      worker.on('message', answered).on('error', failed);
      worker.postMessage(plan);
    });
  }
}
