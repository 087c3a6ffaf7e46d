import { appendFileSync, cpSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { firstFlightList } from '#shared/schemas/first-flight.ts';
import { weighingList } from '#shared/schemas/weighing.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { serve, type Served } from '#tests/support/served.ts';
import { PATIENT, PHONE } from './support/browser.ts';
import { makeGlider, newBuilder, type Builder } from './support/desk.ts';

const BUILT = 'node_modules/.cache/featherbeam/client';

let browser: Browser;
let folder: string;
let served: Served;
beforeAll(async () => {
  browser = await openBrowser();
  folder = mkdtempSync(join(tmpdir(), 'featherbeam-client-'));
  cpSync(BUILT, folder, { recursive: true });
  served = await serve(folder);
});
afterAll(async () => {
  await browser.close();
  await served.stop();
  rmSync(folder, { recursive: true, force: true });
});

/** Somebody whose device may keep the product, with a glider that was opened once. */
async function opened(name: string): Promise<Builder & { id: string }> {
  const options = { ...PHONE, baseURL: served.baseUrl, serviceWorkers: 'allow' } as const;
  const builder = await newBuilder(browser, name, options);
  const { id } = await makeGlider(builder);
  const { page } = builder;
  await page.goto('/bench');
  await expect
    .poll(() => page.evaluate(() => navigator.serviceWorker.controller !== null), PATIENT)
    .toBe(true);
  // From here on the answers go through it.
  await page.reload();
  await page.getByRole('link', { name: 'Dunlin' }).first().waitFor();
  await page.goto(`/gliders/${id}/drawing`);
  await page.waitForResponse(/first-flights/);
  await page.waitForLoadState('networkidle');
  return { ...builder, id };
}
const field = (page: Page, label: string) => page.getByLabel(label, { exact: true });

describe('without a connection', () => {
  it('opens from nothing: the bench, a glider that was opened before, its forecast and its first flight', async () => {
    const { page, context, id } = await opened('Agnes Holt');
    await page.close();
    await served.kill();
    try {
      const later = await context.newPage();
      await later.goto('/bench');
      await later.getByRole('link', { name: 'Dunlin' }).first().click();
      await later.getByRole('link', { name: 'Balance', exact: true }).click();
      await later.getByRole('heading', { level: 1, name: /MAC/ }).waitFor();
      await later.goto(`/gliders/${id}/flight`);
      await later.getByText('No record is signed yet.').waitFor();
      await later.goto(`/gliders/${id}/built`);
      await later.getByText('Nothing is weighed yet').waitFor();
      await later.getByLabel('On the scale', { exact: true }).fill('Spar, top, port');
      await field(later, 'It shows').fill('7.2');
      await later.getByRole('button', { name: 'Write it down' }).click();
      await later.getByText('1 weighing waits to be sent').waitFor();
      await later.close();
    } finally {
      await served.restart();
    }
    const again = await context.newPage();
    await again.goto(`/gliders/${id}/built`);
    await expect
      .poll(async () => {
        const answer = await context.request.get(`/api/gliders/${id}/weighings`);
        return weighingList.parse(await answer.json()).weighings.map(({ mass }) => mass);
      }, PATIENT)
      .toEqual([7.2]);
  });

  it('shows nothing of somebody who has signed out', async () => {
    const { page, id } = await opened('Birk Dahl');
    await page.getByRole('button', { name: 'Birk Dahl' }).click();
    await page.getByRole('menuitem', { name: 'Sign out' }).click();
    await page.waitForURL((url) => !url.pathname.startsWith('/gliders'));
    await served.kill();
    try {
      const seen = await page.evaluate(
        (path) =>
          fetch(path).then(
            (answer) => answer.status,
            () => 'no answer',
          ),
        `/api/gliders/${id}`,
      );
      expect(seen).toBe('no answer');
    } finally {
      await served.restart();
    }
  });
});

describe('a newer version', () => {
  it('is offered, is taken when asked for, and loses nothing that waits', async () => {
    const { page, context, id } = await opened('Clara Mohr');
    await page.goto(`/gliders/${id}/flight`);
    await page.getByText('No record is signed yet.').waitFor();
    await field(page, 'Front: Shows').fill('97.2');
    // A record that finds no way: the address of records answers nothing.
    await context.route('**/first-flights', (route) =>
      route.request().method() === 'POST' ? route.abort() : route.continue(),
    );
    await field(page, 'Front: Stands at').fill('-20');
    await field(page, 'Rear: Shows').fill('123.2');
    await field(page, 'Rear: Stands at').fill('150');
    for (const row of await page
      .locator('ol > li')
      .filter({ has: page.getByRole('radio') })
      .all()) {
      await row.getByText('Yes', { exact: true }).click();
    }
    await field(page, 'Pilot’s name').fill('Clara Mohr');
    await page.getByRole('button', { name: 'Sign and keep' }).click();
    await page.getByText('It goes by itself when the server can be reached.').waitFor();
    await field(page, 'Front: Shows').fill('88.8');

    appendFileSync(join(folder, 'service-worker.js'), '\n// a newer version\n');
    await page.evaluate(async () => {
      const registration = await navigator.serviceWorker.getRegistration();
      await registration?.update();
    });
    await page.getByText('What waits on this device stays and is sent as before.').waitFor();
    const reloaded = page.waitForEvent('load');
    await page.getByRole('button', { name: 'Take it now' }).click();
    await reloaded;
    await page.getByText('It goes by itself when the server can be reached.').waitFor();
    expect(await field(page, 'Front: Shows').inputValue()).toBe('88.8');
    await context.unroute('**/first-flights');
    await page.reload();
    await expect
      .poll(async () => {
        const answer = await context.request.get(`/api/gliders/${id}/first-flights`);
        return firstFlightList.parse(await answer.json()).firstFlights.map(({ signature }) => signature);
      }, PATIENT)
      .toEqual(['Clara Mohr']);
  });
});

describe('an installable product', () => {
  it('tells the browser its name, its start and its pictures', async () => {
    const { page, context } = await opened('Dorte Lind');
    const href = await page.locator('link[rel=manifest]').getAttribute('href');
    const answer = await context.request.get(href ?? '');
    expect(answer.headers()['content-type']).toContain('application/manifest+json');
    const { name, start_url: start, display, icons } = await answer.json();
    expect([name, start, display]).toEqual(['Featherbeam', '/bench', 'standalone']);
    for (const { src } of icons) {
      const picture = await context.request.get(src);
      expect(picture.headers()['content-type']).toBe('image/png');
    }
  });
});
