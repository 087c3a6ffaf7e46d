import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { cutParts } from '#shared/core/cut/cut-parts.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { demoPlan } from '#tests/support/plans.ts';
import { expectAccessible, PATIENT, picture } from './support/browser.ts';
import { makeGlider, newBuilder, type Builder } from './support/desk.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

/** Two pieces, a light and a heavy one, of every size that the plan cuts sheets and sticks of. */
async function fillRack({ context }: Builder): Promise<number> {
  const plan = demoPlan('dunlin');
  const sizes = new Map(
    cutParts(plan).map((part) => {
      const { form, material, thickness } = part;
      const width = form === 'stick' ? part.width : 100;
      return [`${form} ${material} ${thickness} ${width}`, { form, material, thickness, width }] as const;
    }),
  );
  let count = 0;
  for (const { form, material, thickness, width } of sizes.values()) {
    const { name = '', density = 150 } = plan.materials[material] ?? {};
    for (const times of [0.9, 1.1]) {
      const mass = (1000 * width * thickness * density * times) / 1e6;
      const data = {
        kind: form,
        material: { key: material, name, category: 'wood' },
        length: 1000,
        width,
        thickness,
        wall: null,
        mass: Math.round(mass * 100) / 100,
        resolution: 0.01,
        grade: '',
        grainCut: null,
        note: '',
      };
      const answer = await context.request.post('/api/rack', { data });
      expect(answer.status()).toBe(201);
      count += 1;
    }
  }
  return count;
}

const section = (page: Page) => page.getByRole('region', { name: 'Which piece for which part' });

describe('which piece for which part', () => {
  it('is found, changed by hand, kept with the pieces reserved, and written into the drawing', async () => {
    const builder = await newBuilder(browser, 'Tilde Ravn');
    const { page, complaints, context } = builder;
    const { id } = await makeGlider(builder);
    await page.goto(`/gliders/${id}/cut`);
    await section(page).getByText('Nothing weighed lies on your rack.').waitFor();
    await fillRack(builder);
    await page.reload();
    const here = section(page);
    await here.getByText(/none of them cut from your rack yet/).waitFor();

    await here.getByRole('button', { name: 'Find the best pieces' }).click();
    await expect.poll(() => here.getByRole('status').textContent(), PATIENT).toMatch(/^Found in .* s; .*\.$/);
    await here.getByText(/^\d+ of \d+ parts from \d+ pieces of yours/).waitFor();
    await expectAccessible(page, 'the pieces found');
    await picture(page, 'assignment');

    // By hand: the rib goes to the heavy sheet, and stays there when pieces are looked for again.
    await here.getByText(/^Ribs, outer panel, 8 pieces/).click();
    const choice = here.getByRole('combobox', { name: /^Piece for Ribs, outer panel, 2, port$/ });
    const light = await choice.inputValue();
    const options = await choice
      .locator('option')
      .evaluateAll((all) => all.map((each) => (each as HTMLOptionElement).value));
    const heavy = options.find((value) => value !== '' && value !== light);
    if (heavy === undefined) throw new Error('no other piece');
    await choice.selectOption(heavy);
    await here.getByText('by hand').waitFor();
    await here.getByRole('button', { name: 'Find the best pieces' }).click();
    await expect.poll(() => here.getByRole('status').textContent(), PATIENT).toMatch(/^Found in/);
    expect(await choice.inputValue()).toBe(heavy);

    await here.getByRole('button', { name: 'Keep and reserve' }).click();
    await expect
      .poll(() => here.getByRole('button', { name: 'Keep and reserve' }).isDisabled(), PATIENT)
      .toBe(true);
    const kept = await (await context.request.get(`/api/gliders/${id}/assignment`)).json();
    expect(kept.version).toBe(2);
    expect(kept.pieces.every(({ state }: { state: string }) => state === 'reserved')).toBe(true);
    await page.reload();
    await here.getByText(/^Ribs, outer panel, 8 pieces/).click();
    await expect.poll(() => choice.inputValue(), PATIENT).toBe(heavy);
    await here.getByText('by hand').waitFor();

    await here.getByRole('button', { name: 'Write their densities into the drawing' }).click();
    const materialOf = async () => {
      const { plan } = await (await context.request.get(`/api/gliders/${id}`)).json();
      const ribs = plan.surfaces[0].parts.find(({ name }: { name: string }) => name === 'Ribs, outer panel');
      return String(plan.materials[ribs.material]?.name);
    };
    await expect.poll(materialOf, PATIENT).toMatch(/^No\. \d+(, \d+)*, Balsa/);
    await page.keyboard.press('Control+z');
    await expect.poll(materialOf, PATIENT).toMatch(/^Balsa/);
    expect(complaints).toEqual([]);
  });

  it('can be stopped, and a closed page leaves nothing half kept', async () => {
    const builder = await newBuilder(browser, 'Ulf Maan');
    const { page, context } = builder;
    const { id } = await makeGlider(builder);
    await fillRack(builder);
    await page.goto(`/gliders/${id}/cut`);
    const here = section(page);
    // The solver is a minute on its way, as on a bad line: the search can be stopped before it has begun.
    await page.route(/highs.*\.wasm/, () => undefined);
    await here.getByRole('button', { name: 'Find the best pieces' }).click();
    await here.getByText('Starting the search …').waitFor();
    await here.getByRole('button', { name: 'Stop searching' }).click();
    await here.getByText('Stopped.').waitFor();
    await page.unroute(/highs.*\.wasm/);
    await here.getByRole('button', { name: 'Find the best pieces' }).click();
    await expect.poll(() => here.getByRole('status').textContent(), PATIENT).toMatch(/^Found in/);
    await page.close();
    const kept = await (await context.request.get(`/api/gliders/${id}/assignment`)).json();
    expect([kept.version, kept.entries]).toEqual([1, []]);
    const { pieces } = await (await context.request.get('/api/rack?state=reserved')).json();
    expect(pieces).toEqual([]);
  });
});
