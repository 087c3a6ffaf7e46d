import { describe, expect, it } from 'vitest';
import { BoundedQueue, QueueFull } from '#server/bounded-queue.ts';

/** A task that ends when told to. */
function held() {
  let release = () => {};
  const gate = new Promise<void>((resolve) => (release = resolve));
  return { task: () => gate, release };
}

describe('a bounded queue', () => {
  it('runs no more at once than it may, and the rest in the order they came', async () => {
    const queue = new BoundedQueue({ atOnce: 2, mostWaiting: 10 });
    const order: number[] = [];
    let running = 0;
    let most = 0;
    await Promise.all(
      Array.from({ length: 6 }, (_, i) =>
        queue.run(async () => {
          most = Math.max(most, (running += 1));
          order.push(i);
          await new Promise((resolve) => setImmediate(resolve));
          running -= 1;
        }),
      ),
    );
    expect(most).toBe(2);
    expect(order).toEqual([0, 1, 2, 3, 4, 5]);
  });

  it('refuses at once what finds no place to wait, and takes more when there is room again', async () => {
    const queue = new BoundedQueue({ atOnce: 1, mostWaiting: 1 });
    const first = held();
    const running = queue.run(first.task);
    const waiting = queue.run(async () => 'waited');
    await expect(queue.run(async () => 'refused')).rejects.toThrow(QueueFull);
    first.release();
    await running;
    expect(await waiting).toBe('waited');
    expect(await queue.run(async () => 'later')).toBe('later');
  });

  it('gives the place of a task that failed to the next', async () => {
    const queue = new BoundedQueue({ atOnce: 1, mostWaiting: 1 });
    const failing = queue.run(async () => {
      throw new Error('no');
    });
    const next = queue.run(async () => 'next');
    await expect(failing).rejects.toThrow('no');
    expect(await next).toBe('next');
  });
});
