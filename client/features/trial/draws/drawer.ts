import type { DrawReply, DrawRequest } from './serve-draws.ts';
import type { DrawTask } from './tasks.ts';

/** The worker as far as it is used here. */
export interface DrawWorker {
  postMessage: (request: DrawRequest) => void;
  addEventListener: {
    (type: 'message', listener: (event: MessageEvent<DrawReply>) => void): void;
    (type: 'error', listener: (event: Event) => void): void;
  };
  terminate: () => void;
}

type Listener = (reply: DrawReply) => void;

/** How long a worker waits for the next task before it is ended, ms: a new question mostly follows the old at once. */
const IDLE = 2_000;

/** Hands tasks to one worker, which is started with the first and ended soon after the last that listens. */
export class Drawer {
  readonly #start: () => DrawWorker;
  #worker: DrawWorker | null = null;
  #last = 0;
  #ending: ReturnType<typeof setTimeout> | undefined;
  readonly #subjects = new Map<string, { id: number; listener: Listener }>();

  constructor(start: () => DrawWorker) {
    this.#start = start;
  }

  /** Asks; whatever the subject asked before is called off. Answers of the newest request only reach `listener`. */
  ask(subject: string, task: DrawTask, listener: Listener): void {
    clearTimeout(this.#ending);
    const id = ++this.#last;
    this.#subjects.set(subject, { id, listener });
    this.#send({ subject, id, task });
  }

  /** Calls off what the subject asked; it hears no more. */
  cancel(subject: string): void {
    const asked = this.#subjects.get(subject);
    if (!asked) return;
    this.#subjects.delete(subject);
    if (this.#worker) this.#send({ subject, id: asked.id, task: null });
    clearTimeout(this.#ending);
    if (this.#subjects.size === 0) this.#ending = setTimeout(() => this.#end(), IDLE);
  }

  #send(request: DrawRequest): void {
    this.#worker ??= this.#listening(this.#start());
    this.#worker.postMessage(request);
  }

  #listening(worker: DrawWorker): DrawWorker {
    worker.addEventListener('message', ({ data }) => {
      const asked = this.#subjects.get(data.subject);
      if (asked?.id === data.id) asked.listener(data);
    });
    worker.addEventListener('error', (event) => {
      // The file could not be fetched, or memory is at its end: the next request starts another.
      event.preventDefault();
      if (this.#worker === worker) this.#end();
      for (const [subject, { id, listener }] of this.#subjects) {
        listener({ subject, id, type: 'failed', problem: 'The draws could not be started.' });
      }
    });
    return worker;
  }

  #end(): void {
    this.#worker?.terminate();
    this.#worker = null;
  }
}

/** The one of this page. */
export const drawer = new Drawer(
  () => new Worker(new URL('./draws-worker.ts', import.meta.url), { type: 'module', name: 'draws' }),
);
