// @vitest-environment happy-dom
import { act } from 'react';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { useKept } from '#client/hooks/use-kept.ts';
import { mount } from '#tests/client/lib/mount.tsx';

const speed = z.number().min(0).max(100);

async function shown(key: string) {
  let keep: (value: number) => void = () => undefined;
  function Probe({ at }: { at: string }) {
    const [value, set] = useKept(at, speed, 7);
    keep = set;
    return <p>{value}</p>;
  }
  const { element, show } = await mount(<Probe at={key} />);
  return {
    text: () => element.textContent,
    keep: (value: number) => act(async () => keep(value)),
    at: (other: string) => show(<Probe at={other} />),
  };
}

beforeEach(() => localStorage.clear());

describe('a value kept in the browser', () => {
  it('is there at the next visit, each under its own key', async () => {
    const first = await shown('a');
    expect(first.text()).toBe('7');
    await first.keep(12);
    expect(first.text()).toBe('12');
    expect((await shown('a')).text()).toBe('12');
    expect((await shown('b')).text()).toBe('7');
  });

  it('follows its key', async () => {
    const probe = await shown('a');
    await probe.keep(12);
    await probe.at('b');
    expect(probe.text()).toBe('7');
    await probe.at('a');
    expect(probe.text()).toBe('12');
  });

  it('begins anew where what is kept does not fit, or is no JSON', async () => {
    localStorage.setItem('a', '900');
    expect((await shown('a')).text()).toBe('7');
    localStorage.setItem('a', '{');
    expect((await shown('a')).text()).toBe('7');
  });

  it('holds until the page is left where storage is refused', async () => {
    const refuse = () => {
      throw new DOMException('The site keeps nothing.', 'SecurityError');
    };
    vi.stubGlobal('localStorage', { getItem: refuse, setItem: refuse });
    const probe = await shown('a');
    await probe.keep(12);
    expect(probe.text()).toBe('12');
    vi.unstubAllGlobals();
    expect((await shown('a')).text()).toBe('7');
  });
});
