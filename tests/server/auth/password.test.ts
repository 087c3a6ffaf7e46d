import { describe, expect, it } from 'vitest';
import { hashPassword, passwordMatches } from '#server/auth/password.ts';

describe('a password', () => {
  it('matches its own hash, in any spelling of the same letters, and no other', async () => {
    const hash = await hashPassword('Flügelrippe');
    expect(await passwordMatches(hash, 'Flügelrippe'.normalize('NFD'))).toBe(true);
    expect(await passwordMatches(hash, 'Flugelrippe')).toBe(false);
    expect(await hashPassword('Flügelrippe')).not.toBe(hash);
  });

  it('of nobody never matches, and costs the same work', async () => {
    const hash = await hashPassword('gliding');
    await passwordMatches(undefined, 'warm up');
    const time = async (against: string | undefined) => {
      const started = process.hrtime.bigint();
      for (let i = 0; i < 5; i += 1) expect(await passwordMatches(against, 'other')).toBe(false);
      return Number(process.hrtime.bigint() - started);
    };
    const [known, unknown] = [await time(hash), await time(undefined)];
    // A ratio with ample room: without the work the second would be a thousand times faster.
    expect(unknown / known).toBeGreaterThan(0.2);
  });
});
