import { same } from '#client/lib/same.ts';
import type { GliderTrialsDto, TrialsInput } from '#shared/schemas/trials.ts';
import { joinTrials } from './trial-join.ts';

/** `waiting`: will be tried again by itself; `refused`: not before something changes. */
export type TrialPhase = 'idle' | 'sending' | 'waiting' | 'refused';

/** The list on the desk, and how it stands to the one that the server holds. */
export interface TrialDesk {
  list: TrialsInput;
  base: GliderTrialsDto;
  phase: TrialPhase;
  problem: string | null;
  /** who else changed the list, since it was last read here */
  joinedWith: string | null;
}

/** Edits that were not acknowledged when the page was left. */
export interface TrialDraft {
  base: TrialsInput;
  list: TrialsInput;
}

export const listOf = ({ trials, terms }: TrialsInput): TrialsInput => ({ trials, terms });

/** Lays the kept list on the desk, joined with what was not sent. */
export function startTrials(kept: GliderTrialsDto, draft: TrialDraft | null): TrialDesk {
  const list = draft ? joinTrials(draft.base, draft.list, listOf(kept)) : listOf(kept);
  return { list, base: kept, phase: 'idle', problem: null, joinedWith: null };
}

export const isUnsent = ({ list, base }: TrialDesk): boolean => !same(list, listOf(base));

/** The desk with a newer list of the server's. */
export function overtaken(desk: TrialDesk, current: GliderTrialsDto): TrialDesk {
  const news = !same(listOf(current), listOf(desk.base));
  return {
    list: joinTrials(listOf(desk.base), desk.list, listOf(current)),
    base: current,
    phase: 'idle',
    problem: null,
    joinedWith: news ? (current.updatedBy ?? 'somebody else') : desk.joinedWith,
  };
}

/** The desk once the server has taken what was sent; what was typed since stays. */
export function acknowledged(desk: TrialDesk, sent: TrialsInput, kept: GliderTrialsDto): TrialDesk {
  const list = same(desk.list, sent) ? listOf(kept) : desk.list;
  return { ...desk, list, base: kept, phase: 'idle', problem: null };
}
