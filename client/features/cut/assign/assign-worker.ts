import highsLoader from 'highs';
import highsWasm from 'highs/runtime?url';
import { searchAssignment, type SearchState } from '#shared/core/cut/assign-search.ts';
import type { SearchReply, SearchRequest } from './messages.ts';
import { solveMip } from './solve-mip.ts';

/** Of a score of nearly nothing a fraction says nothing: this much, g, is near enough too. */
const ABSOLUTE_GAP = 0.005;

const clock = () => performance.now() / 1000;
const post = (reply: SearchReply) => self.postMessage(reply);

/** Searches once; whoever asked ends the worker. */
async function search({ problem, seconds, gap }: SearchRequest): Promise<void> {
  const started = clock();
  const highs = await highsLoader({ locateFile: () => highsWasm });
  const gaps = { relativeGap: gap, absoluteGap: ABSOLUTE_GAP };
  let newest: SearchState | null = null;
  const tell = (bound: number) => {
    if (!newest) return;
    const { choice, score, rounds } = newest;
    const best = Math.max(newest.bound, bound);
    post({
      type: 'news',
      choice: [...choice],
      score,
      bound: Number.isFinite(best) ? best : null,
      rounds,
      seconds: clock() - started,
    });
  };
  searchAssignment(
    problem,
    (lp, left) => solveMip(highs, lp, { seconds: left, ...gaps, progress: (_, bound) => tell(bound) }),
    {
      seconds,
      ...gaps,
      clock,
      progress: (state) => {
        newest = state;
        tell(state.bound);
      },
    },
  );
  post({ type: 'done' });
}

self.addEventListener('message', ({ data }: MessageEvent<SearchRequest>) => {
  search(data).catch((error: unknown) => {
    post({ type: 'failed', problem: error instanceof Error ? error.message : String(error) });
  });
});
