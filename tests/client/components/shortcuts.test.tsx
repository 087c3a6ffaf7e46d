// @vitest-environment happy-dom
import { act, type ReactNode } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { shortcutBook, useShortcuts, type Shortcut } from '#client/components/shortcuts/shortcut-book.ts';
import { Shortcuts } from '#client/components/shortcuts/shortcuts.tsx';
import { mount, onlyInput, press, type Mounted } from '#tests/client/lib/mount.tsx';

let shown: Mounted | null = null;
const open = async (node: ReactNode) => (shown = await mount(node));

afterEach(async () => {
  act(() => {
    shortcutBook.setOpen(false);
    shortcutBook.setOn(true);
  });
  await shown?.unmount();
});

function Page({ shortcuts }: { shortcuts: readonly Shortcut[] }) {
  useShortcuts('Page', shortcuts);
  return (
    <>
      <input aria-label="text" />
      <button type="button">somewhere</button>
      <Shortcuts />
    </>
  );
}

describe('single keys', () => {
  it('do what the page has entered for them, whichever case the letter is in', async () => {
    const run = vi.fn<() => void>();
    await open(<Page shortcuts={[{ keys: 'm', what: 'Measure', run }]} />);
    await press(document.body, 'm');
    await press(document.body, 'M');
    expect(run).toHaveBeenCalledTimes(2);
  });

  it('are letters in a field, and leave the browser’s own combinations alone', async () => {
    const run = vi.fn<() => void>();
    const { element } = await open(<Page shortcuts={[{ keys: 'm', what: 'Measure', run }]} />);
    await press(onlyInput(element), 'm');
    await press(document.body, 'm', { ctrlKey: true });
    await press(document.body, 'm', { altKey: true });
    expect(run).not.toHaveBeenCalled();
  });

  it('do nothing once they are turned off, and that is remembered', async () => {
    const run = vi.fn<() => void>();
    await open(<Page shortcuts={[{ keys: 'm', what: 'Measure', run }]} />);
    act(() => shortcutBook.setOn(false));
    await press(document.body, 'm');
    await press(document.body, '?');
    expect(run).not.toHaveBeenCalled();
    expect(shortcutBook.open()).toBe(false);
    expect(localStorage.getItem('featherbeam.keys')).toBe('off');
  });

  it('are listed by a question mark, those of the page that is shown first', async () => {
    await open(<Page shortcuts={[{ keys: 'm', what: 'Measure between two places' }]} />);
    await press(document.body, '?');
    // The list is fetched like a file of the page.
    await act(async () => {
      await import('#client/components/shortcuts/shortcuts-dialog.tsx');
      await new Promise((done) => setTimeout(done, 20));
    });
    const text = document.querySelector('[role="dialog"]')?.textContent ?? '';
    expect(text.indexOf('Measure between two places')).toBeGreaterThan(0);
    expect(text.indexOf('Undo')).toBeGreaterThan(text.indexOf('Measure between two places'));
  });

  it('are gone with the page that entered them', async () => {
    const run = vi.fn<() => void>();
    const { show } = await open(<Page shortcuts={[{ keys: 'm', what: 'Measure', run }]} />);
    await show(<Shortcuts />);
    await press(document.body, 'm');
    expect(run).not.toHaveBeenCalled();
  });
});
