import { describe, expect, it } from 'vitest';
import { isKept, signsOut } from '#client/offline/kept-answers.ts';

describe('answers that are kept for a day without a connection', () => {
  it.each([
    '/api/session',
    '/api/gliders',
    '/api/gliders/5f1c/weighings',
    '/api/gliders/5f1c/first-flights',
    '/api/gliders/5f1c/saves',
    '/api/rack',
    '/api/materials',
  ])('%s is', (path) => {
    expect(isKept(path)).toBe(true);
  });

  it.each([
    '/api/account/export',
    '/api/gliders/5f1c/photos/7d/file',
    '/api/gliders/5f1c/link',
    '/api/rack/export',
    '/api/health',
    '/api/shared/AAAA',
    '/api/sessionx',
  ])('%s is not', (path) => {
    expect(isKept(path)).toBe(false);
  });
});

describe('an answer that says that nobody is signed in', () => {
  const at = (path: string, body: unknown, status = 200) =>
    signsOut(`http://127.0.0.1${path}`, new Response(JSON.stringify(body), { status }));

  it('is a session without a user, or a 401 from anywhere', async () => {
    expect(await at('/api/session', { user: null })).toBe(true);
    expect(await at('/api/gliders', {}, 401)).toBe(true);
    expect(await at('/api/session', { user: { id: 'a' } })).toBe(false);
    expect(await at('/api/gliders', { user: null })).toBe(false);
    expect(await signsOut('http://127.0.0.1/api/session', new Response('<p>', { status: 200 }))).toBe(false);
  });
});
