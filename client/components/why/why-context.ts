import { createContext, useContext } from 'react';
import type { WhyQuestion } from '#client/lib/why/question.ts';

/** Opens the answer beside the figure that was pressed. */
export type Ask = (question: WhyQuestion, figure: HTMLElement) => void;

export const WhyContext = createContext<Ask | null>(null);

/** Null where there is nobody to ask: in a list of gliders, on paper. */
export function useAsk(): Ask | null {
  return useContext(WhyContext);
}
