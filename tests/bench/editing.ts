import type { BrowserContext, Page } from 'playwright-core';
import { openBrowser } from '#tests/support/chromium.ts';
import { serve } from '#tests/support/served.ts';
import { framesWhilePulling, framesWhileTyping, TOOLS, typeInto, workPerKey } from './editing-page.ts';
import { planOfParts } from './large-plan.ts';
import { ms, spread, type Ratio, type Spread } from './measure.ts';

/** What feels like at once, ms, with the processor slowed 4×. */
const AT_ONCE = 100;
const KEYS = 48;
const FRAMES = 120;
/** One of 60 a second, ms, and what a display's own clock may be off. */
const FRAME = 1000 / 60;
const JITTER = 1.1;

/** A panel's span moves every part of its surface; a rib's thickness one line, and the strips and skins on it none. */
const SPAN = {
  field: 'Panel 1, span',
  values: ['431', '443', '434', '446', '437', '449', '440'],
  keys: KEYS,
};
const THICKNESS = { field: 'Thickness', values: ['2', '9', '3', '10'], keys: KEYS };
const RIB = /^Ribs 1 /;

/** A page with one field that is answered by copying its text: what the browser itself takes. */
async function blankPage(context: BrowserContext): Promise<Page> {
  const page = await context.newPage();
  await page.setContent(
    '<label>Value <input aria-label="Value"></label><output data-answer></output>' +
      '<svg width="900" height="300" data-lines><path stroke="black" d="M0 0"/></svg>',
  );
  await page.evaluate(TOOLS);
  await page.evaluate(() => {
    document.querySelector('input')?.addEventListener('input', ({ target }) => {
      const text = target instanceof HTMLInputElement ? target.value : '';
      document.querySelector('output')?.replaceChildren(text);
      document.querySelector('path')?.setAttribute('d', `M0 0L${text} 50`);
    });
  });
  return page;
}

async function drawingPage(context: BrowserContext, id: string): Promise<Page> {
  const page = await context.newPage();
  await page.addInitScript({ content: TOOLS });
  await page.goto(`/gliders/${id}/drawing`);
  const figures = page.getByRole('region', { name: 'Title block' });
  await figures.evaluate((element) => element.setAttribute('data-answer', ''));
  await page
    .locator('figure svg:has(path)')
    .first()
    .evaluate((svg) => svg.setAttribute('data-lines', ''));
  await page.waitForTimeout(1500);
  return page;
}

const beside = (what: string, { median }: Spread) => `${what} ${median.toPrecision(3)} ms`;

/** Keys and frames of one plan at one speed of the processor. */
async function measured(context: BrowserContext, id: string, parts: number, rate: number): Promise<Ratio[]> {
  const [blank, page] = [await blankPage(context), await drawingPage(context, id)];
  const [ofBlank, ofPage] = await Promise.all([context.newCDPSession(blank), context.newCDPSession(page)]);
  for (const cdp of [ofBlank, ofPage]) await cdp.send('Emulation.setCPUThrottlingRate', { rate });
  const name = `${parts} parts${rate === 1 ? '' : `, slowed ${rate}×`}`;
  const rows: Ratio[] = [];

  await blank.bringToFront();
  const VALUE = { field: 'Value', values: SPAN.values, keys: KEYS };
  const bare = (await typeInto(blank, VALUE)).figures;
  const bareFrames = await framesWhileTyping(blank, { ...VALUE, keys: FRAMES });

  const bareWork = rate === 1 ? await workPerKey(ofBlank, blank, VALUE) : null;
  await page.bringToFront();
  const work = async (what: string, typing: typeof SPAN) => {
    if (bareWork === null) return;
    const ours = await workPerKey(ofPage, page, typing);
    rows.push({
      what: `${name}: ${what}, work a key`,
      ours: ms(ours),
      beside: `blank page ${ms(bareWork)}`,
      ratio: ours / bareWork,
    });
  };
  const key = (what: string, times: Spread) => {
    if (rate === 1) {
      const ratio = times.median / bare.median;
      rows.push({ what: `${name}: ${what}`, ours: spread(times), beside: beside('blank page', bare), ratio });
      return;
    }
    const limit = { beside: `${AT_ONCE} ms, ${beside('blank page', bare)}`, most: 1, timed: true } as const;
    rows.push(
      { what: `${name}: ${what}`, ours: ms(times.median), ratio: times.median / AT_ONCE, ...limit },
      { what: `${name}: ${what}, 95th`, ours: ms(times.late), ratio: times.late / AT_ONCE, ...limit },
    );
  };
  const frames = (what: string, times: Spread) =>
    rows.push({
      what: `${name}: ${what}`,
      ours: spread(times),
      beside: beside('blank page', bareFrames),
      ratio: times.median / Math.max(FRAME, bareFrames.median),
      ...(rate === 1 ? { most: JITTER, timed: true as const } : {}),
    });

  const span = await typeInto(page, SPAN);
  await work('span typed', SPAN);
  key('span typed, to the figures', span.figures);
  key('span typed, to the lines', span.lines);
  frames(
    'span typed at every frame, frame to frame',
    await framesWhileTyping(page, { ...SPAN, keys: FRAMES }),
  );

  await page.getByRole('button', { name: RIB }).first().click();
  const thickness = await typeInto(page, THICKNESS);
  await work('a rib’s thickness typed', THICKNESS);
  key('a rib’s thickness typed, to the figures', thickness.figures);
  frames(
    'a rib’s thickness typed at every frame, frame to frame',
    await framesWhileTyping(page, { ...THICKNESS, keys: FRAMES }),
  );

  const handle = page.getByRole('group', { name: 'Handles of the drawing' }).getByRole('slider').first();
  const box = await handle.boundingBox();
  const before = await handle.getAttribute('aria-valuenow');
  if (!box) throw new Error('the rib has no handle');
  const pulled = await framesWhilePulling(
    page,
    { x: box.x + box.width / 2, y: box.y + box.height / 2 },
    FRAMES,
  );
  if ((await handle.getAttribute('aria-valuenow')) === before) throw new Error('the rib was not pulled');
  frames('a rib pulled, frame to frame', pulled);
  await Promise.all([blank.close(), page.close()]);
  return rows;
}

/** Typing and pulling in the Drawing of plans of so many lines, at full speed and with the processor slowed 4×. */
export async function benchEditing(sizes: readonly number[]): Promise<Ratio[]> {
  const served = await serve();
  const browser = await openBrowser();
  try {
    const context = await browser.newContext({
      baseURL: served.baseUrl,
      viewport: { width: 1440, height: 1000 },
    });
    const person = { name: 'Bench', email: 'bench@example.org', password: 'feathers and beams' };
    await context.request.post('/api/users', { data: person });
    const rows: Ratio[] = [];
    for (const parts of sizes) {
      const made = await context.request.post('/api/gliders', { data: { plan: planOfParts(parts) } });
      const { id } = (await made.json()) as { id: string };
      for (const rate of [1, 4]) rows.push(...(await measured(context, id, parts, rate)));
    }
    return rows;
  } finally {
    await browser.close();
    await served.stop();
  }
}
