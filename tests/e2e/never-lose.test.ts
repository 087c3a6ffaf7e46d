import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { serve } from '#tests/support/served.ts';
import { DESKTOP, expectAccessible, PATIENT, picture } from './support/browser.ts';
import {
  expectStatus,
  fillPart,
  makeGlider,
  newBuilder,
  openDrawing,
  partField,
  signedIn,
  storedGlider,
} from './support/desk.ts';

const RIBS = 'Ribs, inner panel';
const SHEETING = 'Nose sheeting';
const CAPS = 'Cap strips';

const thicknessOf = ({ plan }: GliderDto, name: string): number | undefined => {
  const part = plan.surfaces[0]?.parts.find((one) => one.name === name);
  return part && 'thickness' in part ? part.thickness : undefined;
};
const alertWith = (page: Page, text: RegExp) => page.getByRole('alert').filter({ hasText: text });

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

describe('undo', () => {
  it('goes back through a reload, and forward again, by keyboard', async () => {
    const builder = await newBuilder(browser, 'Ulla Brandt');
    const { page, complaints } = builder;
    const { id } = await makeGlider(builder);
    await openDrawing(page, id);
    await fillPart(page, RIBS, 'Thickness', '2.4');
    await fillPart(page, SHEETING, 'Thickness', '1');
    await fillPart(page, CAPS, 'Thickness', '1.5');
    await expectStatus(page, 'Saved');
    await expect.poll(async () => thicknessOf(await storedGlider(builder, id), CAPS), PATIENT).toBe(1.5);
    await page.reload();
    expect(await partField(page, CAPS, 'Thickness')).toBe('1.5');

    for (let i = 0; i < 3; i++) await page.keyboard.press('Control+z');
    await expect.poll(async () => thicknessOf(await storedGlider(builder, id), RIBS), PATIENT).toBe(2);
    expect(thicknessOf(await storedGlider(builder, id), CAPS)).toBe(1);
    expect(thicknessOf(await storedGlider(builder, id), SHEETING)).toBe(1.2);

    await page.reload();
    await page.getByRole('button', { name: 'Redo' }).first().waitFor();
    for (let i = 0; i < 3; i++) await page.keyboard.press('Control+Shift+z');
    await expect.poll(async () => thicknessOf(await storedGlider(builder, id), CAPS), PATIENT).toBe(1.5);
    expect(thicknessOf(await storedGlider(builder, id), RIBS)).toBe(2.4);
    expect(complaints).toEqual([]);
  });
});

describe('two windows of one glider', () => {
  it('take in what the other saved, say so, and undo only their own', async () => {
    const here = await newBuilder(browser, 'Ines Holm');
    const there = await signedIn(browser, here);
    const { id } = await makeGlider(here);
    await openDrawing(here.page, id);
    await openDrawing(there.page, id);
    await fillPart(there.page, RIBS, 'Thickness', '2.4');
    await expectStatus(there.page, 'Saved');
    // The other one is stale now; its own edit of something else joins in.
    await fillPart(here.page, SHEETING, 'Thickness', '1');
    const news = alertWith(
      here.page,
      /Took in the changes of your other window: Ribs, inner panel thickness/,
    );
    await news.waitFor();
    expect(await news.textContent()).toContain('2 → 2.4\u202fmm');
    await expectAccessible(here.page, 'news from another window');
    await expect.poll(async () => thicknessOf(await storedGlider(here, id), SHEETING), PATIENT).toBe(1);
    expect(thicknessOf(await storedGlider(here, id), RIBS)).toBe(2.4);

    await here.page.keyboard.press('Control+z');
    await expect.poll(async () => thicknessOf(await storedGlider(here, id), SHEETING), PATIENT).toBe(1.2);
    expect(thicknessOf(await storedGlider(here, id), RIBS)).toBe(2.4);
    await news.getByRole('button', { name: 'Seen' }).click();
    await expect.poll(() => news.count(), PATIENT).toBe(0);
  });

  it('learn soon that they are stale without being touched', async () => {
    const here = await newBuilder(browser, 'Sven Aker');
    const { id } = await makeGlider(here);
    await openDrawing(here.page, id);
    const second = await here.context.newPage();
    await openDrawing(second, id);
    await fillPart(second, RIBS, 'Thickness', '2.4');
    await alertWith(here.page, /Took in the changes of your other window/).waitFor();
    expect(await partField(here.page, RIBS, 'Thickness')).toBe('2.4');
  });
});

