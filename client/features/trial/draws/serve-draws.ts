import { workOut, type AnswerOf, type DrawTask } from './tasks.ts';

/** One question of a subject; a newer one of the same subject takes its place, and `null` calls it off. */
export interface DrawRequest {
  subject: string;
  id: number;
  task: DrawTask | null;
}

export type DrawReply = { subject: string; id: number } & (
  | { type: 'progress'; done: number }
  | { type: 'answer'; answer: AnswerOf<DrawTask> }
  | { type: 'failed'; problem: string }
);

/** Where requests come from and replies go: the worker's own scope, or one end of a channel. */
export interface DrawPort {
  postMessage: (reply: DrawReply) => void;
  addEventListener: (type: 'message', listener: (event: MessageEvent<DrawRequest>) => void) => void;
}

/** Work done without listening, ms: no request waits longer, and no page shows progress more often. */
const STRETCH = 20;

/** Answers requests for good: subjects take turns, and a request that another has overtaken ends unanswered. */
export function serveDraws(port: DrawPort): void {
  const newest = new Map<string, number>();
  port.addEventListener('message', ({ data: { subject, id, task } }) => {
    if (!task) {
      newest.delete(subject);
      return;
    }
    newest.set(subject, id);
    void work(port, { subject, id }, task, () => newest.get(subject) === id);
  });
}

async function work(
  port: DrawPort,
  head: { subject: string; id: number },
  task: DrawTask,
  isWanted: () => boolean,
): Promise<void> {
  try {
    // Requests that lie ready are looked at first: of ten keys typed meanwhile only the last is drawn.
    await turn();
    if (!isWanted()) return;
    const steps = workOut(task);
    let rested = performance.now();
    let step = steps.next();
    while (step.done !== true) {
      if (performance.now() - rested > STRETCH) {
        port.postMessage({ ...head, type: 'progress', done: step.value });
        await turn();
        if (!isWanted()) return;
        rested = performance.now();
      }
      step = steps.next();
    }
    port.postMessage({ ...head, type: 'answer', answer: step.value });
  } catch (error) {
    const problem = error instanceof Error ? error.message : String(error);
    port.postMessage({ ...head, type: 'failed', problem });
  }
}

/** Lets messages that have come in be heard; a timer would wait four milliseconds each time. */
function turn(): Promise<void> {
  return new Promise((resolve) => {
    const { port1, port2 } = new MessageChannel();
    port1.addEventListener(
      'message',
      () => {
        port1.close();
        resolve();
      },
      { once: true },
    );
    port1.start();
    port2.postMessage(null);
  });
}
