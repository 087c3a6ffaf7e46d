import { describe, expect, it } from 'vitest';
import { isCommonPassword } from '#server/auth/common-passwords.ts';

// Which passwords are common: from memory of lists often published, no source.
const own = { name: 'Maren Oakshott', email: 'maren.oakshott@larkmoor.example' };
const isCommon = (password: string) => isCommonPassword(password, own);

describe('a common password', () => {
  it.each([
    'password12',
    'PASSWORD2026!',
    'P@ssw0rd123',
    'passwordpassword',
    '1234567890',
    '0987654321',
    'qwertyuiop',
    'QWERTZUIOP',
    '1q2w3e4r5t',
    '1qaz2wsx3edc',
    'aaaaaaaaaaaa',
    'abcabcabcabc',
    '12121212121212',
    'iloveyou2026',
    'iloveyou monkey',
    'letmein!!!!!!!',
    'Sunshine-1999',
    '!!dragon!!2020',
    'wachtwoord123',
    'p-a-s-s-w-o-r-d',
  ])('is %s', (password) => {
    expect(isCommon(password)).toBe(true);
  });

  it.each(['Maren Oakshott', 'marenoakshott', 'maren.oakshott@larkmoor.example', 'maren.oakshott77'])(
    'is the own name or address: %s',
    (password) => {
      expect(isCommon(password)).toBe(true);
    },
  );

  it.each([
    'spruce over the ridge',
    'larkmoor-builder',
    'seven rib stitches',
    'tangent grain C-cut',
    'Zw9!kr40vLq2',
    'über den Hügeln',
    'correct horse battery staple',
    '31415926535 8979',
    'my dragon eats balsa',
  ])('is not %s', (password) => {
    expect(isCommon(password)).toBe(false);
  });

  it('asks for no class of signs', () => {
    expect(isCommon('onlysmalllettershere')).toBe(false);
    expect(isCommon('8052973164085')).toBe(false);
  });

  it.each(['a', 'ab', '1!', 'abcd', 'p@ss'])('is told apart at the greatest length too: %s', (group) => {
    expect(isCommon(group.repeat(128).slice(0, 128))).toBe(true);
    expect(isCommon(`${group.repeat(128).slice(0, 100)} but then it goes on`)).toBe(false);
  });
});
