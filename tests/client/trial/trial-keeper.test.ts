import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { TrialKeeper } from '#client/features/trial/trial-keeper.ts';
import type { TrialDraft } from '#client/features/trial/trial-desk.ts';
import { ApiError, NetworkError } from '#client/lib/api.ts';
import type { GliderTrialsDto, TrialsInput } from '#shared/schemas/trials.ts';

const terms = { arm: null, minimumMass: null };
const listOf = (...names: string[]): TrialsInput => ({
  trials: names.map((name) => ({ name, materials: {} })),
  terms,
});
const kept = (version: number, ...names: string[]): GliderTrialsDto => ({
  ...listOf(...names),
  version,
  updatedAt: '2026-05-02T10:00:00.000Z',
  updatedBy: 'Odile',
});
const names = ({ trials }: TrialsInput) => trials.map(({ name }) => name);

function stage(start: GliderTrialsDto, draft: TrialDraft | null = null) {
  const held = { server: start, draft };
  const send = vi.fn<(list: TrialsInput, version: number) => Promise<GliderTrialsDto>>((list, version) => {
    if (version !== held.server.version) {
      const problem = {
        type: 'about:blank',
        title: 'Stale',
        status: 412,
        code: 'stale_version',
        detail: '',
        current: held.server,
      };
      return Promise.reject(new ApiError(problem));
    }
    held.server = { ...held.server, ...list, version: version + 1 };
    return Promise.resolve(held.server);
  });
  const keeper = new TrialKeeper({
    kept: start,
    draft: { take: () => held.draft, put: (next) => (held.draft = next) },
    send,
    onSaved: () => undefined,
  });
  return { keeper, send, held };
}

describe('the keeper of trials', () => {
  beforeEach(() => {
    vi.useFakeTimers();
    vi.stubGlobal('addEventListener', () => undefined);
    vi.stubGlobal('removeEventListener', () => undefined);
  });
  afterEach(() => {
    vi.useRealTimers();
    vi.unstubAllGlobals();
  });

  it('sends once after a quiet moment, and keeps a draft only until then', async () => {
    const { keeper, send, held } = stage(kept(1));
    keeper.change(listOf('L'));
    keeper.change(listOf('Light'));
    expect(held.draft?.list).toEqual(listOf('Light'));
    await vi.advanceTimersByTimeAsync(1000);
    expect(send).toHaveBeenCalledTimes(1);
    expect([names(held.server), held.server.version, held.draft]).toEqual([['Light'], 2, null]);
  });

  it('joins with what somebody else saved, sends the join, and says whose it was', async () => {
    const { keeper, held } = stage(kept(1, 'Light'));
    held.server = kept(2, 'Light', 'Theirs');
    keeper.change(listOf('Light', 'Mine'));
    await vi.advanceTimersByTimeAsync(3000);
    expect(names(held.server)).toEqual(['Light', 'Theirs', 'Mine']);
    expect(keeper.getDesk()).toMatchObject({ phase: 'idle', joinedWith: 'Odile' });
  });

  it('keeps what was typed while the answer was on its way', async () => {
    const { keeper, send, held } = stage(kept(1));
    const answers: (() => void)[] = [];
    send.mockImplementationOnce(
      (list) =>
        new Promise((resolve) => answers.push(() => resolve((held.server = { ...kept(2), ...list })))),
    );
    keeper.change(listOf('One'));
    await vi.advanceTimersByTimeAsync(1000);
    keeper.change(listOf('One', 'Two'));
    answers[0]?.();
    await vi.advanceTimersByTimeAsync(2000);
    expect(names(held.server)).toEqual(['One', 'Two']);
  });

  it('tries again when the line is back, and says that nothing is lost', async () => {
    const { keeper, send, held } = stage(kept(1));
    send.mockRejectedValueOnce(new NetworkError(null));
    keeper.change(listOf('Light'));
    await vi.advanceTimersByTimeAsync(1000);
    expect(keeper.getDesk().problem).toMatch(/kept on this device/);
    expect(held.draft).not.toBeNull();
    await vi.advanceTimersByTimeAsync(10_000);
    expect([names(held.server), keeper.getDesk().problem]).toEqual([['Light'], null]);
  });

  it('puts back what was not sent when the page was left, joined with what came since', () => {
    const draft = { base: listOf('Light'), list: listOf('Light', 'Mine') };
    const { keeper } = stage(kept(3, 'Light', 'Theirs'), draft);
    expect(names(keeper.getDesk().list)).toEqual(['Light', 'Theirs', 'Mine']);
  });

  it('does not send a trial without a name, and says so', async () => {
    const { keeper, send } = stage(kept(1));
    keeper.change(listOf(' '));
    await vi.advanceTimersByTimeAsync(1000);
    expect(send).not.toHaveBeenCalled();
    expect(keeper.getDesk().problem).toMatch(/needs a name/);
  });
});
