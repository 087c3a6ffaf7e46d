import { useUnits } from '#client/lib/units.ts';
import type { AssignAccount } from '#shared/core/cut/assign-account.ts';
import type { Search } from './use-search.ts';
import { nearWords } from './words.ts';

/** How far the search has come, told now and then to who listens. */
export function SearchProgress({ search, account }: { search: Search; account: AssignAccount }) {
  const units = useUnits();
  const { state, news, problem } = search;
  const near =
    news && news.bound !== null ? `; ${nearWords(Math.max(0, news.score - news.bound), account, units)}` : '';
  const words = {
    idle: '',
    working: news
      ? `Searching: round ${news.rounds + 1}, ${news.seconds.toFixed(0)} s${near} …`
      : 'Starting the search …',
    done: news ? `Found in ${news.seconds.toFixed(1)} s${near}.` : '',
    stopped: news
      ? `Stopped after ${news.seconds.toFixed(0)} s${near}; the best found until then stands.`
      : 'Stopped.',
    failed: problem === null ? '' : `The search failed: ${problem}`,
  }[state];
  return (
    <p role="status" className={state === 'failed' ? 'mt-2 min-h-6 text-red' : 'mt-2 min-h-6 text-graphite'}>
      {words}
    </p>
  );
}
