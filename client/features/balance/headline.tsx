import { cn } from '#client/lib/cn.ts';
import type { Verdict } from './verdict.ts';

const MARK = {
  none: null,
  inside: null,
  close: { sign: '◆', word: 'Too close', tone: 'text-ochre' },
  outside: { sign: '▲', word: 'Out of range', tone: 'text-red' },
} as const;

/** The answer of the page and what to do, before any evidence. */
export function Headline({ verdict }: { verdict: Verdict }) {
  const mark = MARK[verdict.kind];
  return (
    <header>
      <h1 className="text-figure font-semibold">{verdict.headline}</h1>
      <p className="mt-1 text-graphite" aria-live="polite">
        {mark && (
          <strong className={cn('mr-2 font-semibold whitespace-nowrap', mark.tone)}>
            <span aria-hidden="true">{mark.sign} </span>
            {mark.word}
          </strong>
        )}
        {verdict.advice && <span className="mr-1.5 font-semibold text-pencil">{verdict.advice}</span>}
        {verdict.detail}
      </p>
    </header>
  );
}
