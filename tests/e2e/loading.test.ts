import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, PHONE, picture, visit } from './support/browser.ts';

/** The sample is Dunlin: margin 4.2 at 6 g, so 25.4 g at its strength; it stalls at 4.69 m/s. */
describe('loading', () => {
  let browser: Browser;
  beforeAll(async () => {
    browser = await openBrowser();
  });
  afterAll(() => browser.close());

  it('says what the spar stands, case by case, and leads to the strip that gives first', async () => {
    const { page, complaints } = await visit(browser);
    await page.goto('/sample/loading');
    const spar = page.getByRole('region', { name: /^Margin/ });
    await spar.getByRole('heading', { name: 'Margin 4.2 at the root at 6 g' }).waitFor();
    await spar.getByText('No licence to launch hard.').waitFor();

    await spar.getByText('Table', { exact: true }).click();
    expect(
      await spar.getByRole('table', { name: 'Margin along the half span' }).getByRole('row').count(),
    ).toBe(22);

    // 24 m/s is 5.12 × the stall: 26.2 g, more than the strips stand.
    await spar.getByLabel('Hand launch, speed').fill('24');
    await spar.getByRole('radio', { name: /Hand launch/ }).check();
    await spar.getByRole('heading', { name: 'Margin 0.97 at the root at 26.2 g' }).waitFor();
    await spar.getByText('Over its strength.').waitFor();
    await expectAccessible(page, 'loading, over its strength');
    await picture(page, 'loading-spar');

    // Kept in this browser; a stated load factor is the plan's own.
    await page.reload();
    await spar.getByRole('heading', { name: 'Margin 0.97 at the root at 26.2 g' }).waitFor();
    await spar.getByRole('radio', { name: /As stated/ }).check();
    await spar.getByLabel('Load factor stated').fill('12');
    await spar.getByRole('heading', { name: 'Margin 2.1 at the root at 12 g' }).waitFor();

    await spar.getByRole('link', { name: 'Stringer, bottom fore' }).click();
    await page.waitForURL('**/sample/drawing');
    await expect
      .poll(() => page.getByLabel('Name', { exact: true }).first().inputValue(), PATIENT)
      .toBe('Stringer, bottom fore');
    expect(complaints).toEqual([]);
  });

  it('tells on the phone what the day’s air adds, against a class minimum', async () => {
    const { page, complaints } = await visit(browser, PHONE);
    await page.goto('/sample/loading');
    const weather = page.getByRole('region', { name: /at the field/ });
    await weather.getByRole('heading', { name: '3.8 g heavier at the field than in the workshop' }).waitFor();
    const field = weather.getByRole('group', { name: 'Field' });
    await field.getByLabel('Relative humidity').fill('20');
    await weather.getByRole('heading', { name: /lighter at the field than in the workshop/ }).waitFor();
    await weather.getByLabel('Least mass of the class').fill('220');
    await weather
      .getByRole('row', { name: /Dry day/ })
      .getByText(/short/)
      .waitFor();
    await weather
      .getByRole('row', { name: /Damp day/ })
      .getByText(/over/)
      .waitFor();
    // A table that has grown a column is measured in the next frame, and then reached by the keyboard if it scrolls.
    await page.evaluate(
      () => new Promise((done) => requestAnimationFrame(() => requestAnimationFrame(done))),
    );
    await expectAccessible(page, 'weather on the phone');
    await picture(page, 'loading-weather-phone');
    const wider = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
    expect(wider).toBeLessThanOrEqual(0);
    expect(complaints).toEqual([]);
  });
});
