import type { Page } from 'playwright-core';
import { expect } from 'vitest';

/** What has the focus, by the name that a reader is told, and whether it can be seen to have it. */
interface Focus {
  name: string;
  tag: string;
  seen: boolean;
}

export function focusOf(page: Page): Promise<Focus> {
  return page.evaluate(() => {
    const element = document.activeElement;
    if (!(element instanceof HTMLElement) && !(element instanceof SVGElement)) {
      return { name: '', tag: 'none', seen: false };
    }
    const labelled = element.getAttribute('aria-labelledby')?.split(' ') ?? [];
    const label = element.id === '' ? null : document.querySelector(`label[for="${CSS.escape(element.id)}"]`);
    const text = (node: Element | null | undefined) => (node?.textContent ?? '').replace(/\s+/g, ' ').trim();
    const name =
      element.getAttribute('aria-label') ??
      labelled
        .map((id) => text(document.getElementById(id)))
        .join(' ')
        .trim();
    const style = getComputedStyle(element);
    return {
      name: name !== '' ? name : text(label) || text(element),
      tag: element.tagName.toLowerCase(),
      seen: style.outlineStyle !== 'none' && Number.parseFloat(style.outlineWidth) >= 2,
    };
  });
}

const MOST_STOPS = 160;

/** Goes on by Tab to what is called so; every stop on the way can be seen. */
export async function tabTo(page: Page, name: RegExp, back = false): Promise<void> {
  const passed: string[] = [];
  for (let stop = 0; stop < MOST_STOPS; stop++) {
    await page.keyboard.press(back ? 'Shift+Tab' : 'Tab');
    const focus = await focusOf(page);
    passed.push(focus.name);
    // A handle in the drawing is seen by a ring of its own.
    if (!['body', 'g', 'circle', 'path'].includes(focus.tag))
      expect(focus.seen, `focus seen on “${focus.name}”`).toBe(true);
    if (name.test(focus.name)) return;
  }
  throw new Error(`no stop called ${name}; passed: ${passed.join(' | ')}`);
}

/** The focus comes to what is called so by itself, as after something was added or removed. */
export async function expectFocus(page: Page, name: RegExp): Promise<void> {
  await expect.poll(async () => (await focusOf(page)).name, { timeout: 20_000 }).toMatch(name);
}

/** Types over what a field holds. */
export async function typeOver(page: Page, text: string): Promise<void> {
  await page.keyboard.press('Control+A');
  await page.keyboard.type(text);
}

/** Something has the focus, after what could have taken it away. */
export async function expectHeld(page: Page, where: string): Promise<void> {
  const tag = async () => (await focusOf(page)).tag;
  await expect.poll(tag, { timeout: 10_000, message: `focus ${where}` }).not.toMatch(/^(body|none)$/);
}
