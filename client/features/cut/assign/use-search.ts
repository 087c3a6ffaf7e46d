import { useCallback, useEffect, useRef, useState } from 'react';
import type { SearchNews, SearchReply, SearchRequest } from './messages.ts';

export interface Search {
  state: 'idle' | 'working' | 'done' | 'stopped' | 'failed';
  news: SearchNews | null;
  problem: string | null;
  start: (request: SearchRequest) => void;
  /** what was found until then stands */
  stop: () => void;
}

type Held = Pick<Search, 'state' | 'news' | 'problem'>;
const IDLE: Held = { state: 'idle', news: null, problem: null };

/** Searches in a worker of its own, which is ended with the search, a press, or the page. */
export function useSearch(onNews: (news: SearchNews) => void): Search {
  const worker = useRef<Worker | null>(null);
  const listener = useRef(onNews);
  const [held, setHeld] = useState<Held>(IDLE);
  useEffect(() => {
    listener.current = onNews;
  });
  const end = useCallback(() => {
    worker.current?.terminate();
    worker.current = null;
  }, []);
  useEffect(() => end, [end]);

  const start = useCallback(
    (request: SearchRequest) => {
      end();
      const own = new Worker(new URL('./assign-worker.ts', import.meta.url), {
        type: 'module',
        name: 'assign',
      });
      worker.current = own;
      setHeld({ ...IDLE, state: 'working' });
      const fail = (problem: string) => {
        end();
        setHeld(({ news }) => ({ state: 'failed', news, problem }));
      };
      own.addEventListener('message', ({ data }: MessageEvent<SearchReply>) => {
        if (worker.current !== own) return;
        if (data.type === 'failed') fail(data.problem);
        else if (data.type === 'done') {
          end();
          setHeld(({ news }) => ({ state: 'done', news, problem: null }));
        } else {
          setHeld({ state: 'working', news: data, problem: null });
          listener.current(data);
        }
      });
      own.addEventListener('error', (event) => {
        event.preventDefault();
        if (worker.current === own) fail('The search could not be started.');
      });
      own.postMessage(request);
    },
    [end],
  );
  const stop = useCallback(() => {
    end();
    setHeld(({ news }) => ({ state: 'stopped', news, problem: null }));
  }, [end]);
  return { ...held, start, stop };
}
