import { describe, expect, it } from 'vitest';
import { serveDraws, type DrawReply, type DrawRequest } from '#client/features/trial/draws/serve-draws.ts';
import { USUAL_SETTINGS } from '#client/features/trial/draws/settings.ts';
import { workOut, type FiguresTask } from '#client/features/trial/draws/tasks.ts';
import { demoPlan, planOf } from '#tests/support/plans.ts';

const task = (seed: number, draws = 2_000): FiguresTask => ({
  of: 'figures',
  plan: demoPlan('dunlin'),
  settings: { ...USUAL_SETTINGS, seed, draws },
});

/** Talks to the worker's side over a channel, as the page does to the worker. */
function served() {
  const { port1, port2 } = new MessageChannel();
  const replies: DrawReply[] = [];
  const waiting: { until: (reply: DrawReply) => boolean; done: (reply: DrawReply) => void }[] = [];
  port2.addEventListener('message', ({ data }: MessageEvent<DrawReply>) => {
    replies.push(data);
    waiting.filter(({ until }) => until(data)).forEach(({ done }) => done(data));
  });
  port2.start();
  serveDraws({
    postMessage: (reply) => port1.postMessage(reply),
    addEventListener: (type, listener) => port1.addEventListener(type, listener),
  });
  port1.start();
  return {
    replies,
    ask: (subject: string, id: number, asked: DrawRequest['task']) =>
      port2.postMessage({ subject, id, task: asked } satisfies DrawRequest),
    reply: (until: (reply: DrawReply) => boolean) =>
      new Promise<DrawReply>((done) => waiting.push({ until, done })),
    close: () => port1.close(),
  };
}

const isEnd = (id: number) => (reply: DrawReply) => reply.id === id && reply.type !== 'progress';
/** More than are drawn before the next message is heard. */
const MANY = 1_000_000;

describe('the worker', () => {
  it('answers with what the task works out to', async () => {
    const { ask, reply, close } = served();
    const answered = reply(isEnd(1));
    ask('a', 1, task(3));
    const steps = workOut(task(3));
    let step = steps.next();
    while (step.done !== true) step = steps.next();
    expect(await answered).toEqual({ subject: 'a', id: 1, type: 'answer', answer: step.value });
    close();
  });

  it('draws only the newest of what a subject asks, even one asked in the middle', async () => {
    const { ask, reply, replies, close } = served();
    const last = reply(isEnd(4));
    ask('a', 1, task(1));
    ask('a', 2, task(2));
    ask('a', 3, task(3, MANY));
    await reply(({ id, type }) => id === 3 && type === 'progress');
    ask('a', 4, task(4));
    await last;
    expect(replies.filter(({ type }) => type !== 'progress').map(({ id }) => id)).toEqual([4]);
    close();
  });

  it('stops what is called off', async () => {
    const { ask, reply, replies, close } = served();
    ask('a', 1, task(1, MANY));
    await reply(({ type }) => type === 'progress');
    ask('a', 1, null);
    // As long as a million draws take, and more: what was called off would have ended long before.
    const other = reply(isEnd(2));
    ask('b', 2, task(1, MANY));
    await other;
    expect(replies.some(isEnd(1))).toBe(false);
    close();
  });

  it('lets subjects take turns: a short one is not kept waiting by a long one', async () => {
    const { ask, reply, replies, close } = served();
    ask('long', 1, task(1, MANY));
    const short = reply(isEnd(2));
    ask('short', 2, task(1));
    await short;
    expect(replies.some(isEnd(1))).toBe(false);
    ask('long', 3, null);
    close();
  });

  it('says what is wrong with a plan that cannot be drawn', async () => {
    const { ask, reply, close } = served();
    const [solid] = demoPlan('dunlin').solids;
    const broken = planOf([], { solids: [{ ...solid!, material: 'nothing' }] });
    const failed = reply(isEnd(1));
    ask('a', 1, { ...task(1), plan: broken });
    expect(await failed).toMatchObject({ type: 'failed', problem: 'the plan has no material “nothing”' });
    close();
  });
});
