import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { firstFlightList, type FirstFlightDto } from '#shared/schemas/first-flight.ts';
import { gliderList } from '#shared/schemas/glider.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, PHONE, picture } from './support/browser.ts';
import { makeGlider, newBuilder, signedIn, type Builder } from './support/desk.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

async function keptOf({ context }: Pick<Builder, 'context'>, id: string): Promise<FirstFlightDto[]> {
  const answer = await context.request.get(`/api/gliders/${id}/first-flights`);
  return firstFlightList.parse(await answer.json()).firstFlights;
}
const field = (page: Page, label: string) => page.getByLabel(label, { exact: true });

async function openField(name: string) {
  const builder = await newBuilder(browser, name, PHONE);
  const { id } = await makeGlider(builder);
  await gotoField(builder.page, id);
  return { ...builder, id };
}
async function gotoField(page: Page, id: string): Promise<void> {
  await page.goto(`/gliders/${id}/flight`);
  await page.getByText('No record is signed yet.').waitFor();
}

/** 220.4 g, 75.0 mm aft of the datum: aft of the range. */
async function weigh(page: Page, front = '97.2', rear = '123.2'): Promise<void> {
  await field(page, 'Front: Shows').fill(front);
  await field(page, 'Front: Stands at').fill('-20');
  await field(page, 'Rear: Shows').fill(rear);
  await field(page, 'Rear: Stands at').fill('150');
}
async function answerAll(page: Page): Promise<void> {
  for (const row of await page
    .locator('ol > li')
    .filter({ has: page.getByRole('radio') })
    .all()) {
    await row.getByText('Yes', { exact: true }).click();
  }
  await page.getByText('11 of 11').waitFor();
}
const verdict = (page: Page) => page.locator('.text-display');

describe('the field day', () => {
  it('goes from the weighing to the signature without a connection, and one record arrives', async () => {
    const own = await openField('Rikke Dahl');
    const { page, context, id, complaints } = own;
    await expectAccessible(page, 'an empty field day');
    await context.setOffline(true);
    await page.getByText('No signal: everything is kept here').waitFor();
    await weigh(page);
    await expect.poll(() => verdict(page).textContent(), PATIENT).toMatch(/^2\.8.mm aft of your range$/);
    await expectTargets(page);
    await page.getByText('Elsewhere, and the pieces at hand').click();
    await field(page, 'Ballast goes in at').fill('-100');
    await page.getByText(/^Add .* the datum$/).waitFor();
    await page.getByRole('button', { name: 'It is fitted' }).click();
    await expect.poll(() => verdict(page).textContent(), PATIENT).toMatch(/^(On the middle|Inside)/);
    await field(page, 'Wind measured').fill('1.4');
    await page.getByText(/1\.4.m\/s measured: less than that/).waitFor();
    await answerAll(page);
    await page.getByRole('button', { name: 'Rose and stalled' }).click();
    await page.getByText(/a gram more in the nose/).waitFor();
    await field(page, 'Changed after it 1').fill('One gram more in the nose');
    await page.getByRole('button', { name: 'Sign and keep' }).click();
    await page.getByText('Sign with your name.').waitFor();
    await field(page, 'Pilot’s name').fill('Rikke Dahl');
    await expectAccessible(page, 'a full field day');
    await picture(page, 'first-flight');
    // Twice pressed, still one.
    await page.getByRole('button', { name: 'Sign and keep' }).dblclick();
    await page.getByText('Signed by Rikke Dahl and kept on this device.').waitFor();
    await page.getByText('It goes by itself when the server can be reached.').waitFor();
    expect(await keptOf(own, id).catch(() => [])).toEqual([]);
    await context.setOffline(false);
    await page.getByText('No. 1').first().waitFor();
    const records = await keptOf(own, id);
    expect(records).toHaveLength(1);
    const [record] = records;
    expect(record).toMatchObject({ number: 1, signature: 'Rikke Dahl', wind: 1.4, follows: null });
    expect(record?.measured.mass).toBeCloseTo(220.4, 6);
    expect(record?.measured.x).toBeCloseTo((97.2 * -20 + 123.2 * 150) / 220.4, 6);
    expect(record?.checks).toHaveLength(11);
    expect(record?.glides).toEqual([{ behaviour: 'stalls', note: 'One gram more in the nose' }]);
    expect(complaints.filter((one) => !one.includes('ERR_INTERNET_DISCONNECTED'))).toEqual([]);
  });

  it('keeps what was typed through a reload', async () => {
    const { page, id } = await openField('Sune Kvist');
    await weigh(page);
    await page.getByRole('button', { name: 'Dived' }).click();
    const before = await verdict(page).textContent();
    await page.reload();
    await expect.poll(() => verdict(page).textContent(), PATIENT).toBe(before);
    expect(await field(page, 'Rear: Shows').inputValue()).toBe('123.2');
    expect(page.url()).toContain(id);
    await page.getByText('1. Dived').waitFor();
  });

  it('is not signed while anything is missing, and says what', async () => {
    const own = await openField('Tove Brandt');
    const { page, id } = own;
    await field(page, 'Pilot’s name').fill('Tove Brandt');
    await page.getByRole('button', { name: 'Sign and keep' }).click();
    await page.getByText('The weighing is not all there. 11 of the check are open.').waitFor();
    await weigh(page);
    await answerAll(page);
    const joint = page.locator('li').filter({ hasText: 'Spar joint, joiner' });
    await joint.getByText('No', { exact: true }).click();
    await page.getByText('One thing is not right: mend before you fly.').waitFor();
    await page.getByRole('button', { name: 'Sign and keep' }).click();
    await page.getByText('Note what is not right, where you answered no.').waitFor();
    await joint.getByLabel('Note').fill('Play in the joiner');
    await page.getByRole('button', { name: 'Sign and keep' }).click();
    await page.getByText('Signed by Tove Brandt and kept on this device.').waitFor();
    await expect
      .poll(
        async () => (await keptOf(own, id)).map(({ checks }) => checks.find((one) => one.id === 'joint')),
        PATIENT,
      )
      .toMatchObject([{ answer: 'no', note: 'Play in the joiner' }]);
  });
});

