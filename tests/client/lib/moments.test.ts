import { describe, expect, it } from 'vitest';
import { formatMoment } from '#client/lib/moments.ts';

const now = new Date(2026, 11, 1, 14, 0);

describe('moments', () => {
  it('says the time alone for today', () => {
    expect(formatMoment(new Date(2026, 11, 1, 9, 4).toISOString(), now)).toBe('09:04');
  });

  it('adds the day for yesterday and the year for last year', () => {
    expect(formatMoment(new Date(2026, 10, 30, 23, 59).toISOString(), now)).toBe('30 Nov, 23:59');
    expect(formatMoment(new Date(2025, 11, 1, 12, 0).toISOString(), now)).toBe('1 Dec 2025');
  });

  it('says nothing of what is no moment', () => {
    expect(formatMoment('', now)).toBe('');
  });
});
