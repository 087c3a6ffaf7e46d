import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { gliderList } from '#shared/schemas/glider.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, picture, visit } from './support/browser.ts';
import { newBuilder, storedGlider } from './support/desk.ts';
import { expectFocus, focusOf, tabTo, typeOver } from './support/keys.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

describe('a glider by keyboard alone', () => {
  it('is begun, altered, balanced and put down on a sheet', async () => {
    const { email, password } = await newBuilder(browser, 'Nell Osgood');
    const visited = await visit(browser);
    const { page, complaints } = visited;
    const { keyboard } = page;
    await page.goto('/sign-in');
    await tabTo(page, /^E-mail/);
    await keyboard.type(email);
    await keyboard.press('Tab');
    await keyboard.type(password);
    await keyboard.press('Enter');
    await page.waitForURL('**/bench');

    await page.getByRole('heading', { name: 'Nothing lies here yet' }).waitFor();
    await tabTo(page, /few wishes/);
    await keyboard.press('Enter');
    await page.waitForURL('**/start');
    await page.getByRole('img', { name: /from above/ }).waitFor();
    await expectAccessible(page, 'the start');
    await picture(page, 'start');
    await tabTo(page, /^Name/);
    await keyboard.type('Sandpiper');
    await tabTo(page, /^Wing span/);
    await typeOver(page, '900');
    await tabTo(page, /^Root chord/);
    await typeOver(page, '5 in');
    await tabTo(page, /^Wing built of/);
    await keyboard.press('ArrowDown');
    await tabTo(page, /^Draw it/);
    await keyboard.press('Enter');
    await page.waitForURL(/\/gliders\/[\w-]+\/drawing/);
    const id = /gliders\/([\w-]+)\//.exec(page.url())?.[1] ?? '';
    const stored = () => storedGlider(visited, id);
    const drawn = (await stored()).plan;
    expect(drawn.name).toBe('Sandpiper');
    expect(drawn.surfaces[0]?.panels[0]?.rootChord).toBeCloseTo(127, 9);
    expect(drawn.surfaces[0]?.parts.map(({ name }) => name)).toContain('Stringer, bottom');

    // A rib's thickness: into its form, over the number, and out again.
    await page.getByRole('button', { name: /^Ribs/ }).first().waitFor();
    await tabTo(page, /^Ribs/);
    await keyboard.press('Enter');
    await tabTo(page, /^Thickness/);
    await typeOver(page, '3/32 in');
    const thickness = async () =>
      (await stored()).plan.surfaces[0]?.parts.flatMap((part) =>
        part.kind === 'ribs' ? [part.thickness.toFixed(5)] : [],
      );
    await expect.poll(thickness, PATIENT).toEqual(['2.38125']);
    await keyboard.press('Escape');
    await expectFocus(page, /^Ribs/);

    // A ready set of parts; the focus comes to the first of them.
    await keyboard.press('a');
    await expectFocus(page, /^Add/);
    await keyboard.press('Enter');
    await page.getByRole('menuitem', { name: /D-box/ }).waitFor();
    await expectFocus(page, /^Ribs at every bay/);
    await keyboard.press('ArrowDown');
    await expectFocus(page, /^Spars, top and bottom/);
    await keyboard.press('ArrowDown');
    await expectFocus(page, /^D-box/);
    await keyboard.press('Enter');
    await expectFocus(page, /^Nose sheeting/);
    const parts = async () => (await stored()).plan.surfaces[0]?.parts.map(({ name }) => name) ?? [];
    await expect.poll(parts, PATIENT).toContain('Shear web');
    await keyboard.press('Control+z');
    await expect.poll(parts, PATIENT).not.toContain('Shear web');
    await keyboard.press('Control+Shift+z');
    await expect.poll(parts, PATIENT).toContain('Nose sheeting');

    // Away with a part: the focus is on a neighbour, not lost.
    await page.getByRole('button', { name: /^Glue/ }).first().waitFor();
    await tabTo(page, /^Glue/);
    await keyboard.press('Enter');
    await tabTo(page, /^Remove$/);
    await keyboard.press('Enter');
    await expect.poll(parts, PATIENT).not.toContain('Glue');
    const left = await focusOf(page);
    expect(left.tag).not.toBe('body');

    await tabTo(page, /^Balance$/, true);
    await keyboard.press('Enter');
    await page.waitForURL('**/balance');
    await page.getByRole('heading', { level: 1 }).waitFor();
    await tabTo(page, /^Sheets$/);
    await keyboard.press('Enter');
    await page.waitForURL('**/sheets');
    await tabTo(page, /^Note on the sheet/);
    await keyboard.type('Drawn by keyboard');
    await tabTo(page, /^Save a sheet/);
    await keyboard.press('Enter');
    await page.getByText('Sheet 1 is saved.').waitFor();
    await tabTo(page, /^No. 1$/);
    await keyboard.press('Enter');
    await page.waitForURL(/\/sheets\/[\w-]+$/);
    await page.getByText('Drawn by keyboard').first().waitFor();
    expect(complaints).toEqual([]);
    const list = gliderList.parse(await (await visited.context.request.get('/api/gliders')).json());
    expect(list.gliders.map(({ name }) => name)).toEqual(['Sandpiper']);
  });

  it('keeps the wishes through a reload, and says what is wrong with them beside the field', async () => {
    const { page } = await newBuilder(browser, 'Wim Aarts');
    await page.goto('/start');
    await page.getByLabel('Wing span').fill('80');
    await page.getByText(/From 200/).waitFor();
    expect(await page.getByRole('button', { name: 'Draw it' }).isDisabled()).toBe(true);
    await page.getByLabel('Wing span').fill('1 m');
    await page.getByLabel('Section, four digits').fill('4402');
    await page.getByText(/ribs and spars need/).waitFor();
    await page.getByLabel('Wing built of').selectOption('sheet');
    await page.getByRole('img', { name: /from above/ }).waitFor();
    await page.reload();
    expect(await page.getByLabel('Wing built of').inputValue()).toBe('sheet');
    expect(await page.getByLabel('Wing span').inputValue()).toBe('1000');
  });
});
