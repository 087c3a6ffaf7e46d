import { describe, expect, it } from 'vitest';
import { ApiError, NetworkError } from '#client/lib/api.ts';
import { refusalOf } from '#client/lib/refusal.ts';

const refused = (errors: { pointer: string; detail: string }[], detail = 'Not accepted.') =>
  new ApiError({ type: 'about:blank', title: 'No', status: 400, code: 'invalid_input', detail, errors });

describe('a refusal', () => {
  it('goes to the field that its pointer names, once', () => {
    const error = refused([
      { pointer: '#/password', detail: 'Too common.' },
      { pointer: '#/password', detail: 'Too short.' },
    ]);
    expect(refusalOf(error, ['email', 'password'])).toEqual({
      fields: [['password', 'Too common.']],
      root: null,
    });
  });

  it('goes to the form where it belongs to no field of it, beside what does', () => {
    const error = refused([
      { pointer: '#/email', detail: 'No address.' },
      { pointer: '#/captcha', detail: 'Missing.' },
    ]);
    expect(refusalOf(error, ['email'])).toEqual({ fields: [['email', 'No address.']], root: 'Missing.' });
  });

  it('is told in its own words where it names no field, or the line is broken', () => {
    expect(refusalOf(refused([], 'Wrong password.'), ['email']).root).toBe('Wrong password.');
    expect(refusalOf(new NetworkError('x'), ['email']).root).toBe('The server cannot be reached.');
    expect(refusalOf('nonsense', ['email']).root).toBe('That did not work.');
  });
});
