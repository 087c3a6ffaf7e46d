import { describe, expect, it } from 'vitest';
import { useApp } from '../support/app.ts';
import { makePerson } from '../support/people.ts';
import { makeGlider } from '../support/rows.ts';

const app = useApp();

const encodingOf = (res: Response) => res.headers.get('content-encoding');

describe('an answer in JSON', () => {
  it('is packed where it is long and may be, and the same unpacked', async () => {
    const ask = (encodings: string) =>
      fetch(`${app.url}/api/openapi.json`, { headers: { 'Accept-Encoding': encodings } });
    const [packed, plain] = [await ask('br, gzip'), await ask('identity')];
    expect([encodingOf(packed), encodingOf(plain)]).toEqual(['gzip', null]);
    expect(packed.headers.get('vary')).toContain('Accept-Encoding');
    expect(Number(packed.headers.get('content-length'))).toBeLessThan(
      Number(plain.headers.get('content-length')) / 3,
    );
    expect(await packed.json()).toEqual(await plain.json());
  });

  it('stays as it is where it is short', async () => {
    const res = await fetch(`${app.url}/api/health`, { headers: { 'Accept-Encoding': 'gzip' } });
    expect(encodingOf(res)).toBeNull();
  });

  it('keeps the version that a write has to name', async () => {
    const { user, agent } = await makePerson(app);
    const glider = await makeGlider({ owner: user });
    const res = await agent.get(`/api/gliders/${glider.id}`).set('Accept-Encoding', 'gzip').expect(200);
    expect(res.headers).toMatchObject({ 'content-encoding': 'gzip', etag: '"1"' });
  });

  it('is packed when it is a refusal with much to say', async () => {
    const items = Array.from({ length: 200 }, () => ({}));
    const plan = { version: 1, name: 'x', materials: {}, surfaces: [], items, solids: [] };
    const headers = { 'Accept-Encoding': 'gzip', 'Content-Type': 'application/json' };
    const body = JSON.stringify({ plan });
    const res = await fetch(`${app.url}/api/estimates`, { method: 'POST', headers, body });
    expect([res.status, encodingOf(res)]).toEqual([400, 'gzip']);
    expect(res.headers.get('content-type')).toMatch(/^application\/problem\+json/);
    expect((await res.json()).errors).toHaveLength(1_000);
  });
});
