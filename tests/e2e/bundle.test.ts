import { gzipSync } from 'node:zlib';
import type { Browser, Page, Response } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { BUDGETS } from '#server/house/bundle-sizes.mjs';
import { openBrowser } from '#tests/support/chromium.ts';
import { visit } from './support/browser.ts';
import { makeGlider, newBuilder, titleBlock } from './support/desk.ts';

/** Notes when the first element of a kind is there; what is fetched later was not waited for. */
const noting = (selector: string) => `
  new MutationObserver((_, watch) => {
    if (!document.querySelector(${JSON.stringify(selector)})) return;
    globalThis.usableAt = performance.now();
    watch.disconnect();
  }).observe(document, { subtree: true, childList: true });`;

/** JavaScript that a page asks for from an empty cache before `selector` stands there, kB (1,000 bytes), gzip. */
async function fetchedBefore(selector: string, page: Page, path: string): Promise<number> {
  const answers = new Map<string, Response>();
  page.on('response', (answer) => answers.set(answer.url(), answer));
  await page.addInitScript({ content: noting(selector) });
  await page.goto(path);
  await page.locator(selector).first().waitFor();
  const asked = await page.evaluate(() => {
    const until = Number(Reflect.get(globalThis, 'usableAt'));
    if (!(until > 0)) throw new Error('nobody noted when the page was usable');
    return performance
      .getEntriesByType('resource')
      .filter(({ name, startTime }) => name.endsWith('.js') && startTime <= until)
      .map(({ name }) => name);
  });
  const bodies = await Promise.all([...new Set(asked)].map(async (url) => answers.get(url)?.body()));
  // Every file asked for has an answer: one without would count as nothing.
  expect(bodies.every((body) => body !== undefined && body.length > 0)).toBe(true);
  return bodies.reduce((sum, body) => sum + gzipSync(body ?? '', { level: 9 }).length, 0) / 1000;
}

const budgetOf = (wanted: string) => BUDGETS.find(({ page }) => page === wanted)?.budget ?? Number.NaN;

/** What the build counts by its imports, counted once more as a browser fetches it: what a page asks for by itself too. */
describe('the JavaScript of a page, as fetched', () => {
  let browser: Browser;
  beforeAll(async () => {
    browser = await openBrowser();
  });
  afterAll(() => browser.close());

  it('keeps the sign-in page within its budget until it can be typed in', async () => {
    const { page } = await visit(browser);
    const size = await fetchedBefore('form input[type=email]', page, '/sign-in');
    await page.getByLabel('E-mail').fill('builder@larkmoor.example');
    expect(size).toBeLessThanOrEqual(budgetOf('sign-in'));
    // Less than the framework alone comes to would mean that something was not counted.
    expect(size).toBeGreaterThan(60);
  });

  it('keeps a glider’s Balance within its budget until its figures stand there', async () => {
    const builder = await newBuilder(browser, 'Lighter than it looks');
    const { id } = await makeGlider(builder);
    const { page } = builder;
    const size = await fetchedBefore('main table', page, `/gliders/${id}/balance`);
    await titleBlock(page).getByText('g/dm²').first().waitFor();
    await page.getByRole('table', { name: 'Balance sheet' }).waitFor();
    expect(size).toBeLessThanOrEqual(budgetOf('a glider’s Balance'));
    expect(size).toBeGreaterThan(120);
  });
});
