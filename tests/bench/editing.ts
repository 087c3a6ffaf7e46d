import type { Page } from 'playwright-core';
import { openBrowser } from '#tests/support/chromium.ts';
import { serve } from '#tests/support/served.ts';
import { planOfParts } from './large-plan.ts';
import { ms, type Ratio } from './measure.ts';

const FRAME_MS = 1000 / 60;
const KEYS = 40;

/** From a key going down to the frame that shows its answer being on screen: median and 95th of a hundred. */
async function keyToScreen(page: Page): Promise<{ median: number; late: number }> {
  const times: number[] = await page.evaluate(async (keys) => {
    const field = document.querySelector<HTMLInputElement>('input[aria-label="Panel 1, span"], table input');
    if (!field) throw new Error('no field to type in');
    const shown = () =>
      new Promise<void>((resolve) => {
        // A message posted inside a frame's callback arrives once that frame has been drawn.
        requestAnimationFrame(() => {
          const channel = new MessageChannel();
          channel.port1.addEventListener('message', () => resolve(), { once: true });
          channel.port1.start();
          channel.port2.postMessage(null);
        });
      });
    const measured: number[] = [];
    for (let i = 0; i < keys; i++) {
      await new Promise((resolve) => setTimeout(resolve, 60));
      const start = performance.now();
      // Past React's own setter, as a key does.
      Reflect.set(HTMLInputElement.prototype, 'value', String(420 + (i % 7)), field);
      field.dispatchEvent(new Event('input', { bubbles: true }));
      await shown();
      measured.push(performance.now() - start);
    }
    return measured;
  }, KEYS);
  const sorted = times.slice(5).sort((a, b) => a - b);
  const at = (share: number) => sorted[Math.floor(sorted.length * share)] ?? Number.NaN;
  return { median: at(0.5), late: at(0.95) };
}

/** Typing in the Drawing place of a plan of `parts` lines, at full speed and with the processor slowed 4×. */
export async function benchEditing(parts: number): Promise<Ratio[]> {
  const served = await serve();
  const browser = await openBrowser();
  try {
    const context = await browser.newContext({
      baseURL: served.baseUrl,
      viewport: { width: 1440, height: 1000 },
    });
    const person = { name: 'Bench', email: 'bench@example.org', password: 'feathers and beams' };
    await context.request.post('/api/users', { data: person });
    const made = await context.request.post('/api/gliders', { data: { plan: planOfParts(parts) } });
    const { id } = (await made.json()) as { id: string };
    const page = await context.newPage();
    // The runner's compiler marks functions by a helper of this name, which the page does not have.
    await page.addInitScript({ content: 'globalThis.__name = (f) => f;' });
    const cdp = await context.newCDPSession(page);
    const rows: Ratio[] = [];
    for (const [place, rate] of [
      ['drawing', 1],
      ['drawing', 4],
    ] as const) {
      await cdp.send('Emulation.setCPUThrottlingRate', { rate });
      await page.goto(`/gliders/${id}/${place}`);
      await page.getByRole('region', { name: 'Title block' }).waitFor();
      await page.waitForTimeout(1500);
      const { median, late } = await keyToScreen(page);
      rows.push({
        what: `key to screen, ${place}, ${parts} parts, processor ${rate === 1 ? 'as it is' : `slowed ${rate}×`}`,
        ours: `${ms(median)} (95th ${ms(late)})`,
        beside: rate === 1 ? `one frame ${ms(FRAME_MS)}` : 'the 100 ms that feel like at once',
        ratio: median / (rate === 1 ? FRAME_MS : 100),
      });
    }
    return rows;
  } finally {
    await browser.close();
    await served.stop();
  }
}
