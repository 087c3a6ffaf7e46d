import { readdirSync } from 'node:fs';
import type { SearchNews, SearchReply, SearchRequest } from '#client/features/cut/assign/messages.ts';
import type { AssignProblem } from '#shared/core/cut/assign-account.ts';
import { EXAMPLE_ASSIGNMENT } from '#shared/core/example-wing.ts';
import { randomOf } from '#shared/core/random.ts';
import { openBrowser } from '#tests/support/chromium.ts';
import { serve } from '#tests/support/served.ts';
import type { Ratio } from './measure.ts';

const GAP = 0.01;
/** Of a score of nearly nothing a fraction says nothing: what the worker takes for near enough then, g. */
const ABSOLUTE_GAP = 0.005;
const MOST_SECONDS = 10;
const CLIENT = new URL('../../node_modules/.cache/featherbeam/client/assets/', import.meta.url);

/** Two halves of 22 ribs, four skins and four spars each, and 40 sheets and sticks of uneven density. */
export function sixtyParts(aim: AssignProblem['terms']['aim']): AssignProblem {
  // 0 to 1, even, the same in every run.
  const even = new Float64Array(40);
  randomOf(7).fillEven(even);
  const densities = [...even].map((chance) => 160 + 70 * chance);
  const [rib] = EXAMPLE_ASSIGNMENT.parts;
  const [sheet] = EXAMPLE_ASSIGNMENT.stock;
  if (!rib || !sheet) throw new Error('no example');
  const many = <T>(count: number, make: (i: number) => T) => Array.from({ length: count }, (_, i) => make(i));
  const parts = (['port', 'starboard'] as const).flatMap((side) => [
    ...many(22, (i) => {
      const [length, width] = [150 - 3 * i, 16 - 0.4 * i];
      return {
        ...rib,
        id: `rib ${side} ${i}`,
        side,
        length,
        width,
        volume: length * width * 1.5,
        y: 40 * i + 20,
      };
    }),
    ...many(4, (i) => {
      const size = { length: 220, width: 70, thickness: 1, volume: 220 * 70 };
      return { ...rib, ...size, id: `skin ${side} ${i}`, side, grain: 'bends' as const, y: 110 + 220 * i };
    }),
    ...many(4, (i) => {
      const size = { length: 440, width: 5, thickness: 3, volume: 440 * 15, y: 220 + (i % 2) * 440 };
      return {
        ...rib,
        ...size,
        id: `spar ${side} ${i}`,
        side,
        form: 'stick' as const,
        grain: null,
        isSpar: true,
      };
    }),
  ]);
  const cuts = ['A', 'B', 'C', null] as const;
  const stock = [
    ...many(16, (j) => {
      const length = j % 3 === 0 ? 900 : 300;
      return {
        ...sheet,
        id: `thick ${j}`,
        length,
        density: densities[j] ?? 0,
        grainCut: cuts[j % 4] ?? null,
      };
    }),
    ...many(12, (j) => {
      const size = { length: 915, thickness: 1 };
      return {
        ...sheet,
        ...size,
        id: `thin ${j}`,
        density: densities[16 + j] ?? 0,
        grainCut: cuts[j % 4] ?? null,
      };
    }),
    ...many(12, (j) => {
      const size = { form: 'stick' as const, length: 915, width: 5, thickness: 3 };
      return { ...sheet, ...size, id: `stick ${j}`, density: densities[28 + j] ?? 0 };
    }),
  ];
  return { parts, stock, terms: { aim, kerf: 1, massTolerance: 0.2, momentTolerance: 60 }, fixed: new Map() };
}

/** 60 parts on 40 pieces, in the worker of the built client, to an answer within a hundredth of the bound. */
export async function benchAssignment(): Promise<Ratio[]> {
  const worker = readdirSync(CLIENT).find((name) => /^assign-worker-.*\.js$/.test(name));
  if (worker === undefined) throw new Error('The client has no worker for the assignment.');
  const served = await serve();
  const browser = await openBrowser();
  try {
    const page = await browser.newPage({ baseURL: served.baseUrl });
    await page.addInitScript({ content: 'globalThis.__name = (f) => f;' });
    await page.goto('/sample/cut');
    const rows: Ratio[] = [];
    for (const aim of ['lightest', 'matched', 'strongest'] as const) {
      const problem = sixtyParts(aim);
      const request = { problem: { ...problem, fixed: [] }, seconds: 60, gap: GAP };
      const { seconds, news } = await page.evaluate(searched, { address: `/assets/${worker}`, request });
      const apart = news?.bound === null || !news ? Number.POSITIVE_INFINITY : news.score - news.bound;
      const gap = apart / Math.max(Math.abs(news?.score ?? 0), 1e-9);
      const isNear = gap <= GAP || apart <= ABSOLUTE_GAP;
      rows.push({
        what: `assignment of 60 parts to 40 pieces, ${aim}`,
        ours: `${seconds.toFixed(2)} s to a gap of ${(gap * 100).toFixed(2)} %`,
        beside: `${MOST_SECONDS} s`,
        // An answer that is not near enough is none, however quick.
        ratio: isNear ? seconds / MOST_SECONDS : Number.POSITIVE_INFINITY,
        most: 1,
        timed: true,
      });
    }
    return rows;
  } finally {
    await browser.close();
    await served.stop();
  }
}

/** Runs in the page. */
function searched({
  address,
  request,
}: {
  address: string;
  request: Omit<SearchRequest, 'problem'> & {
    problem: Omit<AssignProblem, 'fixed'> & { fixed: [string, string][] };
  };
}): Promise<{ seconds: number; news: SearchNews | null }> {
  return new Promise((resolve, reject) => {
    const start = performance.now();
    let news: SearchNews | null = null;
    const own = new Worker(address, { type: 'module' });
    own.addEventListener('error', () => reject(new Error('The worker could not be started.')));
    own.addEventListener('message', ({ data }: MessageEvent<SearchReply>) => {
      if (data.type === 'failed') reject(new Error(data.problem));
      else if (data.type === 'news') news = data;
      else resolve({ seconds: (performance.now() - start) / 1000, news });
    });
    own.postMessage({ ...request, problem: { ...request.problem, fixed: new Map(request.problem.fixed) } });
  });
}
