import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { weighingList, type WeighingDto } from '#shared/schemas/weighing.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, PHONE, picture } from './support/browser.ts';
import { makeGlider, newBuilder, signedIn, type Builder } from './support/desk.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

async function keptOf({ context }: Builder, id: string): Promise<WeighingDto[]> {
  return weighingList.parse(await (await context.request.get(`/api/gliders/${id}/weighings`)).json())
    .weighings;
}
const what = (page: Page) => page.getByLabel('On the scale', { exact: true });
const shows = (page: Page) => page.getByLabel('It shows', { exact: true });
const said = (page: Page) => page.getByRole('form', { name: 'Weigh' }).getByRole('status').last();

async function open(name: string, options?: Parameters<typeof newBuilder>[2]) {
  const builder = await newBuilder(browser, name, options);
  const { id } = await makeGlider(builder);
  await builder.page.goto(`/gliders/${id}/built`);
  await builder.page.getByText('Nothing is weighed yet').waitFor();
  return { ...builder, id };
}

describe('weighing at the bench', () => {
  it('goes by keyboard alone: part, Enter, reading, Enter, next; and the forecast moves at once', async () => {
    const own = await open('Anneke Torp');
    const { page, complaints, id } = own;
    await expectAccessible(page, 'the empty account');
    await what(page).focus();
    await page.keyboard.type('spar top port');
    await page.keyboard.press('Enter');
    // The part is known; the cursor stands where the reading goes.
    await expect
      .poll(() => shows(page).evaluate((field) => field === document.activeElement), PATIENT)
      .toBe(true);
    await page.keyboard.type('7,2');
    await page.keyboard.press('Enter');
    await expect
      .poll(() => what(page).evaluate((field) => field === document.activeElement), PATIENT)
      .toBe(true);
    expect(await what(page).inputValue()).toBe('');
    await expect
      .poll(() => said(page).textContent(), PATIENT)
      .toMatch(/^Spar, top, port: 7\.2.g, .* expected.*\. Forecast /);
    await page.keyboard.type('wing/spar-top starboard');
    await page.keyboard.press('Enter');
    await page.keyboard.type('7.0');
    await page.keyboard.press('Enter');
    await expect.poll(async () => (await keptOf(own, id)).map(({ mass }) => mass), PATIENT).toEqual([7.2, 7]);
    await page
      .getByText(/Port pulls down by|Matched as far as/)
      .first()
      .waitFor();
    await page.getByRole('heading', { name: /still to come$/ }).waitFor();
    await expectAccessible(page, 'the account');
    await picture(page, 'as-built');
    expect(complaints).toEqual([]);
  });

  it('tells what it cannot make out, and loses nothing that was typed', async () => {
    const { page } = await open('Bo Lind');
    await what(page).fill('rib');
    await page.keyboard.press('Enter');
    await page.getByText('That means no part, or several: pick one of the list.').waitFor();
    expect(await what(page).inputValue()).toBe('rib');
  });

  it('is corrected by another weighing, and the first stays to be read', async () => {
    const own = await open('Cato Brun');
    const { page, id } = own;
    await what(page).fill('Spar, top, port');
    await shows(page).fill('9');
    await page.getByRole('button', { name: 'Write it down' }).click();
    await page.getByRole('button', { name: 'Correct Spar, top, port' }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByRole('button', { name: 'Write the correction down' }).click();
    await dialog.getByText('Say why.').waitFor();
    await expectAccessible(page, 'a correction');
    await dialog.getByLabel('The scale showed').fill('7.1');
    await dialog.getByLabel('Why').fill('The clamp lay on the scale');
    await dialog.getByRole('button', { name: 'Write the correction down' }).click();
    await expect
      .poll(
        async () => (await keptOf(own, id)).map(({ mass, correctedBy }) => [mass, correctedBy !== null]),
        PATIENT,
      )
      .toEqual([
        [9, true],
        [7.1, false],
      ]);
    await page.getByText('corrects No. 1: The clamp lay on the scale').waitFor();
    await page.getByText('corrected by No. 2').waitFor();
    await page.getByText(/^7\.1.g of it on the scale, 1 of/).waitFor();
  });

  it('is kept once when the line is cut and the page reloaded, on a phone', async () => {
    const own = await open('Dag Holm', { ...PHONE, colorScheme: 'dark' });
    const { page, context, id } = own;
    await context.setOffline(true);
    for (const [part, reading] of [
      ['Spar, top, port', '7'],
      ['Spar, top, starboard', '7.2'],
    ] as const) {
      await what(page).fill(part);
      await shows(page).fill(reading);
      await page.getByRole('button', { name: 'Write it down' }).click();
    }
    await page.getByText('2 weighings wait to be sent').waitFor();
    await page.getByText(/^14\.2.g of it on the scale, 2 of/).waitFor();
    await picture(page, 'as-built-phone');
    expect(await keptOf(own, id)).toEqual([]);
    await context.setOffline(false);
    await page.reload();
    await expect.poll(async () => (await keptOf(own, id)).map(({ mass }) => mass), PATIENT).toEqual([7, 7.2]);
    await expect.poll(() => page.getByText('wait to be sent').count(), PATIENT).toBe(0);
    await page.reload();
    await page.getByText(/^14\.2.g of it on the scale/).waitFor();
    expect(await keptOf(own, id)).toHaveLength(2);
  });

  it('takes the reading of a scale on a cable, once it stands still', async () => {
    const builder = await newBuilder(browser, 'Esben Krog');
    const { page } = builder;
    // A scale that sends a line when the test says so.
    await page.addInitScript(() => {
      let push: (text: string) => void = () => undefined;
      const port = {
        open: () => Promise.resolve(),
        close: () => Promise.resolve(),
        readable: new ReadableStream<Uint8Array>({
          start: (controller) => {
            push = (text) => controller.enqueue(new TextEncoder().encode(text));
          },
        }),
      };
      Object.assign(globalThis, { scaleSays: (text: string) => push(text) });
      Object.defineProperty(navigator, 'serial', { value: { requestPort: () => Promise.resolve(port) } });
    });
    const { id } = await makeGlider(builder);
    await page.goto(`/gliders/${id}/built`);
    await page.getByRole('button', { name: 'Read a scale on a cable' }).click();
    const says = (text: string) =>
      page.evaluate(
        (line) => (globalThis as unknown as { scaleSays: (text: string) => void }).scaleSays(line),
        text,
      );
    await says('US,GS,+   3.4 g\r\n');
    await page.getByText('not still yet').waitFor();
    await says('ST,GS,+   3.1 g\r\n');
    await page.getByRole('button', { name: /^Take 3\.1/ }).click();
    await expect.poll(() => shows(page).inputValue(), PATIENT).toBe('3.1');
  });

  it('is for the pilot too, who may not draw, and for the reader only to look at', async () => {
    const pilot = await signedIn(browser, { email: 'pilot@larkmoor.example', password: 'larkmoor-pilot' });
    const { gliders } = await (await pilot.context.request.get('/api/gliders?search=Dunlin')).json();
    const id = String(gliders[0].id);
    const before = (await keptOf(pilot, id)).length;
    await pilot.page.goto(`/gliders/${id}/built`);
    await what(pilot.page).fill('Spar, top, port');
    await shows(pilot.page).fill('7');
    await pilot.page.getByRole('button', { name: 'Write it down' }).click();
    await expect.poll(async () => (await keptOf(pilot, id)).length, PATIENT).toBe(before + 1);
    const put = await pilot.context.request.put(`/api/gliders/${id}`, {
      headers: { 'If-Match': '"1"' },
      data: { plan: (await (await pilot.context.request.get(`/api/gliders/${id}`)).json()).plan },
    });
    expect(put.status()).toBe(403);

    const reader = await signedIn(browser, { email: 'member@larkmoor.example', password: 'larkmoor-member' });
    await reader.page.goto(`/gliders/${id}/built`);
    await reader.page.getByText('You may look at the weighings of this glider').waitFor();
    expect(await reader.page.getByRole('form', { name: 'Weigh' }).count()).toBe(0);
    expect(await reader.page.getByRole('button', { name: /^Correct/ }).count()).toBe(0);
  });
});
