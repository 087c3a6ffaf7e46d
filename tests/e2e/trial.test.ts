import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { gliderList } from '#shared/schemas/glider.ts';
import { gliderTrials } from '#shared/schemas/trials.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { expectAccessible, PATIENT, PHONE, picture, visit, type Visit } from './support/browser.ts';
import { makeGlider, newBuilder, signedIn, storedGlider, titleBlock } from './support/desk.ts';

const plain = (text: string | null) => (text ?? '').replaceAll('\u202f', ' ').replaceAll(', ask why', '');
const headline = async (page: Page) => plain(await page.getByRole('heading', { level: 1 }).textContent());
const table = (page: Page) => page.getByRole('table', { name: 'Wood trials side by side' });
const status = (page: Page) => page.getByRole('status', { name: 'Trials' });
const saved = (page: Page) => expect.poll(() => status(page).textContent(), PATIENT).toMatch(/^Trials saved/);

async function addTrial(
  page: Page,
  number: number,
  name: string,
  woods: Record<string, string>,
): Promise<void> {
  await page.getByRole('button', { name: 'Add a trial' }).click();
  await page.getByLabel(`Name of trial ${number}`).fill(name);
  for (const [place, wood] of Object.entries(woods)) {
    await page.getByLabel(`${place}, ${name}`, { exact: true }).selectOption(wood);
  }
}

async function kept({ context }: Pick<Visit, 'context'>, id: string) {
  return gliderTrials.parse(await (await context.request.get(`/api/gliders/${id}/trials`)).json());
}

