import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Drawer, type DrawWorker } from '#client/features/trial/draws/drawer.ts';
import type { DrawReply, DrawRequest } from '#client/features/trial/draws/serve-draws.ts';
import { USUAL_SETTINGS } from '#client/features/trial/draws/settings.ts';
import type { ChancesTask } from '#client/features/trial/draws/tasks.ts';

const task: ChancesTask = { of: 'chances', plans: [], limits: {}, settings: USUAL_SETTINGS };

interface FakeWorker extends DrawWorker {
  requests: DrawRequest[];
  ended: boolean;
  answer: (subject: string, id: number) => void;
  fail: () => void;
}

function drawerWithWorkers() {
  const workers: FakeWorker[] = [];
  const drawer = new Drawer(() => {
    const target = new EventTarget();
    const worker: FakeWorker = {
      requests: [],
      ended: false,
      postMessage: (request) => worker.requests.push(request),
      addEventListener: (type: string, listener: (event: never) => void) =>
        target.addEventListener(type, (event) => listener(event as never)),
      terminate: () => {
        worker.ended = true;
      },
      answer: (subject, id) => {
        const data: DrawReply = { subject, id, type: 'answer', answer: [] };
        target.dispatchEvent(new MessageEvent('message', { data }));
      },
      fail: () => target.dispatchEvent(new Event('error')),
    };
    workers.push(worker);
    return worker;
  });
  const heard: DrawReply[] = [];
  return { drawer, workers, heard, listen: (reply: DrawReply) => void heard.push(reply) };
}

describe('the page’s side of the draws', () => {
  beforeEach(() => void vi.useFakeTimers());
  afterEach(() => void vi.useRealTimers());

  it('starts one worker for all that ask and ends it with the last of them', () => {
    const { drawer, workers, listen } = drawerWithWorkers();
    drawer.ask('a', task, listen);
    drawer.ask('b', task, listen);
    expect(workers).toHaveLength(1);
    drawer.cancel('a');
    expect(workers[0]!.ended).toBe(false);
    expect(workers[0]!.requests.at(-1)).toEqual({ subject: 'a', id: 1, task: null });
    drawer.cancel('b');
    vi.runAllTimers();
    expect(workers[0]!.ended).toBe(true);
    drawer.ask('a', task, listen);
    expect(workers).toHaveLength(2);
  });

  it('keeps the worker from one question to the next, and ends what the one before set going', () => {
    const { drawer, workers, listen } = drawerWithWorkers();
    drawer.ask('a', task, listen);
    drawer.cancel('a');
    drawer.ask('a', task, listen);
    vi.runAllTimers();
    expect(workers).toHaveLength(1);
    expect(workers[0]!.ended).toBe(false);
    expect(workers[0]!.requests.map((request) => request.task === null)).toEqual([false, true, false]);
  });

  it('hears the answer to the newest question only, and none once it is called off', () => {
    const { drawer, workers, heard, listen } = drawerWithWorkers();
    drawer.ask('other', task, listen);
    drawer.ask('a', task, listen);
    drawer.ask('a', task, listen);
    workers[0]!.answer('a', 2);
    expect(heard).toEqual([]);
    workers[0]!.answer('a', 3);
    expect(heard.map(({ id }) => id)).toEqual([3]);
    drawer.cancel('a');
    workers[0]!.answer('a', 3);
    expect(heard).toHaveLength(1);
  });

  it('tells everybody when the worker breaks, and starts another with the next question', () => {
    const { drawer, workers, heard, listen } = drawerWithWorkers();
    drawer.ask('a', task, listen);
    drawer.ask('b', task, listen);
    workers[0]!.fail();
    expect(heard.map(({ subject, type }) => [subject, type])).toEqual([
      ['a', 'failed'],
      ['b', 'failed'],
    ]);
    drawer.ask('a', task, listen);
    expect(workers).toHaveLength(2);
    workers[1]!.answer('a', 3);
    expect(heard.at(-1)).toMatchObject({ id: 3, type: 'answer' });
  });
});
