import sharp from 'sharp';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { gliderSaveList } from '#shared/schemas/glider-save.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, PHONE, picture } from './support/browser.ts';
import {
  expectStatus,
  fillPart,
  makeGlider,
  newBuilder,
  openDrawing,
  signedIn,
  storedGlider,
  titleBlock,
  type Builder,
} from './support/desk.ts';

const RIBS = 'Ribs, inner panel';
const SHEETING = 'Nose sheeting';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

const photo = (colour: string) =>
  sharp({ create: { width: 800, height: 600, channels: 3, background: colour } })
    .jpeg()
    .toBuffer();
const file = async (name: string, colour: string) => ({
  name,
  mimeType: 'image/jpeg',
  buffer: await photo(colour),
});
const openLog = async (page: Page) => {
  await page.getByRole('link', { name: 'Log', exact: true }).click();
  await page.getByRole('heading', { level: 1 }).waitFor();
};
const rows = (page: Page) => page.getByRole('region', { name: 'Saved states' }).getByRole('listitem');
const versionsOf = async ({ context }: Builder, id: string) =>
  gliderSaveList.parse(await (await context.request.get(`/api/gliders/${id}/saves`)).json()).saves;
const act = async (page: Page, row: number, command: string) => {
  await rows(page)
    .nth(row)
    .getByRole('button', { name: /^Actions for/ })
    .click();
  await page.getByRole('menuitem', { name: command }).click();
};

/** A glider with two saves, one after the other. */
async function edited(name: string): Promise<Builder & { id: string }> {
  const builder = await newBuilder(browser, name);
  const { id } = await makeGlider(builder);
  await openDrawing(builder.page, id);
  for (const [part, thickness, count] of [
    [RIBS, '2.4', 2],
    [SHEETING, '1', 3],
  ] as const) {
    await fillPart(builder.page, part, 'Thickness', thickness);
    await expect.poll(async () => (await versionsOf(builder, id)).length, PATIENT).toBe(count);
  }
  return { ...builder, id };
}