describe('two devices', () => {
  it('sign a record each, both are kept, and it is told that neither knew of the other', async () => {
    const own = await openField('Ulrik Moos');
    const { id, page, context } = own;
    const other = await signedIn(browser, own, PHONE);
    await gotoField(other.page, id);
    await context.setOffline(true);
    for (const one of [page, other.page]) {
      await weigh(one);
      await answerAll(one);
      await field(one, 'Pilot’s name').fill('Ulrik Moos');
      await one.getByRole('button', { name: 'Sign and keep' }).click();
    }
    await expect.poll(async () => (await keptOf(other, id)).length, PATIENT).toBe(1);
    await context.setOffline(false);
    await expect
      .poll(async () => (await keptOf(other, id)).map(({ number }) => number), PATIENT)
      .toEqual([2, 1]);
    await page.getByText('No. 2', { exact: true }).click();
    await page.getByText('follows none: it was begun without knowing of the earlier ones').waitFor();
  });
});

describe('the pilot', () => {
  it('weighs, ballasts and signs a glider of somebody else, and does not draw', async () => {
    const own = await signedIn(
      browser,
      { email: 'pilot@larkmoor.example', password: 'larkmoor-pilot' },
      PHONE,
    );
    const { page, context } = own;
    const list = gliderList.parse(await (await context.request.get('/api/gliders')).json());
    const { id = '', role } = list.gliders.find(({ name }) => name === 'Dunlin') ?? {};
    expect(role).toBe('pilot');
    const before = (await keptOf(own, id)).length;
    await page.goto(`/gliders/${id}/drawing`);
    await page
      .getByRole('button', { name: /^Nose sheeting/ })
      .first()
      .click();
    await expect.poll(() => field(page, 'Thickness').first().isEditable(), PATIENT).toBe(false);
    await page.goto(`/gliders/${id}/built`);
    await page.getByRole('form', { name: 'Weigh' }).waitFor();
    await page.goto(`/gliders/${id}/flight`);
    await page.getByText('No. 1', { exact: true }).waitFor();
    await weigh(page);
    await page.getByRole('button', { name: 'It is fitted' }).click();
    await answerAll(page);
    await field(page, 'Pilot’s name').fill('Rowan Petersham');
    await page.getByRole('button', { name: 'Sign and keep' }).click();
    await expect.poll(async () => (await keptOf(own, id)).length, PATIENT).toBe(before + 1);
  });
});

describe('other ways to balance', () => {
  it('asks for the likely cause where scales and forecast cannot both be right', async () => {
    const { page } = await openField('Viggo Ask');
    await weigh(page, '118', '103');
    await page.getByText('Look again:').waitFor();
    expect(await page.getByText('the two readings were typed the wrong way round').count()).toBe(1);
  });

  it('takes a finger for who has no second scale', async () => {
    const { page } = await openField('Yrsa Vang');
    await page.getByRole('radio', { name: 'On a finger' }).click();
    await field(page, 'Tips forward at').fill('66');
    await field(page, 'Tips aft at').fill('70');
    await field(page, 'It weighs').fill('220');
    await expect.poll(() => page.getByText(/68\.0 ± 1\.2/).count(), PATIENT).toBeGreaterThan(0);
  });
});

/** Whatever is pressed on the field is at least 44 px high (WCAG 2.2, 2.5.5). */
async function expectTargets(page: Page): Promise<void> {
  const small = await page.locator('main .in-sun').evaluate((place) =>
    [
      ...place.querySelectorAll<HTMLElement>(
        'button, input:not(.sr-only), textarea, select, summary, label:has(input.sr-only)',
      ),
    ]
      .filter((one) => one.getClientRects().length > 0 && !one.closest('label:has(input[type=checkbox])'))
      .map((one) => ({
        what: one.textContent || one.outerHTML.slice(0, 80),
        height: one.getBoundingClientRect().height,
      }))
      .filter(({ height }) => height < 43.9),
  );
  expect(small).toEqual([]);
}
