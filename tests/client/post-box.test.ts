import { describe, expect, it } from 'vitest';
import { ApiError, NetworkError } from '#client/lib/api.ts';
import { PostBox, type WaitingRecord } from '#client/lib/post/post-box.ts';

const GLIDER = '7a3cf1de-5c1e-4b6a-9d55-0f4f0c3b8a11';
const KEYS = ['0b7f8a52-1111-4111-8111-000000000001', '0b7f8a52-1111-4111-8111-000000000002'] as const;
const record = (key: string) => ({ key, gliderId: GLIDER, kind: 'weighing' as const, body: { note: key } });
const refusal = (status: number) =>
  new ApiError({ type: '', title: '', status, code: 'x', detail: 'No such part.' });

function shelf() {
  const kept = new Map<string, string>();
  return {
    getItem: (key: string) => kept.get(key) ?? null,
    setItem: (key: string, text: string) => void kept.set(key, text),
  };
}
const alone = (_: string, work: () => Promise<void>) => work();

describe('records that wait to be sent', () => {
  it('go in the order in which they were written, each told of and then gone', async () => {
    const sent: string[] = [];
    const arrived: unknown[] = [];
    const storage = shelf();
    const box = new PostBox('a', { storage, alone, send: ({ key }) => Promise.resolve(sent.push(key)) });
    box.onArrival((one, answer) => arrived.push([one.key, answer]));
    for (const key of KEYS) box.put(record(key));
    await box.send();
    await new Promise((resolve) => setTimeout(resolve, 0));
    expect(sent).toEqual([...KEYS]);
    expect(arrived).toEqual([
      [KEYS[0], 1],
      [KEYS[1], 2],
    ]);
    expect(box.records).toEqual([]);
  });

  it('stay while there is no way, also in the next window, and keep their order', async () => {
    const storage = shelf();
    let isOpen = false;
    const sent: string[] = [];
    const send = ({ key }: WaitingRecord) => {
      if (!isOpen) return Promise.reject(new NetworkError(null));
      return Promise.resolve(sent.push(key));
    };
    const first = new PostBox('a', { storage, alone, send });
    for (const key of KEYS) first.put(record(key));
    await first.send();
    const next = new PostBox('a', { storage, alone, send });
    expect(next.records.map(({ key }) => key)).toEqual([...KEYS]);
    // Somebody else at this device sees nothing of them.
    expect(new PostBox('b', { storage, alone, send }).records).toEqual([]);
    isOpen = true;
    await next.send();
    expect(sent).toEqual([...KEYS]);
  });

  it.each([401, 408, 429, 500, 503])('stay after an answer of %d', async (status) => {
    const box = new PostBox('a', { storage: shelf(), alone, send: () => Promise.reject(refusal(status)) });
    box.put(record(KEYS[0]));
    await box.send();
    expect(box.records).toMatchObject([{ refused: null }]);
  });

  it('that are refused for good say why, let the next one pass, and go when they are taken back', async () => {
    const sent: string[] = [];
    const send = ({ key }: WaitingRecord) =>
      key === KEYS[0] ? Promise.reject(refusal(400)) : Promise.resolve(sent.push(key));
    const box = new PostBox('a', { storage: shelf(), alone, send });
    for (const key of KEYS) box.put(record(key));
    await box.send();
    await new Promise((resolve) => setTimeout(resolve, 0));
    expect(sent).toEqual([KEYS[1]]);
    expect(box.records).toMatchObject([{ key: KEYS[0], refused: 'No such part.' }]);
    box.drop(KEYS[0]);
    expect(box.records).toEqual([]);
  });

  it('are told of before they are gone, so that they are always somewhere', async () => {
    const box = new PostBox('a', { storage: shelf(), alone, send: () => Promise.resolve('kept') });
    const seen: number[] = [];
    box.onArrival(() => seen.push(box.records.length));
    box.put(record(KEYS[0]));
    await box.send();
    await new Promise((resolve) => setTimeout(resolve, 0));
    expect(seen).toEqual([1]);
  });

  it('read as none where storage holds something else', () => {
    const storage = shelf();
    storage.setItem('featherbeam.post.a', '{"records": 7}');
    expect(new PostBox('a', { storage, alone, send: () => Promise.resolve() }).records).toEqual([]);
  });
});
