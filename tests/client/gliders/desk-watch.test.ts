// @vitest-environment happy-dom
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { DeskWatch } from '#client/features/gliders/desk-watch.ts';

let stops: (() => void)[] = [];

function watching(latest: () => Promise<number>, known = 3) {
  const refresh = vi.fn<() => Promise<void>>(() => Promise.resolve());
  const asked = vi.fn<() => Promise<number>>(latest);
  const watch = new DeskWatch({ known: () => known, latest: asked, refresh, channel: 'glider' });
  stops.push(watch.start());
  return { watch, asked, refresh };
}

beforeEach(() => void vi.useFakeTimers());
afterEach(() => {
  for (const stop of stops) stop();
  stops = [];
  vi.useRealTimers();
});

describe('the watch over the version', () => {
  it('looks every half minute and fetches only what is newer', async () => {
    const { asked, refresh } = watching(() => Promise.resolve(3));
    await vi.advanceTimersByTimeAsync(60_000);
    expect(asked).toHaveBeenCalledTimes(2);
    expect(refresh).not.toHaveBeenCalled();
    asked.mockResolvedValue(4);
    await vi.advanceTimersByTimeAsync(30_000);
    expect(refresh).toHaveBeenCalledTimes(1);
  });

  it('looks on coming back to the window and when the line is back', async () => {
    const { asked } = watching(() => Promise.resolve(3));
    dispatchEvent(new Event('focus'));
    await vi.advanceTimersByTimeAsync(0);
    dispatchEvent(new Event('online'));
    await vi.advanceTimersByTimeAsync(0);
    expect(asked).toHaveBeenCalledTimes(2);
  });

  it('never has two questions on their way, and outlives one that fails', async () => {
    let fail: (error: Error) => void = () => undefined;
    const { watch, asked } = watching(() => new Promise((_, reject) => (fail = reject)));
    watch.look();
    watch.look();
    expect(asked).toHaveBeenCalledTimes(1);
    fail(new Error('no line'));
    await vi.advanceTimersByTimeAsync(0);
    watch.look();
    expect(asked).toHaveBeenCalledTimes(2);
  });

  it('stops when the glider is closed', async () => {
    const { asked } = watching(() => Promise.resolve(3));
    stops.pop()?.();
    dispatchEvent(new Event('focus'));
    await vi.advanceTimersByTimeAsync(60_000);
    expect(asked).not.toHaveBeenCalled();
  });
});