describe('wood trials', () => {
  let browser: Browser;
  beforeAll(async () => {
    browser = await openBrowser();
  });
  afterAll(() => browser.close());

  it('are made, compared, applied, undone and kept, by group and by single part', async () => {
    const builder = await newBuilder(browser, 'Trial Builder');
    const { page, complaints } = builder;
    const { id } = await makeGlider(builder);
    await page.goto(`/gliders/${id}/trial`);
    // One trial is thought out to begin with; nothing is kept before something is changed.
    expect(await headline(page)).toMatch(
      /^One grade lighter ribs: saves \d\.\d g; after re-trim \d\.\d g; spar margin unchanged at/,
    );
    expect((await kept(builder, id)).updatedAt).toBeNull();

    await addTrial(page, 2, 'Light sheeting', { Sheeting: 'balsa-light' });
    await addTrial(page, 3, 'Light spars', { Spars: 'balsa-light' });
    await page.getByText('Single parts of spars').click();
    await page
      .getByRole('region', { name: 'Woods of Light spars' })
      .getByLabel('Spar, top', { exact: true })
      .selectOption('balsa-hard');
    await saved(page);
    const stored = await kept(builder, id);
    expect(stored.trials.map(({ name }) => name)).toEqual([
      'One grade lighter ribs',
      'Light sheeting',
      'Light spars',
    ]);
    expect(Object.keys(stored.trials[2]!.materials).some((key) => key.includes('/'))).toBe(true);

    // The sentence is of any two.
    await page.getByLabel('From', { exact: true }).selectOption({ label: 'One grade lighter ribs' });
    await page.getByLabel('To', { exact: true }).selectOption({ label: 'Light sheeting' });
    expect(await headline(page)).toMatch(/^Light sheeting: (saves|costs) \d+\.\d g; after re-trim/);
    await page.getByRole('heading', { level: 1 }).getByRole('button').first().click();
    await page.getByRole('dialog').getByText('Light sheeting', { exact: false }).first().waitFor();
    await page.keyboard.press('Escape');

    // The plot: every trial is a button that the keyboard reaches and that picks it.
    const plot = page.getByRole('figure', { name: /against spar margin/ });
    const point = plot.getByRole('button', { name: /^Light sheeting:/ });
    await point.focus();
    await page.keyboard.press('Enter');
    await page.getByRole('region', { name: 'Woods of Light sheeting' }).waitFor();
    await plot.getByText('Table', { exact: true }).click();
    expect(await plot.getByRole('row').count()).toBe(5);

    // Equal terms: a class minimum fills all up to the same mass.
    await page.getByLabel('Class minimum mass').fill('400');
    await expect
      .poll(
        async () =>
          (await table(page).getByRole('row').allTextContents())
            .slice(1)
            .map((row) => plain(row).includes('400.0 g')),
        PATIENT,
      )
      .toEqual([true, true, true, true]);
    await page.getByLabel('Class minimum mass').fill('');

    const sensitivity = page.getByRole('region', { name: /more on .* all up$/ });
    expect(await sensitivity.getByRole('table').count()).toBe(2);
    await page
      .getByText(/^Stock that/)
      .first()
      .click();
    await page
      .getByRole('table', { name: /^Stock that/ })
      .getByText('Sheet', { exact: false })
      .first()
      .waitFor();
    await expectAccessible(page, 'wood trials');
    await page.emulateMedia({ colorScheme: 'dark' });
    await expectAccessible(page, 'wood trials in the dark');
    await picture(page, 'trials-dark');
    await page.emulateMedia({ colorScheme: 'light' });
    await picture(page, 'trials');

    // Applied as one edit, taken back as one.
    const before = (await storedGlider(builder, id)).plan;
    await page.getByRole('button', { name: 'Make this the plan' }).click();
    await expect
      .poll(
        async () => (await storedGlider(builder, id)).plan.materials['balsa-light'] !== undefined,
        PATIENT,
      )
      .toBe(true);
    await expect.poll(() => titleBlock(page).textContent(), PATIENT).toContain('Saved');
    expect((await storedGlider(builder, id)).plan).not.toEqual(before);
    await page.getByRole('button', { name: /^Undo/ }).click();
    await expect
      .poll(async () => JSON.stringify((await storedGlider(builder, id)).plan), PATIENT)
      .toBe(JSON.stringify(before));

    await page.getByRole('button', { name: 'Move up' }).click();
    await page.getByRole('button', { name: 'Copy' }).click();
    await page.getByLabel('Name of trial 2').waitFor();
    await page.getByRole('button', { name: 'Remove', exact: true }).click();
    await saved(page);
    await page.reload();
    await table(page).getByRole('button', { name: 'Light sheeting', exact: true }).waitFor();
    expect((await kept(builder, id)).trials.map(({ name }) => name)).toEqual([
      'Light sheeting',
      'One grade lighter ribs',
      'Light spars',
    ]);
    expect(complaints).toEqual([]);
  });

  it('of two windows are joined and nothing is lost', async () => {
    const first = await newBuilder(browser, 'Two Windows');
    const { id } = await makeGlider(first);
    const second = await signedIn(browser, first);
    for (const { page } of [first, second]) {
      await page.goto(`/gliders/${id}/trial`);
      await table(page).waitFor();
    }
    await addTrial(first.page, 2, 'Of the first', { Sheeting: 'balsa-light' });
    await saved(first.page);
    await addTrial(second.page, 2, 'Of the second', { Ribs: 'balsa-hard' });
    await second.page.getByText('Both lists are joined').waitFor();
    await saved(second.page);
    expect((await kept(first, id)).trials.map(({ name }) => name).sort()).toEqual([
      'Of the first',
      'Of the second',
      'One grade lighter ribs',
    ]);
    await expectAccessible(second.page, 'joined trials');
  });

  it('are seen by a reader, who cannot change them', async () => {
    const owner = await signedIn(browser, {
      email: 'builder@larkmoor.example',
      password: 'larkmoor-builder',
    });
    const reader = await signedIn(browser, { email: 'member@larkmoor.example', password: 'larkmoor-member' });
    const { gliders } = gliderList.parse(await (await reader.context.request.get('/api/gliders')).json());
    const dunlin = gliders.find(({ name, role }) => name === 'Dunlin' && role === 'reader');
    const id = dunlin?.id ?? '';
    const { version } = await kept(owner, id);
    const answer = await owner.context.request.put(`/api/gliders/${id}/trials`, {
      data: { trials: [{ name: 'Of the owner', materials: {} }], terms: { arm: null, minimumMass: 250 } },
      headers: { 'If-Match': `"${version}"` },
    });
    expect(answer.status()).toBe(200);
    const { page } = reader;
    await page.goto(`/gliders/${id}/trial`);
    await table(page).getByRole('button', { name: 'Of the owner', exact: true }).waitFor();
    await page.getByText('You may look at these trials').waitFor();
    for (const name of ['Add a trial', 'Copy', 'Remove', 'Make this the plan']) {
      expect(await page.getByRole('button', { name, exact: true }).count(), name).toBe(0);
    }
    expect(await page.getByLabel('Class minimum mass').getAttribute('readonly')).not.toBeNull();
    expect(await page.getByLabel('Sheeting, Of the owner').isDisabled()).toBe(true);
    await expectAccessible(page, 'trials of somebody else');
  });

  it('of the sample stay on the device, a card each on the phone', async () => {
    const { page, complaints } = await visit(browser, PHONE);
    await page.goto('/sample/trial');
    await addTrial(page, 2, 'Light sheeting', { Sheeting: 'balsa-light' });
    await page.reload();
    const cards = page.getByRole('list', { name: 'Wood trials side by side' });
    await expect.poll(() => cards.getByRole('listitem').count(), PATIENT).toBe(3);
    await cards.getByRole('button', { name: 'Light sheeting', exact: true }).click();
    await page.getByLabel('Name of trial 2').waitFor();
    const wider = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
    expect(wider).toBeLessThanOrEqual(0);
    await expectAccessible(page, 'trials on the phone');
    await picture(page, 'trials-phone');
    // An arm behind the wanted point cannot trim it, and the page says why.
    await page.getByLabel('Ballast at arm').fill('300');
    await cards
      .getByText(/would have to come off at/)
      .first()
      .waitFor();
    expect(complaints).toEqual([]);
  });
});
