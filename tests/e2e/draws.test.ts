import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, PHONE, picture, visit } from './support/browser.ts';

/** The sample is Dunlin: 221.4 g at 53.6 % MAC, wanted at 52 ± 2. */
const HEADLINE =
  /^All-up mass lies between \d+\.\d and \d+\.\d g nine times in ten; balance \d+\.\d–\d+\.\d % MAC$/;

const section = (page: Page) => page.getByRole('region', { name: /^All-up mass lies/ });
const headline = async (page: Page) =>
  ((await section(page).getByRole('heading').first().textContent()) ?? '').replaceAll('\u202f', ' ');
/** The 5, 50 and 95 % points of mass and balance. */
const figures = (page: Page) =>
  section(page).getByRole('table', { name: 'Mass and balance as drawn' }).textContent();

/** A million draws take a good machine less than a second: here they come to no end as long as the page is told so. */
const WITHOUT_END = `
  const Real = Worker;
  globalThis.Worker = class extends Real {
    addEventListener(type, listener) {
      super.addEventListener(type, (event) => {
        if (!(globalThis.withoutEnd && event.data?.type === 'answer')) listener(event);
      });
    }
  };`;

describe('draws', () => {
  let browser: Browser;
  beforeAll(async () => {
    browser = await openBrowser();
  });
  afterAll(() => browser.close());

  it('are the same from the same seed, kept for the next visit, and follow what is typed', async () => {
    const { page, complaints } = await visit(browser);
    await page.goto('/sample/trial');
    await section(page).waitFor();
    expect(await headline(page)).toMatch(HEADLINE);
    await section(page).getByText('The draws agree with the sum of squares').waitFor();
    const first = await figures(page);

    await section(page).getByRole('button', { name: 'Another seed' }).click();
    await expect.poll(() => figures(page), PATIENT).not.toBe(first);
    const second = await figures(page);
    await section(page).getByLabel('Seed', { exact: true }).fill('1');
    await expect.poll(() => figures(page), PATIENT).toBe(first);
    await section(page).getByLabel('Seed', { exact: true }).fill('2');
    await expect.poll(() => figures(page), PATIENT).toBe(second);
    await section(page).getByLabel('Thickness of sheet ±').fill('0.4');
    await expect.poll(() => figures(page), PATIENT).not.toBe(second);
    const thicker = await figures(page);

    await page.reload();
    await expect.poll(() => figures(page), PATIENT).toBe(thicker);
    expect(await section(page).getByLabel('Seed', { exact: true }).inputValue()).toBe('2');

    for (const chart of ['All-up mass, g', 'Balance, % MAC', 'Which material the doubt comes from']) {
      await section(page).getByRole('figure', { name: chart }).getByText('Table', { exact: true }).click();
      await section(page).getByRole('table', { name: chart }).waitFor();
    }
    await expectAccessible(page, 'the draws, tables open');
    await picture(page, 'draws');
    expect(complaints).toEqual([]);
  });

  it('by the million show how far they have come, can be stopped, and keep nobody from working', async () => {
    const { page, complaints } = await visit(browser);
    await page.addInitScript({ content: WITHOUT_END });
    await page.goto('/sample/trial');
    await section(page).waitFor();
    const first = await figures(page);
    await page.evaluate(() => Object.assign(window, { withoutEnd: true }));
    await section(page).getByLabel('Draws', { exact: true }).fill('1000000');
    await section(page)
      .getByText(/^Drawing 1.000.000 times: \d+.%\.$/)
      .waitFor();
    await section(page).getByRole('progressbar', { name: 'Draws done' }).waitFor();
    // The page answers while the worker draws: a trial is added and its column stands there.
    await page.getByRole('button', { name: 'Add a trial' }).click();
    await page.getByLabel('Name of trial 2').waitFor();
    expect(await section(page).getByRole('progressbar').count()).toBe(1);
    await section(page).getByRole('button', { name: 'Stop' }).click();
    await section(page).getByText('Stopped. The figures shown are those of before.').waitFor();
    expect(await figures(page)).toBe(first);

    await page.evaluate(() => Object.assign(window, { withoutEnd: false }));
    // Fewer again, and the newest question is the one that is answered.
    await section(page).getByLabel('Draws', { exact: true }).fill('20000');
    await section(page).getByText('Stopped.').waitFor({ state: 'detached' });
    await expect.poll(() => figures(page), PATIENT).toBe(first);
    expect(complaints).toEqual([]);
  });

  it('scatter less where a sheet was weighed, on the phone', async () => {
    const { page, complaints } = await visit(browser, PHONE);
    await page.goto('/sample/trial');
    await section(page).waitFor();
    const before = await figures(page);
    await section(page).getByText('Weighed sheets and sticks').click();
    await section(page).getByRole('button', { name: 'Add a weighed piece' }).click();
    await section(page).getByLabel('Piece', { exact: true }).fill('Sheet from the stall');
    const parts = section(page).getByRole('group', { name: 'Parts cut from Sheet from the stall' });
    await parts.getByRole('checkbox').first().check();
    await expect.poll(() => figures(page), PATIENT).not.toBe(before);
    await expectAccessible(page, 'a weighed piece on the phone');
    await picture(page, 'draws-phone');
    const wider = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
    expect(wider).toBeLessThanOrEqual(0);
    await section(page).getByRole('button', { name: 'Remove Sheet from the stall' }).click();
    await expect.poll(() => figures(page), PATIENT).toBe(before);
    expect(complaints).toEqual([]);
  });
});
