// @vitest-environment happy-dom
import { act } from 'react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { QueryView } from '#client/components/query-view.tsx';
import { NetworkError } from '#client/lib/api.ts';
import { mount, only } from '#tests/client/lib/mount.tsx';

type Query = Parameters<typeof QueryView<string[]>>[0]['query'];

const query = (state: Partial<Query>): Query => ({
  data: undefined,
  error: null,
  isPending: false,
  refetch: vi.fn<Query['refetch']>(),
  ...state,
});
const view = (state: Query) => (
  <QueryView query={state} isEmpty={(rows) => rows.length === 0} empty={<p>Nothing yet</p>}>
    {(rows) => <p>{rows.join(' ')}</p>}
  </QueryView>
);

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

describe('query view', () => {
  it('shows nothing for the first quarter of a second, then a placeholder', async () => {
    const { element } = await mount(view(query({ isPending: true })));
    await act(async () => vi.advanceTimersByTime(249));
    expect(element.textContent).toBe('');
    await act(async () => vi.advanceTimersByTime(1));
    expect(only(element, '[role=status]').textContent).toContain('Loading');
  });

  it('tells a failed request apart from an empty answer and offers another try', async () => {
    const failed = query({ error: new NetworkError(null) });
    const { element } = await mount(view(failed));
    expect(only(element, '[role=alert]').textContent).toContain('cannot be reached');
    expect(element.textContent).not.toContain('Nothing yet');
    await act(async () => only(element, 'button').click());
    expect(failed.refetch).toHaveBeenCalledOnce();
  });

  it('shows the empty state only for an answer that is empty', async () => {
    const { element } = await mount(view(query({ data: [] })));
    expect(element.textContent).toBe('Nothing yet');
  });

  it('keeps data that it has when a refresh fails', async () => {
    const { element } = await mount(view(query({ data: ['Dunlin'], error: new NetworkError(null) })));
    expect(element.textContent).toBe('Dunlin');
  });
});
