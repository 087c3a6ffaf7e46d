import { readFileSync } from 'node:fs';
import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PLACES, SAMPLE_PLACES, SHARED_PLACES } from '#client/app/paths.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { DESKTOP, expectAccessible, PATIENT, PHONE, visit } from './support/browser.ts';
import { makeGlider, newBuilder, signedIn, type Builder } from './support/desk.ts';

/** Every address of the router, with what stands for its parameters; a test below finds what is missing here. */
const NOBODY = 'A'.repeat(43);
const VISITED: Record<string, readonly string[]> = {
  '': ['/'],
  'sign-in': ['/sign-in'],
  'sign-up': ['/sign-up'],
  'forgot-password': ['/forgot-password'],
  'reset-password/:token': [`/reset-password/${NOBODY}`],
  'verify-email/:token': [`/verify-email/${NOBODY}`],
  'invitations/:token': [`/invitations/${NOBODY}`],
  sample: SAMPLE_PLACES.map((place) => `/sample/${place}`),
};
const OWN: Record<string, (ids: Ids) => readonly string[]> = {
  bench: () => ['/bench'],
  start: () => ['/start'],
  materials: () => ['/materials'],
  rack: () => ['/rack'],
  'rack/labels': () => ['/rack/labels'],
  'rack/:id': ({ piece }) => [`/rack/${piece}`],
  account: () => ['/account'],
  'gliders/:id/sharing': ({ glider }) => [`/gliders/${glider}/sharing`],
  'gliders/:id': ({ glider }) => PLACES.map((place) => `/gliders/${glider}/${place}`),
  'shared/:token': ({ link }) => SHARED_PLACES.map((place) => `/shared/${link}/${place}`),
  'sheets/:sheetId': ({ sheet }) => [`/sheets/${sheet}`],
  '*': () => ['/nowhere'],
};

interface Ids {
  glider: string;
  sheet: string;
  link: string;
  piece: string;
}

const LOOKS: [string, BrowserContextOptions][] = [
  ['on a desktop, light', { ...DESKTOP, colorScheme: 'light' }],
  ['on a desktop, dark', { ...DESKTOP, colorScheme: 'dark' }],
  ['on a phone, light', { ...PHONE, colorScheme: 'light' }],
  ['on a phone, dark', { ...PHONE, colorScheme: 'dark' }],
];

let browser: Browser;
let builder: Builder;
let ids: Ids;
beforeAll(async () => {
  browser = await openBrowser();
  builder = await newBuilder(browser, 'Axel Lund');
  const { request } = builder.context;
  const { id } = await makeGlider(builder);
  const sheet = await request.post(`/api/gliders/${id}/sheets`, { data: { note: 'As drawn' } });
  const link = await request.post(`/api/gliders/${id}/link`);
  const piece = await request.post('/api/rack', {
    data: {
      kind: 'sheet',
      material: { key: 'balsa-light', name: 'Balsa, light', category: 'wood' },
      length: 1000,
      width: 100,
      thickness: 1.5,
      wall: null,
      mass: 16.8,
      resolution: 0.1,
      grade: 'light',
      grainCut: 'A',
      note: '',
    },
  });
  ids = {
    glider: id,
    sheet: (await sheet.json()).id,
    link: (await link.json()).link.token,
    piece: (await piece.json()).id,
  };
});
afterAll(() => browser.close());

/** What is still coming has come: no skeleton, and the heading is there. */
async function settle(page: Page): Promise<void> {
  await page.getByRole('heading', { level: 1 }).first().waitFor();
  await page.waitForLoadState('networkidle');
  await expect.poll(() => page.locator('[aria-busy="true"]').count(), PATIENT).toBe(0);
}

/** Nothing lies under the fold, half behind a bar that stays in place: whoever gets there has scrolled it out. */
async function unfold(page: Page): Promise<void> {
  const { width } = page.viewportSize() ?? { width: 1440 };
  const height = await page.evaluate(() => document.documentElement.scrollHeight);
  await page.setViewportSize({ width, height: Math.min(12_000, height + 200) });
}

/** @returns the pages that are wider than their window */
async function look(page: Page, paths: readonly string[]): Promise<string[]> {
  const wide: string[] = [];
  const size = page.viewportSize();
  for (const path of paths) {
    if (size) await page.setViewportSize(size);
    await page.goto(path);
    await settle(page);
    await unfold(page);
    await expectAccessible(page, path);
    const wider = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    if (wider > 0) wide.push(path);
  }
  return wide;
}

describe('every page can be read and worked by everybody', () => {
  it.each(LOOKS)('of those a visitor sees, %s', async (_, options) => {
    const { page } = await visit(browser, options);
    expect(await look(page, Object.values(VISITED).flat())).toEqual([]);
  });

  it.each(LOOKS)('of those somebody signed in sees, %s', async (_, options) => {
    const { page } = await signedIn(browser, builder, options);
    const paths = Object.values(OWN).flatMap((pathsOf) => pathsOf(ids));
    expect(await look(page, paths)).toEqual([]);
  });

  it('and none is left out', () => {
    const router = readFileSync(new URL('../../client/app/router.tsx', import.meta.url), 'utf8');
    const routes = [...router.matchAll(/path: '([^']+)'/g)].map(([, path]) => path);
    const known = new Set([...Object.keys(VISITED), ...Object.keys(OWN)]);
    expect(routes.filter((path) => path !== undefined && !known.has(path))).toEqual([]);
  });
});
