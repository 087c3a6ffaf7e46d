import { describe, expect, it } from 'vitest';
import { paths, safeNext } from '#client/app/paths.ts';

describe('where to go after signing in', () => {
  it('is the page that was asked for', () => {
    expect(safeNext('/gliders/7/balance?x=1')).toBe('/gliders/7/balance?x=1');
  });

  it.each([
    'https://elsewhere.example/',
    '//elsewhere.example',
    '/\\elsewhere.example',
    'javascript:alert(1)',
    null,
  ])('is the bench for %s, which is no page of ours', (next) => expect(safeNext(next)).toBe(paths.bench));
});
