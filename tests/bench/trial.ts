import dunlinJson from '#data/demo/gliders/dunlin.json' with { type: 'json' };
import { estimate } from '#shared/core/estimate.ts';
import { trialBase } from '#shared/core/wood-trial-base.ts';
import { withWood } from '#shared/core/wood-groups.ts';
import { trialsFrom, type Trial } from '#shared/core/wood-trial.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { serve } from '#tests/support/served.ts';
import { planOfParts } from './large-plan.ts';
import { medianMs, ms, quantiles, spread, type Ratio } from './measure.ts';

const FRAME_MS = 1000 / 60;
const WOOD = { key: 'tried', material: { name: 'Tried', category: 'wood', density: 100, cv: 0.1 } } as const;
const TRIAL: Trial = { name: 'Tried', materials: { ribs: WOOD, spars: WOOD, 'wing/sheet': WOOD } };

/** One trial from a folded plan, beside a frame and beside estimating the plan anew. */
export function benchTrial(): Ratio[] {
  return [
    { name: 'Dunlin', plan: planSchema.parse(dunlinJson) },
    { name: '500 parts', plan: planOfParts(500) },
  ].flatMap(({ name, plan }) => {
    const base = trialBase(plan);
    const one = medianMs(() => trialsFrom(base, [TRIAL], { arm: -150, minimumMass: 100 }));
    const anew = medianMs(() => estimate(withWood(plan, TRIAL.materials)));
    return [
      {
        what: `one wood trial, ${name}`,
        ours: ms(one),
        beside: `one frame ${ms(FRAME_MS)}`,
        ratio: one / FRAME_MS,
      },
      {
        what: `one wood trial, ${name}`,
        ours: ms(one),
        beside: `an estimate anew ${ms(anew)}`,
        ratio: one / anew,
      },
    ];
  });
}

/** From another wood chosen on the sample's page, ten trials beside it, to the frame that shows what it comes to. */
export async function benchTrialPage(): Promise<Ratio[]> {
  const served = await serve();
  const browser = await openBrowser();
  try {
    const page = await browser.newPage({ baseURL: served.baseUrl, viewport: { width: 1440, height: 1000 } });
    await page.addInitScript({ content: 'globalThis.__name = (f) => f;' });
    await page.goto('/sample/trial');
    for (let n = 0; n < 10; n++) await page.getByRole('button', { name: 'Add a trial' }).click();
    await page.getByLabel('Ribs, Trial 11', { exact: true }).waitFor();
    await page.waitForTimeout(2000);
    const times: number[] = await page.evaluate(async () => {
      const select = document
        .querySelector<HTMLSelectElement>('section select option[value="balsa-light"]')
        ?.closest('select');
      if (!select) throw new Error('no wood to choose');
      const shown = () =>
        new Promise<void>((resolve) => {
          requestAnimationFrame(() => {
            const channel = new MessageChannel();
            channel.port1.addEventListener('message', () => resolve(), { once: true });
            channel.port1.start();
            channel.port2.postMessage(null);
          });
        });
      const measured: number[] = [];
      for (let i = 0; i < 40; i++) {
        await new Promise((resolve) => setTimeout(resolve, 150));
        const start = performance.now();
        // Past React's own setter, as a choice does.
        Reflect.set(HTMLSelectElement.prototype, 'value', i % 2 ? 'balsa-light' : 'balsa-hard', select);
        select.dispatchEvent(new Event('change', { bubbles: true }));
        await shown();
        measured.push(performance.now() - start);
      }
      return measured;
    });
    const told = quantiles(times.slice(5));
    return [
      {
        what: 'choice of a wood to screen, sample with 11 trials',
        ours: spread(told),
        beside: `one frame ${ms(FRAME_MS)}`,
        ratio: told.median / FRAME_MS,
        most: 1,
        timed: true,
      },
    ];
  } finally {
    await browser.close();
    await served.stop();
  }
}
