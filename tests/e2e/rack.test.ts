import { readFile, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, PHONE, picture } from './support/browser.ts';
import { makeGlider, newBuilder, signedIn, type Builder } from './support/desk.ts';

const rows = (page: Page) => page.getByRole('table', { name: 'Pieces on the rack' }).locator('tbody tr');
const dialog = (page: Page) => page.getByRole('dialog');

/** What stands there is fit for everybody, in the light and in the dark. */
async function inBothThemes(page: Page, name: string): Promise<void> {
  for (const theme of ['light', 'dark']) {
    await page.evaluate((dark) => document.documentElement.classList.toggle('dark', dark), theme === 'dark');
    await expectAccessible(page, `${name}, ${theme}`);
    await picture(page, `${name.replaceAll(' ', '-')}-${theme}`);
  }
  await page.evaluate(() => document.documentElement.classList.remove('dark'));
}

describe('a rack', () => {
  let browser: Browser;
  let builder: Builder;
  beforeAll(async () => {
    browser = await openBrowser();
    builder = await newBuilder(browser, 'Orla Sawdust');
    await makeGlider(builder);
  });
  afterAll(() => browser.close());

  it('is filled from the keyboard, the density told while typing', async () => {
    const { page, complaints } = builder;
    await page.goto('/rack');
    await page.getByText('Nothing is on the rack yet.').waitFor();
    expect(await page.getByText('Type a number.').count()).toBe(0);
    await inBothThemes(page, 'rack empty');

    await page.getByLabel('Material', { exact: true }).selectOption({ label: 'Balsa, medium' });
    await page.getByLabel('Length', { exact: true }).fill('36 in');
    await page.keyboard.press('Tab');
    await page.keyboard.type('3 in');
    await page.keyboard.press('Tab');
    await page.keyboard.type('1/16 in');
    await page.keyboard.press('Tab');
    // 914.4 × 76.2 × 1.5875 mm is 110.61 cm³; 15.7 g of it is 142 kg/m³.
    await page.keyboard.type('15.7');
    await page.getByText(/^142\skg\/m³, medium$/).waitFor();
    await page.keyboard.press('Enter');
    await expect.poll(() => rows(page).count(), PATIENT).toBe(1);
    for (const mass of ['9.4', '20']) {
      const field = page.getByLabel('Mass', { exact: true });
      await expect
        .poll(() => field.evaluate((input) => input === document.activeElement), PATIENT)
        .toBe(true);
      await expect.poll(() => field.inputValue(), PATIENT).toBe('');
      await page.keyboard.type(mass);
      await page.keyboard.press('Enter');
    }
    await expect.poll(() => rows(page).count(), PATIENT).toBe(3);
    await page.getByText(/^3 pieces, 45\.1\d?\sg; lightest sheet 85\skg\/m³\.$/).waitFor();
    await page.getByRole('button', { name: 'Density' }).click();
    await expect.poll(() => rows(page).first().textContent(), PATIENT).toContain('contest grade');
    await inBothThemes(page, 'rack');

    // What cannot be is told at its field, and nothing typed is lost.
    await page.getByRole('button', { name: 'Like the last' }).click();
    expect(await page.getByLabel('Kind', { exact: true }).inputValue()).toBe('sheet');
    await page.getByLabel('Length', { exact: true }).fill('');
    await page.getByLabel('Mass', { exact: true }).fill('4');
    await page.keyboard.press('Enter');
    await page.getByText('Type a number.').waitFor();
    expect(await page.getByLabel('Mass', { exact: true }).inputValue()).toBe('4');
    expect(complaints).toEqual([]);
  });

  it('lets a piece be cut up, reserved, used and deleted', async () => {
    const { page, complaints } = builder;
    await page.goto('/rack');
    await page.getByRole('link', { name: 'Piece 1', exact: true }).click();
    await page.getByRole('heading', { name: 'Piece 1, sheet of Balsa, medium' }).waitFor();
    await inBothThemes(page, 'rack piece');

    await page.getByRole('button', { name: 'Cut up' }).click();
    await page.getByLabel('Piece wanted 1, length').fill('1000');
    await page.getByText('Too short.').waitFor();
    expect(await dialog(page).getByRole('button', { name: 'Cut up' }).isDisabled()).toBe(true);
    await page.getByLabel('Piece wanted 1, length').fill('300');
    await page.getByLabel('One cut takes away').fill('1');
    await page.getByText(/^613\.4\smm of the length is left over\.$/).waitFor();
    await inBothThemes(page, 'rack split');
    await dialog(page).getByRole('button', { name: 'Cut up' }).click();
    await page.getByText('Cut into').waitFor();
    await page.getByRole('link', { name: 'Piece 4', exact: true }).click();
    await page.getByText(/worked out from the piece it was cut from/).waitFor();
    await page.getByRole('link', { name: 'Piece 1', exact: true }).waitFor();

    await page.getByRole('button', { name: 'Reserve' }).click();
    await dialog(page).getByLabel('Glider', { exact: true }).selectOption({ index: 1 });
    await inBothThemes(page, 'rack reserve');
    await dialog(page).getByRole('button', { name: 'Reserve' }).click();
    await page.getByRole('button', { name: 'Free it' }).waitFor();
    await page.getByRole('button', { name: 'Delete' }).click();
    await dialog(page).getByRole('button', { name: 'Delete' }).click();
    await page.getByText('Not deleted.').waitFor();
    await inBothThemes(page, 'rack delete');
    await page.getByRole('button', { name: 'Keep it' }).click();

    await page.getByRole('button', { name: 'Used' }).click();
    await page.getByRole('button', { name: 'Add a leftover' }).click();
    await page.getByLabel('Length left').fill('120');
    await inBothThemes(page, 'rack use');
    await page.getByRole('button', { name: 'Mark as used' }).click();
    await page.getByText('Left over').waitFor();
    expect(await page.getByRole('button', { name: 'Cut up' }).count()).toBe(0);

    await page.goto('/rack');
    await page.getByRole('link', { name: 'Piece 3', exact: true }).click();
    await page.getByRole('button', { name: 'Edit' }).click();
    await page.getByLabel('Note').fill('one knot at the end');
    await inBothThemes(page, 'rack edit');
    await page.getByRole('button', { name: 'Save' }).click();
    await page.getByText('one knot at the end').waitFor();

    const knot = await page.screenshot({ clip: { x: 0, y: 0, width: 200, height: 120 } });
    await page
      .getByLabel('Photo of the piece')
      .setInputFiles({ name: 'knot.png', mimeType: 'image/png', buffer: knot });
    const photo = page.getByRole('img', { name: 'Piece 3' });
    await photo.waitFor();
    await expect
      .poll(() => photo.evaluate((img) => (img instanceof HTMLImageElement ? img.naturalWidth : 0)), PATIENT)
      .toBe(200);
    const end = await page.screenshot({ clip: { x: 0, y: 0, width: 90, height: 120 } });
    await page
      .getByLabel('Photo of the piece')
      .setInputFiles({ name: 'end.png', mimeType: 'image/png', buffer: end });
    await expect
      .poll(() => photo.evaluate((img) => (img instanceof HTMLImageElement ? img.naturalWidth : 0)), PATIENT)
      .toBe(90);
    await inBothThemes(page, 'rack photo');
    await page.getByRole('button', { name: 'Take it off' }).click();
    await page.getByRole('button', { name: 'Add a photo' }).waitFor();
    await page.getByRole('button', { name: 'Delete' }).click();
    await dialog(page).getByRole('button', { name: 'Delete' }).click();
    await page.waitForURL('**/rack');
    expect(await page.getByRole('link', { name: 'Piece 3', exact: true }).count()).toBe(0);
    // The refused deletion is the only request that failed.
    expect(complaints.filter((one) => !one.includes('409'))).toEqual([]);
  });

  it('takes a table in past its bad lines, and writes one that says the same', async () => {
    const { page } = builder;
    const file = join(tmpdir(), `rack-${Date.now()}.csv`);
    await writeFile(
      file,
      'Kind,Material,Length (in),Width (in),Thickness (in),Mass (g)\n' +
        'sheet,"Balsa, light",36,3,1/8,24\nsheet,"Balsa, light",long,3,1/8,24\n',
    );
    await page.goto('/rack');
    await page.getByRole('button', { name: 'Import a table' }).click();
    await page.getByLabel('Table of stock').setInputFiles(file);
    await page.getByText('1 piece can be taken in; 1 line cannot.').waitFor();
    await inBothThemes(page, 'rack import');
    await page.getByRole('button', { name: 'Take in 1 piece' }).click();
    await page.getByText(/^1 piece was taken in, number \d+\.$/).waitFor();
    await expect
      .poll(() => rows(page).allTextContents(), PATIENT)
      .toContainEqual(expect.stringContaining('Balsa, light'));
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('link', { name: 'Export' }).click(),
    ]);
    const table = await readFile(await download.path(), 'utf8');
    expect(table).toMatch(/"Balsa, light".*914\.4,76\.2,3\.175.*24/);
  });

  it('prints labels of the pieces chosen', async () => {
    const { page } = builder;
    await page.goto('/rack');
    await page.getByLabel('Choose piece 2 for labels').check();
    await page.getByRole('link', { name: 'Labels of 1' }).click();
    await page.getByRole('img', { name: 'Code that opens piece 2' }).waitFor();
    await inBothThemes(page, 'rack labels');
    for (const [index, format] of [
      [0, 'A4'],
      [2, 'single'],
    ] as const) {
      await page.getByLabel('Paper').selectOption({ index });
      const printed = await page.pdf({ preferCSSPageSize: true });
      const boxes = printed.toString('latin1').match(/\/MediaBox/g);
      expect(boxes, format).toHaveLength(1);
    }
  });

  it('is at hand on the phone', async () => {
    const { page, complaints, context } = await signedIn(browser, builder, PHONE);
    await page.goto('/rack');
    await page.getByRole('link', { name: /^2 · Sheet/ }).waitFor();
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(390);
    await inBothThemes(page, 'rack phone');
    await page.getByRole('link', { name: /^2 · Sheet/ }).click();
    await page.getByRole('button', { name: 'Cut up' }).click();
    await inBothThemes(page, 'rack split phone');
    expect(complaints).toEqual([]);
    await context.close();
  });
});
