import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, PHONE, picture, visit } from './support/browser.ts';

/** Types as a person does, key by key, over what stands there, and leaves the field. */
async function typeOver(field: Locator, text: string): Promise<void> {
  await field.click();
  await field.press('ControlOrMeta+a');
  await field.press('Delete');
  await field.pressSequentially(text);
  await field.press('Tab');
}

const plain = (text: string | null) => (text ?? '').replaceAll('\u202f', ' ');
/** The field with all that stands around it. */
const around = (field: Locator) => field.locator('xpath=ancestor::div[label][1]');
const row = (page: Page, name: string) => page.getByRole('button', { name: new RegExp(`^${name}`) }).first();

async function chooseInches(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Menu' }).click();
  await page.getByRole('menuitem', { name: 'Units and numbers …' }).click();
  await page.getByLabel('Inches and ounces').check();
}

describe('numbers as builders write them', () => {
  let browser: Browser;
  beforeAll(async () => {
    browser = await openBrowser();
  });
  afterAll(() => browser.close());

  it('go in in every form, stay as typed, and are told in the field’s own unit and the other', async () => {
    const { page, complaints } = await visit(browser);
    await page.goto('/sample/drawing');
    await row(page, 'Ribs, inner panel').click();
    const thickness = page.getByLabel('Thickness');
    // 1 in = 25.4 mm exactly (NIST SP 811); the sums by hand.
    const lengths = [
      ['2,5 mm', 'mm · 0.0984 in', '2.5'],
      ['2.5', 'mm · 0.0984 in', '2.5'],
      ['1/16 in', '= 1.59 mm', '1.59'],
      ['3 1/2 in', '= 88.9 mm', '88.9'],
      ['31"', '= 787.4 mm', '787.4'],
      ['3\'6"', '= 1 066.8 mm', '1 066.8'],
      ['12+3.5', '= 15.5 mm', '15.5'],
      ['3*12.5', '= 37.5 mm', '37.5'],
      ['31/2', 'mm · 0.610 in', '15.5'],
      ['1/2 in + 3', '= 15.7 mm', '15.7'],
    ] as const;
    for (const [typed, beside, listed] of lengths) {
      await typeOver(thickness, typed);
      expect(await thickness.inputValue()).toBe(typed);
      await expect.poll(async () => plain(await around(thickness).textContent())).toContain(beside);
      await expect
        .poll(async () => plain(await row(page, 'Ribs, inner panel').textContent()))
        .toContain(listed);
    }

    await page.getByRole('button', { name: 'Items' }).click();
    await row(page, 'Timer').click();
    const mass = page.getByLabel('Mass', { exact: true });
    await typeOver(mass, '0.4 oz');
    expect(await mass.inputValue()).toBe('0.4 oz');
    // 0.4 × 28.349523125 g
    await expect.poll(async () => plain(await around(mass).textContent())).toContain('= 11.3 g');
    expect(complaints).toEqual([]);
  });

  it('are missing when empty, refused with the reason, and keep the last good figure', async () => {
    const { page, complaints } = await visit(browser);
    await page.goto('/sample/drawing');
    await row(page, 'Ribs, inner panel').click();
    const thickness = page.getByLabel('Thickness');
    const before = plain(await row(page, 'Ribs, inner panel').textContent());
    const faults = [
      ['', 'Type a number.'],
      ['1,234.5', 'Comma or point is the decimal mark'],
      ['3 furlongs', 'That unit is not known.'],
      ['3 g', 'That unit measures something else.'],
      ['1/0', 'cannot be over 0'],
      ['3 mm * 2 mm', 'by a number without a unit'],
      ['12 +', 'Not a number.'],
    ] as const;
    for (const [typed, told] of faults) {
      // At once, as it is pasted: key by key the figure follows each number on the way.
      await thickness.fill(typed);
      await thickness.press('Tab');
      await page.getByText(told).first().waitFor();
      expect(await thickness.inputValue()).toBe(typed);
      expect(await thickness.getAttribute('aria-invalid')).toBe('true');
      expect(plain(await row(page, 'Ribs, inner panel').textContent())).toBe(before);
    }
    expect(complaints).toEqual([]);
  });

  it('step by half a mm, by sixteenths of an inch, tenfold with Shift', async () => {
    const { page } = await visit(browser);
    await page.goto('/sample/drawing');
    await row(page, 'Ribs, inner panel').click();
    const thickness = page.getByLabel('Thickness');
    await typeOver(thickness, '2');
    await thickness.press('ArrowUp');
    expect(await thickness.inputValue()).toBe('2.5');
    await thickness.press('Shift+ArrowUp');
    expect(await thickness.inputValue()).toBe('7.5');
    await typeOver(thickness, '1/16 in');
    await thickness.press('ArrowUp');
    expect(await thickness.inputValue()).toBe('1/8 in');
    await thickness.press('Shift+ArrowUp');
    expect(await thickness.inputValue()).toBe('3/4 in');
  });

  it('follow a visitor’s inches and ounces on every page, also after a reload', async () => {
    const { page, complaints } = await visit(browser);
    const titleBlock = page.getByRole('region', { name: 'Title block' });
    await page.goto('/sample/drawing');
    await chooseInches(page);
    await expectAccessible(page, 'units and numbers');
    await picture(page, 'units');
    await page.getByText('How numbers are written').waitFor();
    await page.getByRole('button', { name: 'Done' }).click();
    // 221.4 g ÷ 28.349523125
    await expect.poll(async () => plain(await titleBlock.textContent()), PATIENT).toContain('7.81 oz');
    await expect
      .poll(async () => plain(await page.getByRole('heading', { level: 1 }).textContent()))
      .toMatch(/in of span, .* in² of wing, .* oz$/);

    await row(page, 'Ribs, inner panel').click();
    const thickness = page.getByLabel('Thickness');
    await typeOver(thickness, '1/16');
    await expect.poll(async () => plain(await around(thickness).textContent())).toContain('in · 1.59 mm');
    await expect
      .poll(async () => plain(await row(page, 'Ribs, inner panel').textContent()))
      .toContain('1/16');
    await picture(page, 'drawing-inches');

    await page.reload();
    await page.getByRole('link', { name: 'Balance', exact: true }).click();
    const sheet = page.getByRole('table', { name: 'Balance sheet' });
    await sheet.waitFor();
    const heads = (await sheet.getByRole('columnheader').allTextContents()).map(plain);
    expect(heads).toEqual(['Group and part', 'Mass oz', '±', 'Arm in', 'Moment oz·in', 'Share %']);
    await page.getByText('in aft of the datum').waitFor();
    await expectAccessible(page, 'balance in inches');
    await picture(page, 'balance-inches');

    await page.getByRole('link', { name: 'Loading', exact: true }).click();
    await page.getByText('US Standard Atmosphere 1976').first().waitFor();
    expect(plain(await page.getByRole('heading', { level: 1 }).textContent())).toMatch(/oz\/ft².* g\/dm²$/);
    for (const head of ['in²', 'oz/ft²', 'ft/s']) {
      await page.getByRole('columnheader', { name: head, exact: true }).first().waitFor();
    }

    await page.goto('/materials');
    await page.getByRole('columnheader', { name: /Density.*lb\/ft³/ }).waitFor();
    expect(complaints).toEqual([]);
  });

  it('take one quantity in inches and the rest in grams, on the phone too', async () => {
    const { page } = await visit(browser, { ...PHONE, colorScheme: 'dark' });
    await page.goto('/sample/balance');
    await page.getByRole('button', { name: 'Menu' }).click();
    await page.getByRole('menuitem', { name: 'Units and numbers …' }).click();
    await page.getByText('Each quantity on its own').click();
    await page.getByLabel('Unit for lengths and arms').selectOption('in');
    await expectAccessible(page, 'units on the phone');
    await picture(page, 'units-phone');
    await page.getByRole('button', { name: 'Done' }).click();
    const sheet = page.getByRole('table', { name: 'Balance sheet' });
    const heads = (await sheet.getByRole('columnheader').allTextContents()).map(plain);
    expect(heads).toContain('Mass g');
    expect(heads).toContain('Arm in');
  });
});
