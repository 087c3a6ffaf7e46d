// @vitest-environment happy-dom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { act } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { SignUpForm } from '#client/features/session/sign-up-form.tsx';
import { mount, only, onlyInput, type } from '#tests/client/lib/mount.tsx';

async function form() {
  const client = new QueryClient();
  const { element } = await mount(
    <QueryClientProvider client={client}>
      <SignUpForm />
    </QueryClientProvider>,
  );
  const input = (name: string) => onlyInput(element, `input[name=${name}]`);
  const submit = async () => {
    await act(async () => {
      only(element, 'form').dispatchEvent(new Event('submit', { bubbles: true, cancelable: true }));
    });
    // The schema comes with the first submission; the button waits until all is through.
    await vi.waitFor(async () => {
      await act(() => new Promise((resolve) => setTimeout(resolve, 5)));
      expect(only(element, 'button').hasAttribute('aria-disabled')).toBe(false);
    });
  };
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

  const refuse = (problem: object) =>
    vi.stubGlobal('fetch', () =>
      Promise.resolve(
        new Response(JSON.stringify({ type: 'about:blank', title: 'No', ...problem }), { status: 409 }),
      ),
    );
  const fill = async ({ input }: Awaited<ReturnType<typeof form>>) => {
    await type(input('name'), 'Ines');
    await type(input('email'), 'ines@larkmoor.example');
    await type(input('password'), 'a row of words');
  };

  it('puts what the server refuses at the field that its pointer names', async () => {
    const errors = [{ pointer: '#/password', detail: 'Too common.' }];
    refuse({ status: 400, code: 'invalid_input', detail: 'Not accepted.', errors });
    const shown = await form();
    await fill(shown);
    await shown.submit();
    expect(shown.errorOf('password')).toContain('Too common.');
    expect(shown.input('password').value).toBe('a row of words');
  });

  it('says at the address that it is taken', async () => {
    refuse({ status: 409, code: 'email_taken', detail: 'This address has an account already.' });
    const shown = await form();
    await fill(shown);
    await shown.submit();
    expect(shown.errorOf('email')).toContain('has an account already');
  });

  it('says at the top what belongs to no field, and loses nothing', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('no route')));
    const shown = await form();
    await fill(shown);
    await shown.submit();
    expect(only(shown.element, '[role=alert]').textContent).toContain('cannot be reached');
    expect(shown.input('name').value).toBe('Ines');
  });
});
