import type { MouseEvent } from 'react';
import type { WhyQuestion } from '#client/lib/why/question.ts';
import type { Why, WhyInput, WhyPlace } from '#client/lib/why/why.ts';

export interface WhyLinks {
  hrefOf: (place: WhyPlace) => string | null;
  onFollow: (place: WhyPlace) => void;
  onAsk: (question: WhyQuestion) => void;
}

interface WhyPanelProps extends WhyLinks {
  why: Why;
}

/** How a figure was made: formula with its numbers, steps, what went in, uncertainty, source. */
export function WhyPanel({ why, ...links }: WhyPanelProps) {
  return (
    <div className="border-l-3 border-l-ink pl-3 text-note">
      <p className="font-semibold">{why.formula}</p>
      {why.steps.map((step) => (
        <p key={step} className="mt-1.5">
          {step}
        </p>
      ))}
      {why.inputs.length > 0 && (
        <dl className="mt-2 border-t border-rule">
          {why.inputs.map((input) => (
            <div
              key={`${input.name} ${input.value}`}
              className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-x-4 border-b border-rule py-0.5"
            >
              <dt>
                <InputName input={input} {...links} />
              </dt>
              <dd className="text-right">{input.value}</dd>
            </div>
          ))}
        </dl>
      )}
      {why.doubt && <p className="mt-2">{why.doubt}</p>}
      {why.source && (
        <p className="mt-1.5 text-graphite">
          <span className="sr-only">Source: </span>
          {why.source}
        </p>
      )}
    </div>
  );
}

const TARGET = 'inline-flex min-h-6 items-center text-left pointer-coarse:min-h-11';

function InputName({ input: { name, at, ask }, hrefOf, onFollow, onAsk }: WhyLinks & { input: WhyInput }) {
  const href = at ? hrefOf(at) : null;
  if (at && href !== null) {
    const follow = (event: MouseEvent) => {
      if (event.ctrlKey || event.metaKey || event.shiftKey) return;
      event.preventDefault();
      onFollow(at);
    };
    return (
      <a href={href} onClick={follow} className={`link ${TARGET}`}>
        {name}
      </a>
    );
  }
  if (!ask) return name;
  return (
    <button type="button" onClick={() => onAsk(ask)} className={`link ${TARGET}`}>
      {name}
      <span className="sr-only">, ask why</span>
    </button>
  );
}
