import { describe, expect, it } from 'vitest';
import { useApp } from '../support/app.ts';
import { expectProblem } from '../support/problems.ts';

const app = useApp();

const signOut = (headers: Record<string, string>) => app.visitor().delete('/api/session').set(headers);

describe('a request that changes something', () => {
  it.each([
    ['a page of ours', { 'Sec-Fetch-Site': 'same-origin' }],
    ['the address line', { 'Sec-Fetch-Site': 'none' }],
    ['a program, which says nothing of where it comes from', {}],
  ])('is taken from %s', async (_, headers) => {
    expect((await signOut(headers)).status).toBe(204);
  });

  it('is taken from an older browser on a page of ours', async () => {
    expect((await signOut({ Origin: app.url })).status).toBe(204);
  });

  it.each([
    ['a page of another site', { 'Sec-Fetch-Site': 'cross-site' }],
    ['a neighbour under the same domain', { 'Sec-Fetch-Site': 'same-site' }],
    ['an older browser on another page', { Origin: 'https://elsewhere.example' }],
    ['a page without an origin', { Origin: 'null' }],
  ])('is refused from %s', async (_, headers: Record<string, string>) => {
    expectProblem(await signOut(headers), 'forbidden');
  });

  it('is refused where an honest Origin is contradicted by the browser', async () => {
    expectProblem(await signOut({ Origin: app.url, 'Sec-Fetch-Site': 'cross-site' }), 'forbidden');
  });
});
