import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, picture } from './support/browser.ts';
import { makeGlider, newBuilder } from './support/desk.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

describe('a cut list', () => {
  it('packs sticks on stock, takes the rack first, splices what is too long, and prints with boxes', async () => {
    const builder = await newBuilder(browser, 'Birte Lund');
    const { page, complaints, context } = builder;
    const { id } = await makeGlider(builder);
    await page.goto(`/gliders/${id}/cut`);
    const title = () => page.getByRole('heading', { level: 1 }).textContent();
    await expect
      .poll(title, PATIENT)
      .toMatch(/^\d+ sticks and \d+ pieces of sheet; \d+ sticks and \d+ sheets to buy$/);
    await page.getByText('no stick needs a splice.').waitFor();
    await expectAccessible(page, 'the cut list');
    await picture(page, 'cut');

    await page.getByLabel('Sticks are sold at').fill('13 in');
    await page
      .getByText(/Scarf of 24\.0\s?mm, its middle .* between ribs \d and \d/)
      .first()
      .waitFor();
    await page.reload();
    await expect.poll(() => page.getByLabel('Sticks are sold at').inputValue(), PATIENT).toBe('330.2');
    await page.getByLabel('Sticks are sold at').fill('36 in');
    await page.getByText('no stick needs a splice.').waitFor();

    const before = await title();
    const spar = await page.getByRole('heading', { level: 2 }).nth(1).textContent();
    expect(spar).toContain('Spruce');
    const answer = await context.request.post('/api/rack', {
      data: {
        kind: 'stick',
        material: { key: 'spruce', name: 'Spruce (Sitka)', category: 'wood' },
        length: 1000,
        width: 6,
        thickness: 3,
        wall: null,
        mass: null,
        resolution: null,
        grade: '',
        grainCut: null,
        note: '',
      },
    });
    expect(answer.status()).toBe(201);
    await page.reload();
    await expect.poll(title, PATIENT).not.toBe(before);
    expect(await title()).toContain('from your rack');
    await page.emulateMedia({ media: 'print', colorScheme: 'light' });
    await expect.poll(() => page.getByText('☐').first().isVisible(), PATIENT).toBe(true);
    await picture(page, 'cut-print');
    expect(complaints).toEqual([]);
  });
});