describe('the log', () => {
  it('tells every save in words, names one, compares two by part, and brings one back', async () => {
    const builder = await edited('Lotte Winther');
    const { page, id, complaints } = builder;
    await openLog(page);
    await expect
      .poll(() => page.getByRole('heading', { level: 1 }).textContent(), PATIENT)
      .toMatch(/^Last change: [−+][\d.]+\u202fg, balance [\d.]+\u202fmm (forward|aft)$/);
    await expect.poll(() => rows(page).count(), PATIENT).toBe(2);
    // Two quick saves of one person are one row, which opens.
    const evening = await rows(page).first().textContent();
    expect(evening).toContain('Lotte Winther');
    expect(evening).toContain('Ribs, inner panel thickness 2 → 2.4\u202fmm');
    expect(evening).toContain('Nose sheeting thickness 1.2 → 1\u202fmm');
    expect(await rows(page).last().textContent()).toContain('Made');
    await page.getByRole('button', { name: '2 saves' }).click();
    await expect.poll(() => rows(page).count(), PATIENT).toBe(4);
    await expectAccessible(page, 'log');
    await picture(page, 'log');

    await act(page, 2, 'Name …');
    const naming = page.getByRole('dialog', { name: 'Name this state' });
    await naming.getByLabel('Name').fill('Before cutting');
    await expectAccessible(page, 'naming a state');
    await naming.getByLabel('Name').press('Enter');
    await rows(page).filter({ hasText: 'Before cutting' }).waitFor();

    await act(page, (await rows(page).count()) - 1, 'Compare with now');
    await page.getByRole('table', { name: 'The two states by part' }).waitFor();
    const line = page.getByRole('row', { name: /^Ribs, inner panel thickness 2 → 2\.4/ });
    expect(await line.textContent()).toMatch(/4\.20.*4\.\d\d.*\+0\.\d\d/);
    expect(await page.getByRole('row', { name: /^Shear web follows/ }).count()).toBe(1);
    expect(await page.getByRole('row', { name: /^Tail boom/ }).count()).toBe(0);
    await page.getByLabel(/^Show all/).check();
    expect(await page.getByRole('row', { name: /^Tail boom/ }).count()).toBe(1);
    await expectAccessible(page, 'comparison');
    await picture(page, 'compare');

    await page.getByRole('button', { name: 'Bring the one before back' }).click();
    await page.getByText('is back as a new save. Undo takes it away again.').waitFor();
    await rows(page).filter({ hasText: 'Brought back' }).waitFor();
    await expect.poll(async () => (await versionsOf(builder, id))[0]?.restoredFrom, PATIENT).toBe(1);
    const ribsOf = async () =>
      (await storedGlider(builder, id)).plan.surfaces[0]?.parts.find(({ name }) => name === RIBS);
    expect(await ribsOf()).toMatchObject({ thickness: 2 });
    await page.getByRole('button', { name: 'Undo' }).first().click();
    await expect.poll(ribsOf, PATIENT).toMatchObject({ thickness: 2.4 });
    await expectStatus(page, 'Saved');
    expect(complaints).toEqual([]);
  });

  it('keeps photos: sent with progress, tried again after a bad line, captioned, seen large, deleted', async () => {
    const builder = await newBuilder(browser, 'Jon Skaar');
    const { page } = builder;
    const { id } = await makeGlider(builder);
    await openDrawing(page, id);
    await openLog(page);
    const photos = page.getByRole('region', { name: 'Photos' });
    await photos.getByText('No photos yet.').waitFor();
    let refuse = true;
    await page.route('**/api/gliders/*/photos', (route) =>
      refuse && route.request().method() === 'POST' ? route.abort() : route.continue(),
    );
    await page.setInputFiles('input[type=file]', [await file('rib.jpg', '#c9a267')]);
    await photos.getByText('Not added. The server cannot be reached.').waitFor();
    await expectAccessible(page, 'a photo that was not sent');
    refuse = false;
    await photos.getByRole('button', { name: 'Try again' }).click();
    await photos.getByRole('button', { name: /^Photo of/ }).waitFor();
    await page.setInputFiles('input[type=file]', [
      { name: 'notes.jpg', mimeType: 'image/jpeg', buffer: Buffer.from('no picture at all') },
    ]);
    await photos.getByRole('alert').waitFor();
    await photos.getByRole('button', { name: 'Drop' }).click();
    await page.setInputFiles('input[type=file]', [await file('wing.jpg', '#8fb9ef')]);
    await expect.poll(() => photos.getByRole('button', { name: /^Photo of/ }).count(), PATIENT).toBe(2);

    await photos
      .getByRole('button', { name: /^Photo of/ })
      .first()
      .press('Enter');
    const large = page.getByRole('dialog');
    await large.getByRole('img').waitFor();
    await large.getByLabel('Caption').fill('Bare wing on the board');
    await large.getByLabel('Caption').press('Enter');
    await page.getByRole('dialog', { name: 'Bare wing on the board' }).waitFor();
    await expectAccessible(page, 'a photo large');
    await picture(page, 'photo');
    await large.getByRole('button', { name: 'Older ›' }).click();
    await large.getByText('2 of 2').waitFor();
    await large.getByRole('button', { name: 'Delete …' }).click();
    await large.getByRole('button', { name: 'Delete the photo' }).click();
    await large.getByText('1 of 1').waitFor();
    await page.keyboard.press('Escape');
    await expect.poll(() => photos.getByRole('listitem').count(), PATIENT).toBe(1);
    await photos.getByText('Bare wing on the board').waitFor();

    const phone = await signedIn(browser, builder, { ...PHONE, colorScheme: 'dark' });
    await phone.page.goto(`/gliders/${id}/log`);
    await phone.page.getByText('Bare wing on the board').waitFor();
    await expectAccessible(phone.page, 'log on a phone, dark');
    await picture(phone.page, 'log-phone');
    const { scroll, window } = await phone.page.evaluate(() => ({
      scroll: document.documentElement.scrollWidth,
      window: innerWidth,
    }));
    expect(scroll).toBeLessThanOrEqual(window);
  });
});

describe('ask why', () => {
  it('opens how a figure was made, leads on to its inputs and to the field of one, by keyboard', async () => {
    const builder = await newBuilder(browser, 'Vera Quist');
    const { page, complaints } = builder;
    const { id } = await makeGlider(builder);
    await page.goto(`/gliders/${id}/balance`);
    const margin = titleBlock(page).getByRole('button', { name: /^Static margin/ });
    await margin.press('Enter');
    const why = page.getByRole('dialog');
    await why.getByText(/= \(neutral point [\d.]+\u202fmm − balance point/).waitFor();
    await expectAccessible(page, 'why, title block');
    await why.getByRole('button', { name: /^Balance point/ }).press('Enter');
    await why.getByText(/sum of moments ÷ sum of masses/).waitFor();
    await why.getByRole('button', { name: 'Back' }).press('Enter');
    await why.getByText(/= \(neutral point/).waitFor();
    await page.keyboard.press('Escape');
    expect(await margin.evaluate((element) => element === document.activeElement)).toBe(true);

    await page.getByRole('button', { name: 'Wing', exact: true }).click();
    await page.getByRole('button', { name: /^Nose sheeting [\d.]+ g/ }).press('Enter');
    await why.getByText(/16\.80\u202fg = 110\.50\u202fcm³ × 152\u202fkg\/m³/).waitFor();
    await page.emulateMedia({ colorScheme: 'dark' });
    await expectAccessible(page, 'why, balance sheet, dark');
    await picture(page, 'why');
    await why.getByRole('link', { name: 'Thickness' }).press('Enter');
    await page.waitForURL('**/drawing');
    const field = page.getByLabel('Thickness', { exact: true });
    await expect
      .poll(() => field.evaluate((element) => element === document.activeElement), PATIENT)
      .toBe(true);
    expect(await field.inputValue()).toBe('1.2');
    expect(complaints).toEqual([]);
  });
});
