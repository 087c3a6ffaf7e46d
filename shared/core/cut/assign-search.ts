import { accountOf, layOn, type AssignProblem, type Choice } from './assign-account.ts';
import { assignGreedily, mended } from './assign-greedy.ts';
import { assignModel, type Crowd } from './assign-model.ts';
import { misfit } from './stock-fit.ts';

/** What a solver makes of a programme: the columns that are 1, and how low the objective could lie at best. */
export interface MipAnswer {
  ones: readonly string[];
  bound: number;
  /** stopped by the time and not by the gap */
  isCut: boolean;
}

/** Solves a programme in so many seconds at most; null where it has found nothing by then. */
export type SolveMip = (lp: string, seconds: number) => MipAnswer | null;

export interface SearchState {
  choice: Choice;
  score: number;
  /** no choice scores less, as far as is known */
  bound: number;
  /** programmes solved */
  rounds: number;
}

export interface SearchTerms {
  /** at most, from beginning to end */
  seconds: number;
  /** near enough to the bound, as a fraction of the score and in its own unit */
  relativeGap: number;
  absoluteGap: number;
  /** seconds since whenever */
  clock: () => number;
  /** told of every better choice and higher bound */
  progress?: (state: SearchState) => void;
}

/**
 * The best choice that can be found in the time: the simple way first, then programmes, each with what the one before
 * laid too tightly kept apart, until one lies on its pieces as it is. The last state told is the answer.
 * @example searchAssignment(EXAMPLE_ASSIGNMENT, () => null, { seconds: 1, relativeGap: 0, absoluteGap: 0, clock: () => 0 }).score // → 0.4
 */
export function searchAssignment(
  problem: AssignProblem,
  solve: SolveMip,
  { clock, progress, ...terms }: SearchTerms,
): SearchState {
  const end = clock() + terms.seconds;
  const first = assignGreedily(problem);
  let state: SearchState = {
    choice: first,
    score: accountOf(problem, first).score,
    bound: Number.NEGATIVE_INFINITY,
    rounds: 0,
  };
  const tell = (news: Partial<SearchState>) => {
    state = { ...state, ...news };
    progress?.(state);
  };
  tell({});
  const crowds: Crowd[] = [];
  for (;;) {
    const left = end - clock();
    if (left <= 0) return state;
    const { lp, columns } = assignModel(problem, crowds);
    const answer = solve(lp, left);
    if (!answer) return state;
    const found = new Map<string, string | null>();
    for (const column of answer.ones) {
      const place = columns.get(column);
      if (place) found.set(place.part, place.stock);
    }
    const whole = mended(problem, found);
    const { score } = accountOf(problem, whole);
    tell({
      rounds: state.rounds + 1,
      bound: Math.max(state.bound, answer.bound),
      ...(score < state.score && { choice: whole, score }),
    });
    const fresh = crowdsIn(problem, found);
    if (fresh.length === 0 || answer.isCut || isNear(state, terms)) return state;
    crowds.push(...fresh);
  }
}

function isNear(
  { score, bound }: SearchState,
  { relativeGap, absoluteGap }: Omit<SearchTerms, 'clock'>,
): boolean {
  return score - bound <= Math.max(absoluteGap, relativeGap * Math.abs(score));
}

/** What a choice lays too tightly, as few parts as say so, with every piece that is no larger and no better. */
function crowdsIn(problem: AssignProblem, choice: Choice): Crowd[] {
  const { faults } = accountOf(problem, choice);
  const { parts, stock, terms } = problem;
  return faults.flatMap((fault): Crowd[] => {
    const piece = stock.find(({ id }) => id === fault.stock);
    if (fault.code !== 'crowded' || !piece) return [];
    let own = parts.filter(({ id }) => fault.parts.includes(id));
    for (const part of own.toSorted((a, b) => a.length * a.width - b.length * b.width)) {
      const fewer = own.filter(({ id }) => id !== part.id);
      if (!layOn(piece, fewer, terms.kerf)) own = fewer;
    }
    const noLarger = stock.filter(
      ({ form, length, width }) => form === piece.form && length <= piece.length && width <= piece.width,
    );
    const alike = noLarger.filter((other) => own.every((part) => !misfit(part, other)));
    return [{ parts: own.map(({ id }) => id), stock: alike.map(({ id }) => id) }];
  });
}
