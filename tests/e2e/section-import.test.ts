import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { ROUND, textOf } from '#tests/shared/sections/texts.ts';
import { expectAccessible, PATIENT, picture } from './support/browser.ts';
import { drawingOf, wingOf } from './support/drawing.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

describe('a section from a file', () => {
  const open = async (page: Page) => {
    await page.getByRole('button', { name: 'Own points for the root section of panel 1' }).click();
    await page.getByRole('dialog').waitFor();
  };
  const give = (page: Page, name: string, text: string) =>
    page
      .getByLabel('Coordinate file')
      .setInputFiles({ name, mimeType: 'text/plain', buffer: Buffer.from(text) });

  it('is taken, shown and drawn, with what had to be mended said', async () => {
    const own = await drawingOf(browser, 'Kaja Brun');
    const { page } = own;
    await open(page);
    // The underside first, a point twice, commas for points, in per cent.
    const comma = textOf(
      [...ROUND]
        .reverse()
        .flatMap((point, i): [number, number][] => (i === 3 ? [point, point] : [point]))
        .map(([x, z]): [number, number] => [x * 100, z * 100]),
    );
    await give(page, 'gull.dat', `Gull 44-09\n${comma.replaceAll('.', ',')}`);
    await page.getByText('The underside came first; the points are turned round.').waitFor();
    await page.getByText('One point stood there twice.').waitFor();
    await page.getByText('Coordinates are in per cent of the chord.').waitFor();
    await expectAccessible(page, 'the section import');
    await picture(page, 'section-import');
    await page.getByLabel('For root and tip of all panels').check();
    await page.getByRole('button', { name: 'Use these points' }).click();
    await expect
      .poll(
        async () =>
          (await wingOf(own)).panels.map(({ tipSection }) => 'points' in tipSection && tipSection.name),
        PATIENT,
      )
      .toEqual(['Gull 44-09', 'Gull 44-09']);
  });

  it('of 5,000 points is thinned, and says by how little', async () => {
    const own = await drawingOf(browser, 'Lone Berg');
    const { page } = own;
    const fine = Array.from({ length: 5000 }, (_, i): [number, number] => {
      const turn = (2 * Math.PI * i) / 4999;
      return [0.5 + 0.5 * Math.cos(turn), 0.06 * Math.sin(turn)];
    });
    await open(page);
    await give(page, 'oval.txt', `Oval\n${textOf(fine)}`);
    await page.getByText(/points are thinned to/).waitFor();
    await page.getByRole('button', { name: 'Use these points' }).click();
    await expect
      .poll(async () => {
        const spec = (await wingOf(own)).panels[0]?.rootSection;
        return spec && 'points' in spec ? spec.points.length : 0;
      }, PATIENT)
      .toBeGreaterThan(50);
  });

  it('that cannot be read is refused with the line that is to blame, and nothing is lost', async () => {
    const own = await drawingOf(browser, 'Mads Eik');
    const { page } = own;
    const lines = textOf(ROUND).split('\n');
    await open(page);
    await give(
      page,
      'bad.dat',
      ['Gull', ...lines.slice(0, 7), 'chalk and cheese', ...lines.slice(7)].join('\n'),
    );
    await page.getByText(/Line 9, “chalk and cheese”, is not two numbers\./).waitFor();
    const zigzag = [...lines.slice(0, 6), lines[2], ...lines.slice(6)];
    await page.getByRole('textbox', { name: 'Points' }).fill(zigzag.join('\n'));
    await page.getByText(/goes back along the first face/).waitFor();
    await page.getByRole('textbox', { name: 'Points' }).fill('1 0\n0 0');
    await page.getByText(/Only 2 points are found/).waitFor();
    await page.getByRole('button', { name: 'Use these points' }).click();
    expect(await page.getByRole('dialog').count()).toBe(1);
    expect(await page.getByRole('textbox', { name: 'Points' }).inputValue()).toBe('1 0\n0 0');
    await page.getByRole('button', { name: 'Cancel' }).click();
    expect((await wingOf(own)).panels[0]?.rootSection).toEqual({ naca: '6409' });
  });
});
