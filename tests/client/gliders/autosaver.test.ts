// @vitest-environment happy-dom
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Autosaver } from '#client/features/gliders/autosaver.ts';
import { saveStateOf, type Draft, type Kept } from '#client/features/gliders/desk-state.ts';
import type { Trail } from '#client/features/gliders/history-shelf.ts';
import { ApiError, NetworkError } from '#client/lib/api.ts';
import type { Plan } from '#shared/core/plan.ts';
import { keptAt, naming, planNamed } from './plans.ts';

type Send = (plan: Plan, version: number) => Promise<Kept>;

function desk(send: Send, draft: Draft | null = null) {
  const shelf = { take: () => draft, put: vi.fn<(draft: Draft) => void>(), clear: vi.fn<() => void>() };
  const trail = { take: () => null, put: vi.fn<(trail: Trail) => void>() };
  const saver = new Autosaver({ kept: keptAt(3, planNamed('Plover')), shelf, trail, send });
  return { saver, shelf, trail, stop: saver.start() };
}
const edit = (saver: Autosaver, name: string) =>
  saver.dispatch({ type: 'edited', recipe: naming(name), what: name, at: Date.now() });
const saves: Send = (plan, version) => Promise.resolve(keptAt(version + 1, plan));

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

describe('autosaver', () => {
  it('sends once after a quiet moment, with the version that was changed', async () => {
    const send = vi.fn<Send>(saves);
    const { saver } = desk(send);
    edit(saver, 'a');
    await vi.advanceTimersByTimeAsync(500);
    edit(saver, 'ab');
    await vi.advanceTimersByTimeAsync(599);
    expect(send).not.toHaveBeenCalled();
    await vi.advanceTimersByTimeAsync(1);
    expect(send).toHaveBeenCalledExactlyOnceWith(planNamed('ab'), 3);
    expect(saveStateOf(saver.getDesk())).toBe('saved');
  });

  it('never has two saves on their way', async () => {
    let answer: (kept: Kept) => void = () => undefined;
    const send = vi.fn<Send>(() => new Promise((resolve) => (answer = resolve)));
    const { saver } = desk(send);
    edit(saver, 'a');
    await vi.advanceTimersByTimeAsync(600);
    edit(saver, 'b');
    await vi.advanceTimersByTimeAsync(5000);
    expect(send).toHaveBeenCalledTimes(1);
    answer(keptAt(4, planNamed('a')));
    await vi.advanceTimersByTimeAsync(600);
    expect(send).toHaveBeenLastCalledWith(planNamed('b'), 4);
  });

  it('tries again by itself on a broken line, and at once when it is back', async () => {
    const send = vi.fn<Send>(() => Promise.reject(new NetworkError(null)));
    const { saver } = desk(send);
    edit(saver, 'a');
    await vi.advanceTimersByTimeAsync(600);
    expect(saveStateOf(saver.getDesk())).toBe('offline');
    await vi.advanceTimersByTimeAsync(2000);
    expect(send).toHaveBeenCalledTimes(2);
    send.mockImplementation(saves);
    dispatchEvent(new Event('online'));
    await vi.advanceTimersByTimeAsync(0);
    expect(saveStateOf(saver.getDesk())).toBe('saved');
  });

  it('keeps unsent edits on the shelf until they are acknowledged', async () => {
    const { saver, shelf } = desk(saves);
    edit(saver, 'a');
    dispatchEvent(new Event('pagehide'));
    expect(shelf.put).toHaveBeenLastCalledWith(expect.objectContaining({ version: 3, plan: planNamed('a') }));
    shelf.clear.mockClear();
    await vi.advanceTimersByTimeAsync(1000);
    expect(shelf.clear).toHaveBeenCalled();
  });

  it('does not try again what was refused, until something changes', async () => {
    const details = {
      type: 'about:blank',
      title: 'Signed out',
      status: 401,
      code: 'signed_out',
      detail: 'Sign in.',
    };
    const send = vi.fn<Send>(() => Promise.reject(new ApiError(details)));
    const { saver } = desk(send);
    edit(saver, 'a');
    await vi.advanceTimersByTimeAsync(60_000);
    expect(send).toHaveBeenCalledTimes(1);
    expect(saver.getDesk()).toMatchObject({ phase: 'refused', signedOut: true });
    edit(saver, 'b');
    await vi.advanceTimersByTimeAsync(600);
    expect(send).toHaveBeenCalledTimes(2);
  });

  it('sends what is ready when the glider is closed', async () => {
    const send = vi.fn<Send>(saves);
    const { saver, stop } = desk(send);
    edit(saver, 'a');
    stop();
    expect(send).toHaveBeenCalledTimes(1);
  });

  it('keeps the steps that can be taken back, also once all is saved', async () => {
    const { saver, trail } = desk(saves);
    edit(saver, 'a');
    await vi.advanceTimersByTimeAsync(1000);
    expect(saveStateOf(saver.getDesk())).toBe('saved');
    expect(trail.put.mock.lastCall?.[0].past).toHaveLength(1);
  });

  it('saves what waits before an older state is brought back over it', async () => {
    const send = vi.fn<Send>(saves);
    const { saver } = desk(send);
    edit(saver, 'a');
    const restore = vi.fn<(version: number) => Promise<Kept>>((version) =>
      Promise.resolve(keptAt(version + 1, planNamed('old'))),
    );
    await saver.bringBack(restore);
    expect(send).toHaveBeenCalledExactlyOnceWith(planNamed('a'), 3);
    expect(restore).toHaveBeenCalledExactlyOnceWith(4);
    expect(saver.getDesk()).toMatchObject({ base: { version: 5 }, history: { present: { name: 'old' } } });
    await vi.advanceTimersByTimeAsync(5000);
    expect(send).toHaveBeenCalledTimes(1);
  });

  it('brings nothing back over edits that cannot be saved', async () => {
    const { saver } = desk(saves);
    edit(saver, '');
    const restore = vi.fn<(version: number) => Promise<Kept>>();
    await expect(saver.bringBack(restore)).rejects.toThrow('not saved yet');
    expect(restore).not.toHaveBeenCalled();
  });

  it('keeps what lies on the desk when bringing back does not work', async () => {
    const { saver } = desk(saves);
    await expect(saver.bringBack(() => Promise.reject(new NetworkError(null)))).rejects.toThrow('reached');
    expect(saver.getDesk()).toMatchObject({ base: { version: 3 }, history: { present: { name: 'Plover' } } });
    expect(saveStateOf(saver.getDesk())).toBe('saved');
  });
});
