import { gzipSync } from 'node:zlib';
import type { Browser, Page, Response } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { BUDGETS } from '#server/house/bundle-sizes.mjs';
import { openBrowser } from '#tests/support/chromium.ts';
import { visit } from './support/browser.ts';
import { makeGlider, newBuilder, titleBlock } from './support/desk.ts';

/** JavaScript that a page fetches from an empty cache until it is usable, kB (1,000 bytes), gzip. */
async function fetchedUntil(
  page: Page,
  path: string,
  usable: (page: Page) => Promise<void>,
): Promise<number> {
  const answers: Response[] = [];
  const listen = (answer: Response) => {
    if (new URL(answer.url()).pathname.endsWith('.js')) answers.push(answer);
  };
  page.on('response', listen);
  await page.goto(path);
  await usable(page);
  page.off('response', listen);
  const bodies = await Promise.all(answers.map((answer) => answer.body()));
  expect(new Set(answers.map((answer) => answer.url())).size, 'files fetched once').toBe(answers.length);
  return bodies.reduce((sum, body) => sum + gzipSync(body, { level: 9 }).length, 0) / 1000;
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
    const size = await fetchedUntil(page, '/sign-in', async () => {
      await page.getByLabel('E-mail').fill('builder@larkmoor.example');
      await page.getByRole('button', { name: 'Sign in' }).isEnabled();
    });
    expect(size).toBeLessThanOrEqual(budgetOf('sign-in'));
    // Less than the framework alone comes to would mean that something was not counted.
    expect(size).toBeGreaterThan(60);
  });

  it('keeps a glider’s Balance within its budget until its figures stand there', async () => {
    const builder = await newBuilder(browser, 'Lighter than it looks');
    const { id } = await makeGlider(builder);
    const { page } = builder;
    const size = await fetchedUntil(page, `/gliders/${id}/balance`, async () => {
      await titleBlock(page).getByText('g/dm²').first().waitFor();
      await page.getByRole('table', { name: /balance sheet/i }).waitFor();
    });
    expect(size).toBeLessThanOrEqual(budgetOf('a glider’s Balance'));
    expect(size).toBeGreaterThan(120);
  });
});
