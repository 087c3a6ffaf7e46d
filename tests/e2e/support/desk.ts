import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import { expect } from 'vitest';
import { glider, type GliderDto } from '#shared/schemas/glider.ts';
import { demoPlan } from '#tests/support/plans.ts';
import { DESKTOP, PATIENT, visit, type Visit } from './browser.ts';

export interface Builder extends Visit {
  email: string;
  password: string;
}

let count = 0;

/** Somebody new with an account of their own, signed in. */
export async function newBuilder(
  browser: Browser,
  name: string,
  options: BrowserContextOptions = DESKTOP,
): Promise<Builder> {
  const visited = await visit(browser, options);
  const email = `${name.toLowerCase().replaceAll(' ', '.')}.${Date.now()}.${count++}@example.org`;
  const password = 'feathers and beams';
  const answer = await visited.context.request.post('/api/users', { data: { name, email, password } });
  expect(answer.status()).toBe(201);
  return { ...visited, email, password };
}

/** The same person at another window of another browser. */
export async function signedIn(
  browser: Browser,
  { email, password }: Pick<Builder, 'email' | 'password'>,
  options: BrowserContextOptions = DESKTOP,
): Promise<Builder> {
  const visited = await visit(browser, options);
  const answer = await visited.context.request.post('/api/session', { data: { email, password } });
  expect(answer.status()).toBe(200);
  return { ...visited, email, password };
}

/** A glider of the demo scenario, as the builder's own. */
export async function makeGlider({ context }: Pick<Visit, 'context'>): Promise<GliderDto> {
  const answer = await context.request.post('/api/gliders', { data: { plan: demoPlan('dunlin') } });
  return glider.parse(await answer.json());
}

/** What the server holds. */
export async function storedGlider({ context }: Pick<Visit, 'context'>, id: string): Promise<GliderDto> {
  return glider.parse(await (await context.request.get(`/api/gliders/${id}`)).json());
}

export const titleBlock = (page: Page) => page.getByRole('region', { name: 'Title block' });

/** Opens a glider's drawing and waits until it can be worked on. */
export async function openDrawing(page: Page, id: string): Promise<void> {
  await page.goto(`/gliders/${id}/drawing`);
  await page
    .getByRole('button', { name: /^Nose sheeting/ })
    .first()
    .waitFor();
}

/** Types a number into the form of a part of the surface at hand. */
export async function fillPart(page: Page, part: string, label: string, text: string): Promise<void> {
  await pickPart(page, part);
  await page.getByLabel(label, { exact: true }).fill(text);
}

export async function pickPart(page: Page, part: string): Promise<void> {
  const row = page.getByRole('button', { name: new RegExp(`^${part}`) }).first();
  // The form of the surface below has a name as well.
  const name = page.getByLabel('Name', { exact: true }).first();
  // A second press would let it go.
  if ((await name.inputValue()) !== part) await row.click();
  await expect.poll(() => name.inputValue(), PATIENT).toBe(part);
}

/** What a field of a part shows. */
export async function partField(page: Page, part: string, label: string): Promise<string> {
  await pickPart(page, part);
  return page.getByLabel(label, { exact: true }).inputValue();
}

export async function expectStatus(page: Page, words: string): Promise<void> {
  await expect.poll(() => titleBlock(page).textContent(), PATIENT).toContain(words);
}
