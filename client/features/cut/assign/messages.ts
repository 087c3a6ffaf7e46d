import type { AssignProblem } from '#shared/core/cut/assign-account.ts';

/** What the worker is asked; it answers until it is done, and is ended to call it off. */
export interface SearchRequest {
  problem: AssignProblem;
  seconds: number;
  /** near enough to the bound, as a fraction of the score */
  gap: number;
}

/** How far a search has come. */
export interface SearchNews {
  choice: [part: string, stock: string | null][];
  score: number;
  /** null before anything is known of it */
  bound: number | null;
  rounds: number;
  seconds: number;
}

export type SearchReply =
  ({ type: 'news' } & SearchNews) | { type: 'done' } | { type: 'failed'; problem: string };
