import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { SAMPLE_PLACES } from '#client/app/paths.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, visit } from './support/browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

const plain = (text: string | null) =>
  (text ?? '').replaceAll('\u202f', ' ').replaceAll('\u2212', '-').replace(/\s+/g, ' ').trim();
/** Every number of a text, with the decimals that it stands there with. */
const numbersIn = (text: string) =>
  [...text.matchAll(/-?\d(?:[\d ]*\d)?(?:\.\d+)?/g)].map(([number]) => {
    const digits = number.replaceAll(' ', '');
    return { value: Number(digits), decimals: digits.split('.')[1]?.length ?? 0 };
  });
/** Whether a number rounds to the figure as it is shown; units of their own scale are left to the unit tests. */
const isTold = (told: string, { value, decimals }: { value: number; decimals: number }) =>
  numbersIn(told).some((one) => Math.abs(one.value - value) <= 0.51 * 10 ** -decimals);

const figures = (page: Page) =>
  page.locator('button[aria-haspopup="dialog"]').filter({ hasText: ', ask why' });

/** What is wrong with the answers on the page that is open; empty where every figure says how it was made. */
async function wrongAnswers(page: Page): Promise<string[]> {
  const wrong: string[] = [];
  const all = figures(page);
  const count = await all.count();
  expect(count).toBeGreaterThan(0);
  for (let i = 0; i < count; i++) {
    const figure = all.nth(i);
    // A second figure of the same question is asked by pointer only.
    if (!(await figure.isVisible()) || (await figure.getAttribute('tabindex')) === '-1') continue;
    const pressed = plain(await figure.textContent()).replace(', ask why', '');
    await figure.focus();
    await page.keyboard.press('Enter');
    const panel = page.getByRole('dialog');
    await panel.getByRole('heading').waitFor();
    const told = plain(await panel.innerText());
    const [number] = numbersIn(pressed);
    if (!/\d/.test(told)) wrong.push(`${pressed}: no numbers in ${told}`);
    if (number && !isTold(told, number)) wrong.push(`${pressed}: ${number.value} is not in ${told}`);
    if (!/[=·Σ÷√×]/.test(told)) wrong.push(`${pressed}: no formula in ${told}`);
    if (i === 0) await expectAccessible(page, `why ${pressed}`);
    await page.keyboard.press('Escape');
    await panel.waitFor({ state: 'detached' });
    await expect
      .poll(() => figure.evaluate((element) => element === document.activeElement), PATIENT)
      .toBe(true);
  }
  return wrong;
}

describe('every figure that can be asked', () => {
  it.each(SAMPLE_PLACES)(
    'of %s says how it was made, with its own number, and gives the focus back',
    async (place) => {
      const { page, complaints } = await visit(browser);
      await page.goto(`/sample/${place}`);
      await page.getByRole('heading', { level: 1 }).waitFor();
      await page.waitForLoadState('networkidle');
      expect(await wrongAnswers(page)).toEqual([]);
      expect(complaints).toEqual([]);
    },
  );
});
