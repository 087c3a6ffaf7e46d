import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, PHONE, picture, visit } from './support/browser.ts';
import { fillPart, makeGlider, newBuilder, openDrawing, storedGlider, type Builder } from './support/desk.ts';
import { linkIn, mailTo, showMail } from './support/mails.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

/** Somebody whose address is confirmed, so that they may invite. */
async function owner(name: string): Promise<Builder & { id: string }> {
  const builder = await newBuilder(browser, name);
  const { page } = builder;
  await page.goto(linkIn(await mailTo(builder, builder.email, 'Confirm your address')));
  await page.getByRole('button', { name: 'Confirm the address' }).click();
  await page.getByRole('heading', { name: 'The address is confirmed' }).waitFor();
  const { id } = await makeGlider(builder);
  return { ...builder, id };
}

async function invite({ page, id }: Builder & { id: string }, email: string, role: string): Promise<void> {
  await page.goto(`/gliders/${id}/sharing`);
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('as', { exact: true }).selectOption({ label: role });
  await page.getByRole('button', { name: 'Invite', exact: true }).click();
  await page.getByText(`The invitation is on its way to ${email}.`).waitFor();
}

async function join(guest: Builder): Promise<void> {
  const mail = await mailTo(guest, guest.email, 'invites you to the glider');
  await guest.page.goto(linkIn(mail));
  await guest.page.getByRole('button', { name: 'Accept' }).click();
  await guest.page.waitForURL(/\/gliders\/[\w-]+\/drawing/);
}

describe('sharing a glider', () => {
  it('goes by a mailed invitation to a builder who draws, and ends when the owner says so', async () => {
    const host = await owner('Carla Moss');
    const guest = await newBuilder(browser, 'Rolf Tarn');
    await invite(host, guest.email, 'Builder');
    await expectAccessible(host.page, 'sharing');
    await picture(host.page, 'sharing');

    const mail = await mailTo(host, guest.email, 'Carla Moss invites you to the glider Dunlin');
    const reading = await visit(browser, PHONE);
    await showMail(reading.page, mail);
    await picture(reading.page, 'mail-invitation-phone');
    await guest.page.goto(linkIn(mail));
    await guest.page.getByRole('heading', { name: 'Carla Moss invites you to Dunlin' }).waitFor();
    await expectAccessible(guest.page, 'the invitation');
    await guest.page.getByRole('button', { name: 'Accept' }).click();
    await guest.page.waitForURL(`**/gliders/${host.id}/drawing`);
    await openDrawing(guest.page, host.id);
    await fillPart(guest.page, 'Nose sheeting', 'Thickness', '1.5');
    await expect.poll(async () => (await storedGlider(host, host.id)).version, PATIENT).toBe(2);
    expect((await storedGlider(host, host.id)).updatedBy).toBe('Rolf Tarn');

    await host.page.reload();
    await host.page.getByRole('button', { name: 'Remove Rolf Tarn' }).click();
    await expectAccessible(host.page, 'the removal');
    await host.page.getByRole('dialog').getByRole('button', { name: 'Remove Rolf Tarn' }).click();
    await host.page.getByText('Rolf Tarn no longer sees Dunlin.').waitFor();
    expect((await guest.context.request.get(`/api/gliders/${host.id}`)).status()).toBe(404);
  });

  it('lets a pilot and a reader look and no more; a withdrawn link is dead', async () => {
    const host = await owner('Tess Winter');
    const pilot = await newBuilder(browser, 'Jan Rook', PHONE);
    await invite(host, pilot.email, 'Pilot');
    await join(pilot);
    await pilot.page.getByRole('button', { name: /^Ribs/ }).first().waitFor();
    expect(await pilot.page.getByRole('button', { name: /^Undo/ }).count()).toBe(0);
    const refused = await pilot.context.request.put(`/api/gliders/${host.id}`, {
      data: { plan: (await storedGlider(host, host.id)).plan },
      headers: { 'If-Match': '"1"' },
    });
    expect(refused.status()).toBe(403);

    const late = await newBuilder(browser, 'Uwe Brack');
    await invite(host, late.email, 'Reader');
    const link = linkIn(await mailTo(late, late.email, 'invites you'));
    await host.page.getByRole('button', { name: `Withdraw the invitation to ${late.email}` }).click();
    await host.page.getByText('is withdrawn').waitFor();
    await late.page.goto(link);
    await late.page.getByRole('heading', { name: 'This invitation no longer works' }).waitFor();
  });

  it('shows the glider by a read-only link without an account until the link is switched off', async () => {
    const host = await owner('Britt Olsen');
    const { page, id } = host;
    await page.goto(`/gliders/${id}/sharing`);
    await page.getByRole('button', { name: 'Switch the link on' }).click();
    const address = await page.getByLabel('Link', { exact: true }).inputValue();
    const visitor = await visit(browser);
    await visitor.page.goto(new URL(address).pathname);
    await visitor.page
      .getByRole('button', { name: /^Nose sheeting/ })
      .first()
      .waitFor();
    await expectAccessible(visitor.page, 'a shared glider');
    await picture(visitor.page, 'shared');
    await visitor.page.getByRole('link', { name: 'Balance' }).click();
    await visitor.page.getByRole('heading', { level: 1 }).waitFor();
    await page.getByRole('button', { name: 'Switch it off' }).click();
    await page.getByText('The link is off').waitFor();
    await visitor.page.goto(new URL(address).pathname);
    await visitor.page.getByRole('heading', { name: /shows nothing/ }).waitFor();
  });

  it('hands a glider over, and lets the old owner leave', async () => {
    const host = await owner('Gerd Falk');
    const heir = await newBuilder(browser, 'Lis Arden');
    await invite(host, heir.email, 'Reader');
    await join(heir);
    const { page } = host;
    await page.goto(`/gliders/${host.id}/sharing`);
    await page.getByLabel('New owner').selectOption({ label: 'Lis Arden' });
    await page.getByRole('button', { name: 'Hand over …' }).click();
    await page.getByRole('dialog').getByRole('button', { name: 'Hand over' }).click();
    await page.getByText('Lis Arden owns Dunlin now; you are one of its builders.').waitFor();
    expect((await storedGlider(heir, host.id)).role).toBe('owner');
    await page.getByRole('button', { name: 'Leave Dunlin …' }).click();
    await page.getByRole('button', { name: 'Leave it' }).click();
    await page.waitForURL('**/bench');
    expect((await host.context.request.get(`/api/gliders/${host.id}`)).status()).toBe(404);
  });
});
