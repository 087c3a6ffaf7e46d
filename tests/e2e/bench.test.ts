import { readFile, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { demoPlan } from '#tests/support/plans.ts';
import { expectAccessible, PATIENT, PHONE, picture } from './support/browser.ts';
import { newBuilder, signedIn, type Builder } from './support/desk.ts';

const MANY = 200;
const PAGE = 50;

/** A bench of many gliders, each heavier than the one before: `Glider 001` is the lightest. */
async function fillBench({ context }: Builder, count: number): Promise<void> {
  const plan = demoPlan('plover');
  const name = (i: number) => `Glider ${String(i + 1).padStart(3, '0')}`;
  for (let from = 0; from < count; from += 10) {
    const some = Array.from({ length: Math.min(10, count - from) }, (_, i) => from + i);
    const answers = await Promise.all(
      some.map((i) => {
        const items = plan.items.map((item, at) =>
          at === 0 ? { ...item, mass: item.mass + i * 0.1 } : item,
        );
        return context.request.post('/api/gliders', { data: { plan: { ...plan, name: name(i), items } } });
      }),
    );
    expect(answers.map((answer) => answer.status())).toEqual(some.map(() => 201));
  }
}

const rows = (page: Page) => page.getByRole('table').locator('tbody tr');
const names = (page: Page) => rows(page).locator('th').getByRole('link').allTextContents();

describe('a long bench', () => {
  let browser: Browser;
  let builder: Builder;
  beforeAll(async () => {
    browser = await openBrowser();
    builder = await newBuilder(browser, 'Bruno Planks');
    await fillBench(builder, MANY);
  });
  afterAll(() => browser.close());

  it('comes a page at a time, sorted and searched by the server', async () => {
    const { page, complaints } = builder;
    const asked: URL[] = [];
    page.on('request', (request) => {
      const url = new URL(request.url());
      if (url.pathname === '/api/gliders' && request.method() === 'GET') asked.push(url);
    });
    await page.goto('/bench');
    await expect.poll(() => rows(page).count(), PATIENT).toBe(PAGE);
    expect(asked).toHaveLength(1);
    await expectAccessible(page, 'bench');
    await picture(page, 'bench');

    await page.getByRole('button', { name: 'Show more' }).click();
    await expect.poll(() => rows(page).count(), PATIENT).toBe(2 * PAGE);
    // The next page is asked for by where the one before ended, not by counting through it.
    expect(asked.at(-1)?.searchParams.get('cursor')).toBeTruthy();

    await page.getByRole('button', { name: 'Mass' }).click();
    await expect.poll(async () => (await names(page))[0], PATIENT).toBe('Glider 001');
    await page.getByRole('button', { name: 'Mass' }).click();
    await expect.poll(async () => (await names(page))[0], PATIENT).toBe(`Glider ${MANY}`);
    expect(await page.getByRole('columnheader', { name: 'Mass' }).getAttribute('aria-sort')).toBe(
      'descending',
    );
    await page.getByLabel('Order').selectOption({ label: 'Name, A to Z' });
    await expect
      .poll(async () => (await names(page)).slice(0, 2), PATIENT)
      .toEqual(['Glider 001', 'Glider 002']);

    // The view stands in the address: a reload keeps it.
    await page.getByLabel('Search by name').fill('GLIDER 19');
    await expect.poll(async () => (await names(page)).length, PATIENT).toBe(10);
    await page.reload();
    await expect.poll(async () => (await names(page))[0], PATIENT).toBe('Glider 190');
    await page.getByLabel('Search by name').fill('heron');
    await page.getByText('No glider’s name holds “heron”.').waitFor();
    expect(complaints).toEqual([]);
  });

  it('is copied, put away, brought back, exported and imported by the handful', async () => {
    const { page, complaints } = builder;
    await page.goto('/bench?search=glider+00&sort=name');
    await expect.poll(() => rows(page).count(), PATIENT).toBe(9);
    await page.getByRole('button', { name: 'Select', exact: true }).click();
    for (const name of ['Glider 001', 'Glider 003']) await page.getByLabel(`Select ${name}`).check();
    await page.getByText('2 gliders selected').waitFor();
    await expectAccessible(page, 'selecting on the bench');
    await picture(page, 'bench-selecting');

    const bar = page.getByRole('region', { name: 'Selected gliders' });
    await bar.getByRole('button', { name: 'Copy' }).click();
    await page.getByText('2 gliders copied.').waitFor();
    await expect.poll(() => names(page), PATIENT).toContain('Glider 003, copy');

    for (const name of ['Glider 001, copy', 'Glider 003, copy'])
      await page.getByLabel(`Select ${name}`).check();
    const download = page.waitForEvent('download');
    await bar.getByRole('button', { name: 'Export' }).click();
    const file = join(tmpdir(), `bench-${Date.now()}.json`);
    await (await download).saveAs(file);
    const exported = JSON.parse(await readFile(file, 'utf8')) as { plans: { name: string }[] };
    expect(exported.plans.map(({ name }) => name)).toEqual(['Glider 001, copy', 'Glider 003, copy']);

    await bar.getByRole('button', { name: 'Archive' }).click();
    await page.getByText('2 gliders put away.').waitFor();
    await expect.poll(() => rows(page).count(), PATIENT).toBe(9);
    await page.getByLabel('Shown', { exact: true }).selectOption({ label: 'Archived' });
    await expect.poll(() => names(page), PATIENT).toEqual(['Glider 001, copy', 'Glider 003, copy']);
    await expectAccessible(page, 'archived gliders');
    await page.getByLabel('Select all that are shown').check();
    await bar.getByRole('button', { name: 'Back into use' }).click();
    await page.getByText('Nothing is put away.').or(page.getByText('No glider’s name holds')).waitFor();

    await page.goto('/bench');
    await page.getByRole('button', { name: 'New glider' }).click();
    await page.getByRole('menuitem', { name: 'Import plans …' }).click();
    await page.getByLabel('Plan file').setInputFiles(file);
    await page.getByText('2 plans: Glider 001, copy, Glider 003, copy').waitFor();
    await expectAccessible(page, 'import');
    await page.getByRole('button', { name: 'Import', exact: true }).click();
    await page.getByText('2 gliders lie on the bench.').waitFor();

    const broken = join(tmpdir(), `broken-${Date.now()}.json`);
    await writeFile(broken, JSON.stringify({ plans: [demoPlan('plover'), { name: '' }] }));
    await page.getByRole('button', { name: 'New glider' }).click();
    await page.getByRole('menuitem', { name: 'Import plans …' }).click();
    await page.getByLabel('Plan file').setInputFiles(broken);
    await page.getByText('Not imported.').waitFor();
    await page
      .getByText(/^Plan 2: /)
      .first()
      .waitFor();
    expect(await page.getByRole('button', { name: 'Import', exact: true }).isDisabled()).toBe(true);
    expect(complaints).toEqual([]);
  });

  it('has a menu for each glider and stays usable on the phone', async () => {
    const phone = await signedIn(browser, builder, { ...PHONE, colorScheme: 'dark' });
    const { page, complaints } = phone;
    await page.goto('/bench?search=glider+0&sort=name');
    await expect.poll(() => rows(page).count(), PATIENT).toBe(PAGE);
    await expectAccessible(page, 'bench on the phone');
    await picture(page, 'bench-phone');
    await page.getByRole('button', { name: 'Actions for Glider 002' }).click();
    await page.getByRole('menuitem', { name: 'Archive' }).click();
    await page.getByText('Glider 002 is put away.').waitFor();
    await expect.poll(() => names(page), PATIENT).not.toContain('Glider 002');
    await page.getByRole('button', { name: 'Actions for Glider 004' }).click();
    await page.getByRole('menuitem', { name: 'Delete …' }).click();
    await page.getByRole('button', { name: 'Delete Glider 004' }).click();
    await page.getByText('Glider 004 was deleted.').waitFor();
    await expect.poll(() => names(page), PATIENT).not.toContain('Glider 004');
    const wide = await page.evaluate(() => document.documentElement.scrollWidth <= innerWidth);
    expect(wide, 'nothing is wider than the phone').toBe(true);
    expect(complaints).toEqual([]);
  });
});
