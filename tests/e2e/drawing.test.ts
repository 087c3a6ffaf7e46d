import type { Browser, Locator, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, PHONE, picture } from './support/browser.ts';
import { pickPart } from './support/desk.ts';
import { drawingOf, partOf, wingOf } from './support/drawing.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

const handle = (page: Page, name: string | RegExp) => page.getByRole('slider', { name });

/** Takes hold of a handle, pulls it aside and lets go. */
async function pull(page: Page, what: Locator, [dx, dy]: readonly [number, number]): Promise<void> {
  // Waits until the handle lies still and is what the pointer meets.
  await what.hover();
  const box = await what.boundingBox();
  if (!box) throw new Error('nothing to take hold of');
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.down();
  for (let i = 1; i <= 6; i++) await page.mouse.move(x + (dx * i) / 6, y + (dy * i) / 6);
  await page.mouse.up();
}

describe('taking hold of the drawing', () => {
  it('moves one rib to a whole millimetre, tells it while it is pulled, and undoes it as one step', async () => {
    const own = await drawingOf(browser, 'Edda Kvist');
    const { page, complaints } = own;
    await pickPart(page, 'Ribs, outer panel');
    const rib = handle(page, 'Ribs, outer panel, 2');
    await rib.waitFor();
    const before = await partOf(own, 'ribs-outer');
    expect(before).toMatchObject({ stations: [423.75, 477.5, 531.25, 585] });
    await pull(page, rib, [25, 0]);
    const stations = async () => {
      const part = await partOf(own, 'ribs-outer');
      return part?.kind === 'ribs' ? part.stations : undefined;
    };
    await expect.poll(stations, PATIENT).not.toEqual([423.75, 477.5, 531.25, 585]);
    const [first, moved = 0, third] = (await stations()) ?? [];
    expect([first, third]).toEqual([423.75, 531.25]);
    expect(Number.isInteger(moved)).toBe(true);
    expect(moved).toBeGreaterThan(477.5);
    expect(await rib.getAttribute('aria-valuetext')).toContain(String(moved));
    await page.keyboard.press('Control+z');
    await expect.poll(stations, PATIENT).toEqual([423.75, 477.5, 531.25, 585]);
    await page.keyboard.press('Control+Shift+z');
    await expect.poll(stations, PATIENT).toEqual([423.75, moved, 531.25, 585]);
    expect(complaints).toEqual([]);
  });

  it('moves a spar along the chord by the arrow keys, in steps of the reader’s unit', async () => {
    const own = await drawingOf(browser, 'Finn Rask');
    const { page } = own;
    await pickPart(page, 'Spar, top');
    const end = handle(page, 'Spar, top, inner end');
    await end.focus();
    const at = async () => {
      const part = await partOf(own, 'spar-top');
      return part?.kind === 'strip' ? (part.at?.[0] ?? 0) * 136 : 0;
    };
    // 0.3 of 136 mm is 40.8 mm; a step goes to the next whole millimetre.
    await page.keyboard.press('ArrowDown');
    await expect
      .poll(async () => Math.abs((await at()) - 41) < 0.02 || Math.abs((await at()) - 40) < 0.02, PATIENT)
      .toBe(true);
  });

  it('moves a panel’s break with the wing following', async () => {
    const own = await drawingOf(browser, 'Gro Falk');
    const { page } = own;
    const mass = page.getByRole('region', { name: 'Title block' });
    const before = await mass.textContent();
    const corner = handle(page, /leading edge$/).first();
    await corner.waitFor();
    await pull(page, corner, [0, 12]);
    await expect
      .poll(async () => (await wingOf(own)).panels, PATIENT)
      .not.toEqual([
        expect.objectContaining({ span: 370, rootChord: 136, tipChord: 131, sweep: 2 }),
        expect.objectContaining({ span: 215, rootChord: 131, tipChord: 88, sweep: 19 }),
      ]);
    expect(await mass.textContent()).not.toBe(before);
    await picture(page, 'drawing-pulled');
  });

  it('works by touch', async () => {
    const own = await drawingOf(browser, 'Hanno Beck', { ...PHONE, colorScheme: 'dark' });
    const { page } = own;
    await pickPart(page, 'Ribs, outer panel');
    const rib = handle(page, 'Ribs, outer panel, 2');
    await rib.scrollIntoViewIfNeeded();
    const box = await rib.boundingBox();
    if (!box) throw new Error('nothing to take hold of');
    const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
    const cdp = await own.context.newCDPSession(page);
    const touch = (type: 'touchStart' | 'touchMove' | 'touchEnd', dx: number) =>
      cdp.send('Input.dispatchTouchEvent', {
        type,
        touchPoints: type === 'touchEnd' ? [] : [{ x: x + dx, y }],
      });
    await touch('touchStart', 0);
    for (const dx of [4, 8, 12, 16]) await touch('touchMove', dx);
    await touch('touchEnd', 16);
    await expect
      .poll(async () => {
        const part = await partOf(own, 'ribs-outer');
        return part?.kind === 'ribs' ? part.stations?.[1] : undefined;
      }, PATIENT)
      .not.toBe(477.5);
    await expectAccessible(page, 'the drawing on a phone, dark');
  });
});

describe('looking at the drawing', () => {
  it('lights a part up in the list when it is pressed in the drawing, and the other way round', async () => {
    const { page } = await drawingOf(browser, 'Ilka Thorn');
    for (const view of ['Above', 'Side', 'Front', 'Surface']) {
      await page.getByRole('button', { name: view, exact: true }).click();
      await expectAccessible(page, `the view ${view}`);
    }
    await pickPart(page, 'Spar, top');
    expect(
      await page
        .getByRole('button', { name: /^Spar, top/ })
        .first()
        .getAttribute('aria-expanded'),
    ).toBe('true');
    const ends = [handle(page, 'Spar, top, inner end'), handle(page, 'Spar, top, outer end')];
    const boxes = await Promise.all(ends.map((end) => end.boundingBox()));
    const centre = (of: (box: { x: number; y: number; width: number; height: number }) => number) =>
      boxes.reduce((sum, box) => sum + (box ? of(box) / boxes.length : 0), 0);
    const expanded = page.getByRole('button', { expanded: true }).filter({ hasText: /Spar|web|sheeting/ });
    await page.keyboard.press('Escape');
    await expect.poll(() => expanded.count(), PATIENT).toBe(0);
    // Half-way between two ribs on the spar's own line.
    await page.mouse.click(
      centre(({ x, width }) => x + width / 2) + 9,
      centre(({ y, height }) => y + height / 2),
    );
    await expect.poll(() => expanded.count(), PATIENT).toBe(1);
  });

  it('measures between two places by keyboard, in the reader’s unit', async () => {
    const { page } = await drawingOf(browser, 'Jarl Hoff');
    await page.getByRole('button', { name: 'Measure', exact: true }).click();
    await page.getByRole('application').first().focus();
    await page.keyboard.press('Enter');
    for (let i = 0; i < 5; i++) await page.keyboard.press('Shift+ArrowRight');
    await page.keyboard.press('Enter');
    const told = page.getByText(/\d\s?mm/).filter({ visible: true });
    await expect.poll(() => told.count(), PATIENT).toBeGreaterThan(0);
    await picture(page, 'drawing-measured');
  });
});
