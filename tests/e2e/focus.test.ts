import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { PATIENT } from './support/browser.ts';
import { makeGlider, newBuilder, openDrawing, storedGlider } from './support/desk.ts';
import { expectFocus, expectHeld, focusOf, tabTo, typeOver } from './support/keys.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

describe('the focus', () => {
  it('is not lost with what an undo takes away, nor with a button that waits', async () => {
    const builder = await newBuilder(browser, 'Edda Keys');
    const { page, complaints } = builder;
    const { keyboard } = page;
    const { id, plan } = await makeGlider(builder);
    const names = async () =>
      (await storedGlider(builder, id)).plan.surfaces[0]?.parts.map(({ name }) => name);
    const before = plan.surfaces[0]?.parts.map(({ name }) => name) ?? [];
    await openDrawing(page, id);

    // A whole set is one step back, and one forward again.
    await keyboard.press('a');
    await expectFocus(page, /^Add a part/);
    await keyboard.press('Enter');
    await downTo(page, 'Stringers, top and bottom');
    await keyboard.press('Enter');
    await expectFocus(page, /^Stringer, top/);
    await expect.poll(names, PATIENT).toEqual([...before, 'Stringer, top', 'Stringer, bottom']);
    await keyboard.press('Control+z');
    await expect.poll(names, PATIENT).toEqual(before);
    await expectHeld(page, 'after an undo');
    const last = before.at(-1) ?? '';
    expect((await focusOf(page)).name.startsWith(last)).toBe(true);
    await keyboard.press('Control+Shift+z');
    await expect.poll(names, PATIENT).toEqual([...before, 'Stringer, top', 'Stringer, bottom']);
    await expectHeld(page, 'after a redo');

    // A field of a form that goes with its row
    await tabTo(page, /^Items$/, true);
    await keyboard.press('Enter');
    await tabTo(page, /^Add an item$/);
    await keyboard.press('Enter');
    await expectFocus(page, /^Name/);
    await typeOver(page, 'Radio gear');
    await tabTo(page, /^Mass/);
    await typeOver(page, '0.8 oz');
    const gear = async () =>
      (await storedGlider(builder, id)).plan.items.find(({ name }) => name === 'Radio gear')?.mass.toFixed(2);
    await expect.poll(gear, PATIENT).toBe('22.68');
    for (let i = 0; i < 12 && (await gear()) !== undefined; i++) {
      await keyboard.press('Control+z');
      await expectHeld(page, 'after one undo more');
    }

    await page.goto(`/gliders/${id}/sheets`);
    await page.getByRole('button', { name: 'Save a sheet' }).waitFor();
    await expect
      .poll(() => page.getByRole('button', { name: 'Save a sheet' }).isEnabled(), PATIENT)
      .toBe(true);
    await tabTo(page, /^Save a sheet$/);
    await keyboard.press('Enter');
    await page.getByText('Sheet 1 is saved.').waitFor();
    await expectFocus(page, /^Save a sheet$/);
    expect(complaints).toEqual([]);
  });
});

describe('the keys that ? lists', () => {
  it('are those that do something, and do it', async () => {
    const builder = await newBuilder(browser, 'Kees Toets');
    const { page, complaints } = builder;
    const { keyboard } = page;
    const { id } = await makeGlider(builder);
    await openDrawing(page, id);
    await keyboard.press('?');
    const list = page.getByRole('dialog', { name: 'Keys' });
    await list.waitFor();
    const listed = await list
      .locator('dt')
      .evaluateAll((terms) =>
        terms.map((term) =>
          [...term.querySelectorAll('kbd')].map(({ textContent }) => textContent).join(' '),
        ),
      );
    const keys = '1 2 3 4 N B M P J K L A D, + − 0 ← ↑ ↓ → Shift Enter Tab, ? Ctrl Z Ctrl Shift Z ↑ ↓ Esc';
    expect(listed.join(' ')).toBe(keys.replaceAll(',', ''));
    await keyboard.press('Escape');
    await list.waitFor({ state: 'detached' });

    const view = page.getByRole('group', { name: 'View' }).first();
    const seen = () => view.getByRole('button', { pressed: true }).textContent();
    const views = new Set<string | null>();
    for (const key of ['4', '3', '2', '1']) {
      const before = await seen();
      await keyboard.press(key);
      await expect.poll(seen, { ...PATIENT, message: `key ${key}` }).not.toBe(before);
      views.add(await seen());
    }
    expect(views.size).toBe(4);

    const station = page.locator('input[type=range]').first();
    const at = () => station.inputValue();
    const first = await at();
    await keyboard.press('n');
    await expect.poll(at, PATIENT).not.toBe(first);
    const second = Number(await at());
    await keyboard.press('b');
    await expect.poll(async () => Number(await at()), PATIENT).toBeLessThan(second);

    const measuring = page.getByRole('button', { name: 'Measure', exact: true, pressed: true });
    await keyboard.press('m');
    await measuring.first().waitFor();
    await keyboard.press('m');
    await measuring.first().waitFor({ state: 'detached' });
    await keyboard.press('p');
    await page.getByRole('dialog', { name: 'Print to scale' }).waitFor();
    await keyboard.press('Escape');
    await page.getByRole('dialog').waitFor({ state: 'detached' });

    const rowName = async () => (await focusOf(page)).name;
    await keyboard.press('l');
    await expect.poll(rowName, PATIENT).toMatch(/\w/);
    await keyboard.press('j');
    await expectHeld(page, 'on the next part');
    const one = await rowName();
    await keyboard.press('j');
    await expect.poll(rowName, PATIENT).not.toBe(one);
    await keyboard.press('k');
    await expect.poll(rowName, PATIENT).toBe(one);
    await keyboard.press('a');
    await expectFocus(page, /^Add a part/);

    // On the drawing itself: larger, pushed, and back to fit
    await keyboard.press('d');
    const role = () => page.evaluate(() => document.activeElement?.getAttribute('role'));
    await expect.poll(role, PATIENT).toBe('application');
    const fit = page.getByRole('button', { name: 'Fit the drawing' }).first();
    const fitted = () => fit.getAttribute('aria-disabled');
    expect(await fitted()).toBe('true');
    await keyboard.press('+');
    await expect.poll(fitted, PATIENT).toBe('false');
    await keyboard.press('-');
    await keyboard.press('0');
    await expect.poll(fitted, PATIENT).toBe('true');
    expect(complaints).toEqual([]);
  });
});

/** Goes down an open menu to an entry. */
async function downTo(page: Page, name: string): Promise<void> {
  await page.getByRole('menuitem', { name }).waitFor();
  const now = async () => (await focusOf(page)).name;
  await expectFocus(page, /^Ribs at every bay/);
  for (let at = await now(); at !== name; at = await now()) {
    await page.keyboard.press('ArrowDown');
    await expect.poll(now, { timeout: 5_000 }).not.toBe(at);
  }
}
