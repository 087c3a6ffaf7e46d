import { mkdirSync } from 'node:fs';
import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { fileURLToPath } from 'node:url';
import type { Browser, BrowserContext, BrowserContextOptions, Page } from 'playwright-core';
import { expect, inject } from 'vitest';

const SHOTS = fileURLToPath(
  new URL('../../../node_modules/.cache/featherbeam/screenshots/', import.meta.url),
);
const AXE = createRequire(import.meta.url).resolve('axe-core/axe.min.js');

export const DESKTOP: BrowserContextOptions = { viewport: { width: 1440, height: 1000 } };
export const PHONE: BrowserContextOptions = {
  viewport: { width: 390, height: 844 },
  hasTouch: true,
  isMobile: true,
  deviceScaleFactor: 2,
};

export interface Visit {
  context: BrowserContext;
  page: Page;
  /** what the page complained of: console errors, uncaught exceptions, broken requests of its own */
  complaints: string[];
}

/** A fresh visitor: own cookies, own storage. */
export async function visit(browser: Browser, options: BrowserContextOptions = DESKTOP): Promise<Visit> {
  const context = await browser.newContext({
    baseURL: inject('baseUrl'),
    // Kept files and answers would hide what a page asks for; `offline.test.ts` lets them in.
    serviceWorkers: 'block',
    ...options,
    reducedMotion: 'reduce',
  });
  const page = await context.newPage();
  page.setDefaultTimeout(20_000);
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(`uncaught: ${error.message}`));
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(`console: ${message.text()}`);
  });
  return { context, page, complaints };
}

interface AxeFinding {
  id: string;
  help: string;
  nodes: { target: string[]; failureSummary?: string }[];
}

/** WCAG 2.2 A and AA rules of axe-core on what the page shows now. */
export async function expectAccessible(page: Page, where: string): Promise<void> {
  // The page's content policy allows no foreign script; this one comes in past it, for the test only.
  await page.evaluate(await readFile(AXE, 'utf8'));
  const findings = await page.evaluate(async () => {
    const axe = (window as unknown as { axe: { run: (o: object) => Promise<{ violations: AxeFinding[] }> } })
      .axe;
    const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];
    const { violations } = await axe.run({ runOnly: { type: 'tag', values: tags } });
    return violations;
  });
  const told = findings.map(
    (f) => `${f.id}: ${f.help}\n  ${f.nodes.map((n) => n.target.join(' ')).join('\n  ')}`,
  );
  expect(told, `accessibility of ${where}`).toEqual([]);
}

/** Keeps a picture of the page, to be looked at. */
export async function picture(page: Page, name: string): Promise<void> {
  mkdirSync(SHOTS, { recursive: true });
  await page.screenshot({ path: `${SHOTS}${name}.png`, fullPage: true });
}

export async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL('**/bench');
}

/** How long to wait for a value that is on its way; generous, for the machine may be busy. */
export const PATIENT = { timeout: 20_000 };
