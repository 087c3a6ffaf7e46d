import { readFile } from 'node:fs/promises';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { DESKTOP, expectAccessible, PATIENT, PHONE, picture, signIn, visit } from './support/browser.ts';
import { makeGlider, newBuilder, signedIn } from './support/desk.ts';
import { linkIn, mailTo, showMail } from './support/mails.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

const NEXT = 'nine lime laminations';
const address = (name: string) => `${name}.${Date.now()}@example.org`;

describe('an account', () => {
  it('is made, confirmed by the mailed link, and its address changed', async () => {
    const visited = await visit(browser);
    const { page, complaints } = visited;
    const email = address('maud');
    await page.goto('/sign-up');
    await page.getByLabel('Name').fill('Maud Ferris');
    await page.getByLabel('E-mail').fill(email);
    await page.getByLabel('Password', { exact: true }).fill('feathers and beams');
    await page.getByRole('button', { name: 'Sign up' }).click();
    await page.waitForURL('**/bench');

    const mail = await mailTo(visited, email, 'Confirm your address');
    await page.goto(linkIn(mail));
    await page.getByRole('button', { name: 'Confirm the address' }).click();
    await page.getByRole('heading', { name: 'The address is confirmed' }).waitFor();
    await expectAccessible(page, 'the confirmed address');
    await page.getByRole('link', { name: 'To the account' }).click();
    await page.getByText(`${email}, confirmed`).waitFor();

    const next = address('maud.new');
    await page.getByRole('button', { name: 'Change the address' }).click();
    await page.getByLabel('New address').fill(next);
    await page.getByLabel('Your password').fill('not the password');
    await page.getByRole('button', { name: 'Send the link' }).click();
    await page.getByText('That is not your password.').waitFor();
    await page.getByLabel('Your password').fill('feathers and beams');
    await page.getByRole('button', { name: 'Send the link' }).click();
    await page.getByText('is to take its place').waitFor();
    await page.goto(linkIn(await mailTo(visited, next, 'Confirm your address')));
    await page.getByRole('button', { name: 'Confirm the address' }).click();
    await page.getByText(`${next} is yours`).waitFor();
    // The refused password is the only thing that the browser complained of.
    expect(complaints.filter((text) => !text.includes('403'))).toEqual([]);
  });

  it('is opened again by a mailed link when the password is forgotten, and every browser is signed out', async () => {
    const builder = await newBuilder(browser, 'Hal Brent');
    const visited = await visit(browser, PHONE);
    const { page } = visited;
    await page.goto('/sign-in');
    await page.getByRole('link', { name: /forgot/i }).click();
    await page.getByLabel('E-mail').fill(builder.email);
    await expectAccessible(page, 'the forgotten password');
    await page.getByRole('button', { name: 'Send the link' }).click();
    await page.getByText('a link is on its way').waitFor();
    const mail = await mailTo(visited, builder.email, 'Set a new password');
    await page.goto(linkIn(mail));
    await page.getByLabel('New password').fill('Password1234');
    await page.getByRole('button', { name: 'Set the password' }).click();
    await page.getByText(/among the first that others would try/).waitFor();
    await page.getByLabel('New password').fill(NEXT);
    await page.getByRole('button', { name: 'Set the password' }).click();
    await page.getByRole('heading', { name: 'The new password is set' }).waitFor();
    await signIn(page, builder.email, NEXT);
    expect((await builder.context.request.get('/api/account')).status()).toBe(401);
    await page.goto(linkIn(mail));
    await page.getByLabel('New password').fill('another good long one');
    await page.getByRole('button', { name: 'Set the password' }).click();
    await page.getByText(/This link was used/).waitFor();
  });

  it('signs browsers out one by one, keeps units and theme, and gives everything out as a file', async () => {
    const builder = await newBuilder(browser, 'Ines Vale');
    await makeGlider(builder);
    const elsewhere = await signedIn(browser, builder, PHONE);
    const { page, complaints } = builder;
    await page.goto('/account');
    await page.getByRole('heading', { name: 'Ines Vale’s account' }).waitFor();
    await expect
      .poll(() => page.getByRole('button', { name: /^Sign out (?!here)/ }).count(), PATIENT)
      .toBeGreaterThan(0);
    await expectAccessible(page, 'the account');
    await picture(page, 'account');
    await page.getByRole('button', { name: 'Sign out all the others' }).click();
    await page.getByText('Every other browser is signed out.').waitFor();
    expect((await elsewhere.context.request.get('/api/account')).status()).toBe(401);

    await page.getByLabel('Inches and ounces').check();
    await page.getByLabel('Dark').check();
    await expect
      .poll(async () => page.evaluate(() => document.documentElement.classList.contains('dark')))
      .toBe(true);
    await expectAccessible(page, 'the account, dark');
    const another = await signedIn(browser, builder);
    await another.page.goto('/bench');
    await another.page
      .getByText(/\boz\b/)
      .filter({ visible: true })
      .first()
      .waitFor();
    await expect
      .poll(
        async () => another.page.evaluate(() => document.documentElement.classList.contains('dark')),
        PATIENT,
      )
      .toBe(true);

    const download = page.waitForEvent('download');
    await page.getByRole('link', { name: 'Download everything' }).click();
    const file: unknown = JSON.parse(await readFile(await (await download).path(), 'utf8'));
    expect(file).toMatchObject({ account: { name: 'Ines Vale' }, gliders: [{ plan: { version: 1 } }] });
    expect(complaints).toEqual([]);
  });

  it('is deleted with its gliders after the password is typed', async () => {
    const builder = await newBuilder(browser, 'Otto Lenz', DESKTOP);
    await makeGlider(builder);
    const { page } = builder;
    await page.goto('/account');
    await page.getByRole('button', { name: 'Delete the account …' }).click();
    await expectAccessible(page, 'the deletion');
    await page.getByRole('dialog').getByLabel('Your password').fill(builder.password);
    await page.getByRole('button', { name: 'Delete for good' }).click();
    await page.getByText('The account is deleted, and 1 glider with it.').waitFor();
    const answer = await builder.context.request.post('/api/session', {
      data: { email: builder.email, password: builder.password },
    });
    expect(answer.status()).toBe(401);
  });

  it('writes mails that can be read in a mail program, in light and on a phone', async () => {
    const builder = await newBuilder(browser, 'Pia Noor');
    const mail = await mailTo(builder, builder.email, 'Confirm your address');
    const { page } = await visit(browser, PHONE);
    await showMail(page, mail);
    await picture(page, 'mail-confirm-phone');
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth)).toBe(true);
    expect(await page.locator('a').getAttribute('href')).toContain('/verify-email/');
    expect(mail.text).toMatch(/^Hello Pia Noor,/);
  });
});
