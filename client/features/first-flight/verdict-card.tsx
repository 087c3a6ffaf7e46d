import { cn } from '#client/lib/cn.ts';
import type { FieldVerdict } from './field-verdict.ts';

const LOOK = {
  none: { ground: 'bg-ink-wash', sign: null, word: '', tone: '' },
  inside: { ground: 'bg-ink-wash', sign: null, word: '', tone: '' },
  close: { ground: 'bg-ochre-wash', sign: '◆', word: 'Too close', tone: 'text-ochre' },
  outside: { ground: 'bg-red-wash', sign: '▲', word: 'Out of range', tone: 'text-red' },
} as const;

/** The answer, large enough for the end of an arm in the sun. */
export function VerdictCard({ verdict }: { verdict: FieldVerdict }) {
  const { ground, sign, word, tone } = LOOK[verdict.kind];
  return (
    <div role="status" className={cn('-mx-4 mt-4 px-4 py-3 sm:mx-0', ground)}>
      {sign && (
        <p className={cn('text-note font-semibold', tone)}>
          <span aria-hidden="true">{sign} </span>
          {word}
        </p>
      )}
      <p className="text-display font-semibold">{verdict.headline}</p>
      <p className="mt-1">{verdict.detail}</p>
    </div>
  );
}
