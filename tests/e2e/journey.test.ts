import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, picture, visit } from './support/browser.ts';

/** The main job as somebody new does it: from the printed address to a balance sheet that can be kept. */
describe('from plan and wood to a balance sheet', () => {
  let browser: Browser;
  beforeAll(async () => {
    browser = await openBrowser();
  });
  afterAll(() => browser.close());

  it('is walked by a visitor who signs up, draws, picks wood, trims, tries woods and keeps a sheet', async () => {
    const { page, complaints } = await visit(browser);
    const titleBlock = page.getByRole('region', { name: 'Title block' });

    await page.goto('/');
    await page.getByRole('heading', { level: 1 }).waitFor();
    await expectAccessible(page, 'home');
    await picture(page, 'home');

    await page.getByRole('link', { name: 'Open the sample' }).click();
    await page.waitForURL('**/sample/drawing');
    await expect.poll(() => titleBlock.textContent(), PATIENT).toContain('221.4');
    await expectAccessible(page, 'sample drawing');
    await picture(page, 'drawing');

    // A lighter nose: the figure moves at once, without a server.
    await page
      .getByRole('button', { name: /^Nose sheeting/ })
      .first()
      .click();
    await page.getByLabel('Material', { exact: true }).selectOption('balsa-light');
    await expect.poll(() => titleBlock.textContent(), PATIENT).not.toContain('221.4');

    await page.getByRole('link', { name: 'Sign up' }).first().click();
    await page.getByRole('heading', { level: 1, name: 'Sign up' }).waitFor();
    await page.getByLabel('Name').fill('Wilma Thatcher');
    await page.getByLabel('E-mail').fill('wilma@example.org');
    await page.getByLabel('Password').fill('short');
    await page.getByRole('button', { name: 'Sign up' }).click();
    await page.getByText('Use at least 10 characters.').waitFor();
    await expectAccessible(page, 'sign-up');
    await page.getByLabel('Password').fill('feathers and beams');
    await page.getByRole('button', { name: 'Sign up' }).click();
    await page.waitForURL((url) => !url.pathname.startsWith('/sign-up'));

    await page.goto('/bench');
    await page.getByRole('heading', { level: 1 }).waitFor();
    await expectAccessible(page, 'empty bench');
    await picture(page, 'bench-empty');
    await page.getByRole('button', { name: 'Copy the sample' }).click();
    await page.waitForURL('**/gliders/*/drawing');

    // A wrong entry says so at the field and keeps the last good figure.
    const span = page.getByLabel('Panel 1, span', { exact: true });
    await span.fill('-5');
    await page.getByText('Must be more than 0 mm.').waitFor();
    await span.fill('372,5');
    await expect.poll(() => titleBlock.textContent(), PATIENT).toContain('Saved');
    await page.reload();
    await expect
      .poll(() => page.getByLabel('Panel 1, span', { exact: true }).inputValue(), PATIENT)
      .toBe('372.5');

    await page.getByRole('link', { name: 'Balance', exact: true }).click();
    await page.getByRole('button', { name: 'Fit it' }).click();
    await expect.poll(() => page.getByRole('heading', { level: 1 }).textContent(), PATIENT).toContain('52.0');
    await expectAccessible(page, 'balance');
    await picture(page, 'balance');

    await page.getByRole('link', { name: 'Loading', exact: true }).click();
    await page.getByText('US Standard Atmosphere 1976').first().waitFor();
    await expectAccessible(page, 'loading');
    await picture(page, 'loading');

    await page.getByRole('link', { name: 'Wood trial', exact: true }).click();
    await page.getByRole('button', { name: 'Make this the plan' }).first().waitFor();
    await expectAccessible(page, 'wood trial');
    await picture(page, 'trial');

    await page.getByRole('link', { name: 'Sheets', exact: true }).click();
    await page.getByLabel('Note on the sheet').fill('Before cutting');
    await expect.poll(() => titleBlock.textContent(), PATIENT).toContain('Saved');
    await page.getByRole('button', { name: 'Save a sheet' }).click();
    await page.getByRole('link', { name: 'No. 1' }).first().waitFor();
    await expectAccessible(page, 'sheets');
    await picture(page, 'sheets');
    await page.getByRole('link', { name: 'No. 1' }).first().click();
    await page.waitForURL('**/sheets/*');
    await page.getByLabel(/^Balance sheet 1 of/).waitFor();
    await expectAccessible(page, 'a sheet');
    await picture(page, 'sheet');
    expect(await page.getByLabel(/^Balance sheet 1 of/).textContent()).toContain('Before cutting');

    await page.goto('/materials');
    await page.getByLabel('Search').fill('spruce');
    await page.getByText('Spruce (Sitka)').first().waitFor();
    await expectAccessible(page, 'materials');
    expect(complaints).toEqual([]);
  });
});
