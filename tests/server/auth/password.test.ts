import { verify } from '@node-rs/argon2';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { hashPassword, passwordMatches } from '#server/auth/password.ts';

vi.mock('@node-rs/argon2', { spy: true });

afterEach(() => vi.mocked(verify).mockClear());

describe('a password', () => {
  it('matches its own hash, in any spelling of the same letters, and no other', async () => {
    const hash = await hashPassword('Flügelrippe');
    expect(await passwordMatches(hash, 'Flügelrippe'.normalize('NFD'))).toBe(true);
    expect(await passwordMatches(hash, 'Flugelrippe')).toBe(false);
    expect(await hashPassword('Flügelrippe')).not.toBe(hash);
  });

  it('of nobody never matches, and costs the same work as a wrong one of somebody', async () => {
    const parametersOf = (hash: unknown) => /^\$argon2id\$v=\d+\$([^$]+)\$/.exec(String(hash))?.[1];
    expect(await passwordMatches(await hashPassword('gliding'), 'other')).toBe(false);
    expect(await passwordMatches(undefined, 'other')).toBe(false);
    const [known, unknown, ...more] = vi.mocked(verify).mock.calls;
    expect(more).toEqual([]);
    expect(parametersOf(unknown?.[0])).toBe(parametersOf(known?.[0]));
    expect(unknown?.[1]).toBe(known?.[1]);
  });
});
