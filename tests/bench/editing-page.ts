import type { CDPSession, Page } from 'playwright-core';
import { quantiles, type Spread } from './measure.ts';

/** A value typed letter by letter would be mended in between; here each key leaves a whole number. */
interface Typing {
  /** label of the field */
  field: string;
  /** values in turn, each another than the one before */
  values: readonly string[];
  keys: number;
}

/** What a key took, ms: to the frame that shows the figures, and to the one that shows the lines. */
export interface Typed {
  figures: Spread;
  lines: Spread;
}

/** First keys are slower, for the browser has not compiled the code yet. */
const WARMING = 8;
/** Rest between two keys of somebody who types fast, ms. */
const REST = 60;

/** What the measuring page calls by name; a string, for it runs in the page and not here. */
export const TOOLS = `
  globalThis.__name = (f) => f;
  globalThis.bench = {
    field: (label) => {
      const found = [...document.querySelectorAll('input')].find(
        (input) => input.ariaLabel === label || input.labels?.[0]?.textContent === label);
      if (!found) throw new Error('no field ' + label);
      return found;
    },
    // Past React's own setter, as a key does.
    type: (field, text) => {
      Reflect.set(HTMLInputElement.prototype, 'value', text, field);
      field.dispatchEvent(new Event('input', { bubbles: true }));
    },
    frame: () => new Promise((done) => requestAnimationFrame(done)),
    // A message posted inside a frame's callback arrives once that frame has been drawn.
    shown: async () => {
      await bench.frame();
      await new Promise((done) => {
        const { port1, port2 } = new MessageChannel();
        port1.addEventListener('message', done, { once: true });
        port1.start();
        port2.postMessage(null);
      });
    },
    frames: [],
    record: () => {
      bench.frames = [];
      bench.recording = true;
      const next = (at) => { bench.frames.push(at); if (bench.recording) requestAnimationFrame(next); };
      requestAnimationFrame(next);
    },
  };`;

interface Bench {
  field: (label: string) => HTMLInputElement;
  type: (field: HTMLInputElement, text: string) => void;
  frame: () => Promise<void>;
  shown: () => Promise<void>;
  frames: number[];
  recording: boolean;
  record: () => void;
}
declare const bench: Bench;

/**
 * Types into a field of the page and watches what answers: `data-answer` marks where the figures stand, `data-lines`
 * what is drawn. A key that changes no figure is an error: nothing would have been measured.
 */
export async function typeInto(page: Page, typing: Typing): Promise<Typed> {
  const times = await page.evaluate(
    async ({ field: label, values, keys, rest }) => {
      const field = bench.field(label);
      const [answer, drawn] = ['[data-answer]', '[data-lines]'].map((at) => document.querySelector(at));
      if (!answer || !drawn) throw new Error('nothing is marked as what answers');
      const measured = { figures: [] as number[], lines: [] as number[] };
      const lines = { changes: 0 };
      const watch = new MutationObserver(() => {
        lines.changes += 1;
      });
      watch.observe(drawn, { subtree: true, childList: true, attributes: true });
      bench.type(field, values.at(-1) ?? '');
      for (let i = 0; i < keys; i++) {
        await new Promise((done) => setTimeout(done, rest));
        const before = answer.textContent;
        lines.changes = 0;
        const start = performance.now();
        bench.type(field, values[i % values.length] ?? '');
        if (answer.textContent === before) throw new Error(`${label} changed no figure`);
        do {
          await bench.shown();
          if (measured.figures.length === i) measured.figures.push(performance.now() - start);
        } while (lines.changes === 0 && performance.now() - start < 2000);
        measured.lines.push(performance.now() - start);
      }
      watch.disconnect();
      return measured;
    },
    { ...typing, rest: REST },
  );
  return {
    figures: quantiles(times.figures.slice(WARMING)),
    lines: quantiles(times.lines.slice(WARMING)),
  };
}

/**
 * What the page's own thread works for each of some keys, ms: script, layout and paint. Counted by the processor's
 * clock, so that others who keep it busy count for little.
 */
export async function workPerKey(cdp: CDPSession, page: Page, typing: Typing): Promise<number> {
  await cdp.send('Performance.enable', { timeDomain: 'threadTicks' });
  const before = await workDone(cdp);
  await typeInto(page, typing);
  return ((await workDone(cdp)) - before) / typing.keys;
}

async function workDone(cdp: CDPSession): Promise<number> {
  const { metrics } = await cdp.send('Performance.getMetrics');
  return 1000 * (metrics.find(({ name }) => name === 'TaskDuration')?.value ?? Number.NaN);
}

/** From frame to frame while a value is typed at every one of them, ms. */
export async function framesWhileTyping(page: Page, { field, values, keys }: Typing): Promise<Spread> {
  return framesWhile(page, () =>
    page.evaluate(
      async ([label, texts, count]) => {
        const input = bench.field(label);
        for (let i = 0; i < count; i++) {
          bench.type(input, texts[i % texts.length] ?? '');
          await bench.frame();
        }
      },
      [field, values, keys] as const,
    ),
  );
}

/** From frame to frame while something at a place is pulled to and fro by the mouse, ms. */
export async function framesWhilePulling(
  page: Page,
  at: { x: number; y: number },
  moves: number,
): Promise<Spread> {
  await page.mouse.move(at.x, at.y);
  await page.mouse.down();
  const frames = await framesWhile(page, async () => {
    for (let i = 1; i <= moves; i++) {
      await page.mouse.move(at.x + 30 * Math.sin(i / 6), at.y);
      await page.waitForTimeout(8);
    }
  });
  await page.mouse.up();
  return frames;
}

async function framesWhile(page: Page, action: () => Promise<void>): Promise<Spread> {
  await page.evaluate(() => bench.record());
  await action();
  const at = await page.evaluate(() => {
    bench.recording = false;
    return bench.frames;
  });
  return quantiles(
    at
      .slice(1)
      .map((time, i) => time - (at[i] ?? time))
      .slice(WARMING),
  );
}
