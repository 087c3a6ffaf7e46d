import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PLACES } from '#client/app/paths.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { picture } from './support/browser.ts';
import { makeGlider, newBuilder } from './support/desk.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

describe('text of twice the size on a narrow window', () => {
  it('makes no page wider than the window', async () => {
    // A window, not a phone: a phone would show a wide page smaller and hide that it is.
    const builder = await newBuilder(browser, 'Vera Holm', { viewport: { width: 390, height: 844 } });
    const { page } = builder;
    const { id } = await makeGlider(builder);
    const places = PLACES.map((place) => `/gliders/${id}/${place}`);
    const pages = [
      '/bench',
      '/start',
      '/rack',
      '/materials',
      '/account',
      ...places,
      `/gliders/${id}/sharing`,
    ];
    const wide: string[] = [];
    for (const path of pages) {
      await page.goto(path);
      await page.getByRole('heading', { level: 1 }).first().waitFor();
      await page.waitForLoadState('networkidle');
      await page.evaluate(() => document.documentElement.style.setProperty('font-size', '200%'));
      const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      if (over > 0) wide.push(`${path} by ${over} px`);
    }
    await picture(page, 'large-text');
    expect(wide).toEqual([]);
  });
});
