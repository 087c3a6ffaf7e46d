import type { ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';
import type { WhyQuestion } from '#client/lib/why/question.ts';
import { useAsk } from './why-context.ts';

interface AskWhyProps {
  question: WhyQuestion;
  /** what the figure is, read aloud before it where no heading says so */
  name?: string | undefined;
  /** In a sentence, whose lines it must not push apart. */
  inText?: boolean | undefined;
  /** Another figure beside it asks the same and is in the order of tabs already. */
  second?: boolean | undefined;
  className?: string | undefined;
  children: ReactNode;
}

/** A figure that, pressed, says how it was made. */
export function AskWhy(props: AskWhyProps) {
  const { question, name, inText = false, second = false, className, children } = props;
  const ask = useAsk();
  if (ask === null) return children;
  return (
    <button
      type="button"
      aria-haspopup="dialog"
      tabIndex={second ? -1 : undefined}
      onClick={({ currentTarget }) => ask(question, currentTarget)}
      className={cn(
        'rounded-sm [font:inherit] [text-align:inherit] hover:text-ink print:no-underline',
        !inText && 'min-h-7 min-w-6 pointer-coarse:min-h-11 print:min-h-0',
        second
          ? 'hover:underline hover:decoration-dotted hover:underline-offset-4'
          : 'underline decoration-strong-rule decoration-dotted underline-offset-4 hover:decoration-ink',
        className,
      )}
    >
      {name !== undefined && <span className="sr-only">{name} </span>}
      {children}
      <span className="sr-only">, ask why</span>
    </button>
  );
}
