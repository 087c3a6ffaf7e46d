// @vitest-environment happy-dom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { act } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { SignUpForm } from '#client/features/session/sign-up-form.tsx';
import { mount, only, type } from '#tests/client/lib/mount.tsx';

async function form() {
  const client = new QueryClient();
  const { element } = await mount(
    <QueryClientProvider client={client}>
      <SignUpForm />
    </QueryClientProvider>,
  );
  const input = (name: string) => only<HTMLInputElement>(element, `input[name=${name}]`);
  const submit = () =>
    act(async () => {
      only(element, 'form').dispatchEvent(new Event('submit', { bubbles: true, cancelable: true }));
      await new Promise((resolve) => setTimeout(resolve, 20));
    });
  const errorOf = (name: string) => {
    const ids = input(name).getAttribute('aria-describedby')?.split(' ') ?? [];
    return ids.map((id) => document.getElementById(id)?.textContent ?? '').join(' ');
  };
  return { element, input, submit, errorOf };
}

afterEach(() => void vi.unstubAllGlobals());

describe('sign up', () => {
  it('shows every fault at its field before anything is sent', async () => {
    const fetched = vi.fn<typeof fetch>();
    vi.stubGlobal('fetch', fetched);
    const { submit, errorOf, input } = await form();
    await type(input('email'), 'nobody');
    await submit();
    expect(errorOf('name')).toContain('Type your name.');
    expect(errorOf('email')).toContain('not an e-mail address');
    expect(errorOf('password')).toContain('at least 10 characters');
    expect(fetched).not.toHaveBeenCalled();
  });

  it('puts what the server refuses at the field that its pointer names', async () => {
    const problem = {
      ...{
        type: 'about:blank',
        title: 'Conflict',
        status: 409,
        code: 'email_taken',
        detail: 'That address is taken.',
      },
      errors: [{ pointer: '#/email', detail: 'Somebody has signed up with this address.' }],
    };
    vi.stubGlobal('fetch', () => Promise.resolve(new Response(JSON.stringify(problem), { status: 409 })));
    const { submit, errorOf, input } = await form();
    await type(input('name'), 'Ines');
    await type(input('email'), 'ines@larkmoor.example');
    await type(input('password'), 'a row of words');
    await submit();
    expect(errorOf('email')).toContain('Somebody has signed up with this address.');
    expect(input('password').value).toBe('a row of words');
  });

  it('says at the top what belongs to no field, and loses nothing', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('no route')));
    const { element, submit, input } = await form();
    await type(input('name'), 'Ines');
    await type(input('email'), 'ines@larkmoor.example');
    await type(input('password'), 'a row of words');
    await submit();
    expect(only(element, '[role=alert]').textContent).toContain('cannot be reached');
    expect(input('name').value).toBe('Ines');
  });
});
