import { afterEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { ApiError, isPassing, NetworkError, request, UnexpectedAnswer } from '#client/lib/api.ts';

const answer = z.strictObject({ ok: z.boolean() });

function respond(body: string, status = 200) {
  const fetched = vi.fn<typeof fetch>(() => Promise.resolve(new Response(body, { status })));
  vi.stubGlobal('fetch', fetched);
  return fetched;
}
const failed = () =>
  request('/x', answer).then(
    () => null,
    (error: unknown) => error,
  );

afterEach(() => void vi.unstubAllGlobals());

describe('request', () => {
  it('sends JSON with its headers under /api and gives the checked answer back', async () => {
    const fetched = respond('{"ok":true}');
    const got = await request('/gliders/1', answer, {
      method: 'PUT',
      body: { a: 1 },
      headers: { 'If-Match': '"3"' },
    });
    expect(got).toEqual({ ok: true });
    const [url, init] = fetched.mock.calls[0] ?? [];
    expect(url).toBe('/api/gliders/1');
    expect(init).toMatchObject({ method: 'PUT', body: '{"a":1}' });
    expect(init?.headers).toMatchObject({ 'If-Match': '"3"', 'Content-Type': 'application/json' });
  });

  it('makes problem details an error that carries code, fields and whatever else was told', async () => {
    const details = {
      type: 'about:blank',
      title: 'Old',
      status: 412,
      code: 'stale_version',
      detail: 'Changed.',
    };
    respond(
      JSON.stringify({ ...details, current: { version: 4 }, errors: [{ pointer: '#/plan', detail: 'no' }] }),
      412,
    );
    const error = await failed();
    expect(error).toBeInstanceOf(ApiError);
    expect(error).toMatchObject({ status: 412, code: 'stale_version', message: 'Changed.' });
    expect((error as ApiError).fields).toEqual([{ pointer: '#/plan', detail: 'no' }]);
    expect((error as ApiError).problem['current']).toEqual({ version: 4 });
  });

  it('tells a broken line apart from a refusal', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('no route')));
    const error = await failed();
    expect(error).toBeInstanceOf(NetworkError);
    expect(isPassing(error)).toBe(true);
  });

  it('takes a gateway without a server behind it for a broken line', async () => {
    respond('<html>bad gateway</html>', 502);
    expect(await failed()).toBeInstanceOf(NetworkError);
  });

  it('refuses an answer that is not what was agreed', async () => {
    respond('{"ok":"yes"}');
    const error = await failed();
    expect(error).toBeInstanceOf(UnexpectedAnswer);
    expect(isPassing(error)).toBe(false);
  });
});
