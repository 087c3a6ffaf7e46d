import { useCallback, useState, type ComponentType, type ReactNode } from 'react';
import { useToast } from '#client/components/ui/toast.tsx';
import { useFieldWish } from '#client/hooks/use-field-wish.ts';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import type { WhyQuestion } from '#client/lib/why/question.ts';
import type { WhyPlace } from '#client/lib/why/why.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { WhyContext } from './why-context.ts';
import type { WhyPopoverProps } from './why-popover.tsx';

interface WhyProviderProps {
  workspace: Workspace;
  /** address of a place of the open glider; null for one that it has not */
  hrefOf: (place: WhyPlace['place']) => string | null;
  onOpen: (href: string) => void;
  children: ReactNode;
}

type Popover = ComponentType<WhyPopoverProps>;
/** The answers are fetched with the first question, or ahead of it. */
export const fetchWhy = async (): Promise<Popover> => (await import('./why-popover.tsx')).WhyPopover;

/** Answers for every figure of the open glider how it was made. */
export function WhyProvider({ workspace, hrefOf, onOpen, children }: WhyProviderProps) {
  const [Answer, setAnswer] = useState<Popover | null>(null);
  const [asked, setAsked] = useState<{ question: WhyQuestion; figure: HTMLElement } | null>(null);
  const plan = useValidPlan(workspace);
  const say = useToast();
  const wishFor = useFieldWish();
  const ask = useCallback(
    (question: WhyQuestion, figure: HTMLElement) => {
      setAsked({ question, figure });
      fetchWhy().then(
        (popover) => setAnswer(() => popover),
        () => say('The answer could not be fetched. Look at the connection and try again.'),
      );
    },
    [say],
  );
  const follow = ({ place, line, field, surfaceOnly }: WhyPlace) => {
    const href = hrefOf(place);
    if (href === null) return;
    setAsked(null);
    if (line !== undefined) workspace.select(line);
    onOpen(href);
    if (field !== undefined) wishFor(field, surfaceOnly ? () => workspace.select(null) : undefined);
  };
  return (
    <WhyContext value={ask}>
      {children}
      {asked && Answer && plan && (
        <Answer
          key={JSON.stringify(asked.question)}
          question={asked.question}
          figure={asked.figure}
          plan={plan}
          result={workspace.result}
          onClose={() => setAsked(null)}
          hrefOf={({ place }) => hrefOf(place)}
          onFollow={follow}
        />
      )}
    </WhyContext>
  );
}