describe('two builders who change the same', () => {
  it('are asked line by line, by keyboard, and nobody is overwritten before', async () => {
    const ines = await signedIn(browser, {
      email: 'builder@larkmoor.example',
      password: 'larkmoor-builder',
    });
    const odile = await signedIn(browser, {
      email: 'member@larkmoor.example',
      password: 'larkmoor-member',
    });
    const { gliders } = (await (await ines.context.request.get('/api/gliders?search=Whimbrel')).json()) as {
      gliders: { id: string }[];
    };
    const id = gliders[0]?.id ?? '';
    for (const { page } of [ines, odile]) {
      await page.goto(`/gliders/${id}/drawing`);
      await page.getByLabel('Panel 1, root chord', { exact: true }).waitFor();
    }
    const chord = (page: Page) => page.getByLabel('Panel 1, root chord', { exact: true });
    const sweep = (page: Page) => page.getByLabel('Panel 1, sweep of the leading edge', { exact: true });
    await ines.context.setOffline(true);
    await chord(ines.page).fill('188');
    await sweep(ines.page).fill('5');
    await expectStatus(ines.page, 'No connection, kept here');
    await chord(odile.page).fill('192');
    await odile.page.getByLabel('Panel 1, dihedral', { exact: true }).fill('6');
    const panelOf = async () => (await storedGlider(odile, id)).plan.surfaces[0]?.panels[0];
    await expect.poll(panelOf, PATIENT).toMatchObject({ rootChord: 192, dihedral: 6 });

    await ines.context.setOffline(false);
    const dialog = ines.page.getByRole('dialog', { name: 'Both changed the same' });
    await dialog.waitFor();
    const row = dialog.getByRole('radiogroup', { name: 'Wing, panel 1 root chord' });
    await expect.poll(() => row.textContent(), PATIENT).toMatch(/188\u202fmm.*balance.*192\u202fmm.*balance/);
    expect(await dialog.getByRole('radiogroup').count()).toBe(1);
    await expectAccessible(ines.page, 'choosing between two builders');
    await picture(ines.page, 'both-changed');
    await ines.page.emulateMedia({ colorScheme: 'dark' });
    await expectAccessible(ines.page, 'choosing between two builders, dark');
    expect(await panelOf()).toMatchObject({ rootChord: 192 });

    // Put off, it is still there; nothing was saved over Odile's chord.
    await ines.page.keyboard.press('Escape');
    await alertWith(ines.page, /Odile Marchbank changed the same field/).waitFor();
    expect(await panelOf()).toMatchObject({ rootChord: 192, sweep: expect.not.closeTo(5) as number });
    await ines.page.getByRole('button', { name: 'Choose …' }).press('Enter');
    await dialog.getByRole('button', { name: 'Save as chosen' }).press('Enter');
    await dialog.getByText('Not chosen yet.').waitFor();
    await ines.page.keyboard.press('Space');
    await ines.page.keyboard.press('Tab');
    await ines.page.keyboard.press('Tab');
    await ines.page.keyboard.press('Tab');
    await ines.page.keyboard.press('Enter');
    await expect.poll(panelOf, PATIENT).toMatchObject({ rootChord: 188, dihedral: 6, sweep: 5 });
    await expectStatus(ines.page, 'Saved');
    // Coming back to a window is enough to learn of it.
    await odile.page.evaluate(() => dispatchEvent(new Event('focus')));
    await alertWith(odile.page, /Took in Ines Calloway’s changes: Wing, panel 1/).waitFor();
  });
});

describe('a lost connection', () => {
  it('loses nothing: other places open, the window may close, and all is sent later', async () => {
    const builder = await newBuilder(browser, 'Pia Lund');
    const { id } = await makeGlider(builder);
    const { page, context } = builder;
    // The other places are fetched ahead, once this one has settled.
    const ahead = page.waitForResponse(/log-page/);
    await openDrawing(page, id);
    await ahead;
    await page.waitForLoadState('networkidle');
    await context.setOffline(true);
    await fillPart(page, RIBS, 'Thickness', '2.4');
    await expectStatus(page, 'No connection, kept here');
    for (const place of ['Balance', 'Loading', 'Wood trial']) {
      await page.getByRole('link', { name: place, exact: true }).click();
      await page.getByRole('heading', { level: 1 }).waitFor();
      expect(await page.getByText('cannot be reached').count()).toBe(0);
    }
    await page.getByRole('link', { name: 'Drawing', exact: true }).click();
    await fillPart(page, CAPS, 'Thickness', '1.5');
    await page.waitForTimeout(400);
    await page.close({ runBeforeUnload: false });

    await context.setOffline(false);
    expect(thicknessOf(await storedGlider(builder, id), RIBS)).toBe(2);
    const later = await context.newPage();
    await openDrawing(later, id);
    await later.getByText('that had not reached the server were put back').waitFor();
    await expect.poll(async () => thicknessOf(await storedGlider(builder, id), RIBS), PATIENT).toBe(2.4);
    expect(thicknessOf(await storedGlider(builder, id), CAPS)).toBe(1.5);
  });
});

describe('a server that is killed', () => {
  it('and started again gets every edit that was made meanwhile', async () => {
    const served = await serve();
    try {
      const builder = await newBuilder(browser, 'Nils Berg', { ...DESKTOP, baseURL: served.baseUrl });
      const { id } = await makeGlider(builder);
      const { page } = builder;
      await openDrawing(page, id);
      await fillPart(page, RIBS, 'Thickness', '2.2');
      await expectStatus(page, 'Saved');
      await served.kill();
      await fillPart(page, RIBS, 'Thickness', '2.4');
      await expectStatus(page, 'No connection, kept here');
      await fillPart(page, SHEETING, 'Thickness', '1');
      await served.restart();
      await expectStatus(page, 'Saved');
      const stored = await storedGlider(builder, id);
      expect([thicknessOf(stored, RIBS), thicknessOf(stored, SHEETING)]).toEqual([2.4, 1]);
      await page.keyboard.press('Control+z');
      await expect
        .poll(async () => thicknessOf(await storedGlider(builder, id), SHEETING), PATIENT)
        .toBe(1.2);
    } finally {
      await served.stop();
    }
  });
});
