import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useCallback, useMemo, useState } from 'react';
import { ApiError } from '#client/lib/api.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import {
  accountOf,
  type AssignAccount,
  type AssignProblem,
  type Choice,
} from '#shared/core/cut/assign-account.ts';
import { cutParts, THICKEST_SHEET } from '#shared/core/cut/cut-parts.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { AssignmentInput } from '#shared/schemas/assignment.ts';
import { freePieces } from '../rack-pieces.ts';
import { assignmentQuery, keepAssignment } from './assignment-query.ts';
import { choiceOf, entriesOf, problemOf, stockAtHand, type AtHand } from './problem.ts';
import type { SearchNews } from './messages.ts';

export type KeptTerms = AssignmentInput['terms'];

/** What the reader has changed of what is kept; null for nothing. */
interface Draft {
  choice: Choice;
  fixed: ReadonlySet<string>;
  terms: KeptTerms;
}

/** Which piece each part is cut from: as it is kept, and as the reader has it in hand. */
export interface Assignment {
  problem: AssignProblem;
  pieces: readonly AtHand[];
  choice: Choice;
  fixed: ReadonlySet<string>;
  terms: KeptTerms;
  account: AssignAccount;
  isChanged: boolean;
  /** the drawing was saved again since this was kept */
  isOlder: boolean;
  setTerms: (changes: Partial<KeptTerms>) => void;
  /** by hand: solving again leaves it */
  place: (part: string, piece: string | null) => void;
  take: (news: SearchNews) => void;
  revert: () => void;
  keep: () => void;
  keeping: boolean;
  /** what stands in the way of keeping, in words */
  refusal: string | null;
}

/** Null until everything is there that it is made from. */
export function useAssignment(workspace: Workspace, plan: Plan): Assignment | null {
  const { glider } = workspace;
  const client = useQueryClient();
  const own = workspace.kind === 'saved' && glider !== undefined;
  const { data: rack } = useQuery({ ...freePieces, enabled: own });
  const query = assignmentQuery(glider?.id ?? '');
  const { data: kept } = useQuery({ ...query, enabled: own });
  const [draft, setDraft] = useState<Draft | null>(null);

  const pieces = useMemo(() => {
    const held = (kept?.pieces ?? []).filter((piece) => piece.held && piece.state === 'reserved');
    const free = (rack ?? []).filter(({ id }) => !held.some((piece) => piece.id === id));
    return [...held, ...free].toSorted((a, b) => a.number - b.number);
  }, [kept, rack]);
  const parts = useMemo(() => cutParts(plan).filter(({ thickness }) => thickness <= THICKEST_SHEET), [plan]);
  const stock = useMemo(() => stockAtHand(pieces), [pieces]);
  const base = useMemo(
    () => kept && { ...choiceOf(kept.entries, { parts, stock }), terms: kept.terms },
    [kept, parts, stock],
  );
  const now = draft ?? base;
  const problem = useMemo(() => now && problemOf(parts, stock, now.terms, now), [parts, stock, now]);
  const account = useMemo(() => problem && now && accountOf(problem, now.choice), [problem, now]);

  const keeping = useMutation({
    mutationFn: (input: AssignmentInput) => keepAssignment(glider?.id ?? '', input, kept?.version ?? 1),
    onSuccess: (saved) => {
      client.setQueryData(query.queryKey, saved);
      setDraft(null);
      return client.invalidateQueries({ queryKey: ['rack'] });
    },
    onError: (error) => {
      if (error instanceof ApiError && error.code === 'stale_version') void client.invalidateQueries(query);
    },
  });
  const change = useCallback(
    (changes: (from: Draft) => Draft) =>
      setDraft((before) => ((before ?? base) ? changes(before ?? (base as Draft)) : null)),
    [base],
  );
  const take = useCallback(
    ({ choice, score, bound, rounds, seconds }: SearchNews) =>
      change((from) => ({
        ...from,
        choice: new Map(choice),
        terms: {
          ...from.terms,
          gap: bound === null ? null : Math.max(0, score - bound) / Math.max(Math.abs(score), 1e-9),
          note: `Found in ${seconds.toFixed(1)} s and ${rounds} rounds.`,
        },
      })),
    [change],
  );
  if (!kept || !rack || !now || !problem || !account) return null;
  return {
    problem,
    pieces,
    choice: now.choice,
    fixed: now.fixed,
    terms: now.terms,
    account,
    isChanged: draft !== null,
    isOlder: kept.version > 1 && kept.gliderVersion < (glider?.version ?? 0),
    setTerms: (changes) => change((from) => ({ ...from, terms: { ...from.terms, ...changes } })),
    place: (part, piece) =>
      change(({ choice, fixed, terms }) => ({
        choice: new Map(choice).set(part, piece),
        fixed: piece === null ? without(fixed, part) : new Set([...fixed, part]),
        terms: { ...terms, gap: null, note: '' },
      })),
    take,
    revert: () => setDraft(null),
    keep: () =>
      keeping.mutate({
        entries: entriesOf(problem, now.choice, now.fixed),
        terms: now.terms,
        gliderVersion: glider?.version ?? 1,
      }),
    keeping: keeping.isPending,
    refusal: keeping.error ? refusalOf(keeping.error) : null,
  };
}

const without = (set: ReadonlySet<string>, gone: string) => new Set([...set].filter((id) => id !== gone));

function refusalOf(error: Error): string {
  if (!(error instanceof ApiError))
    return `It could not be kept: ${error.message} Nothing of yours is lost; try again.`;
  if (error.code === 'stale_version') {
    return 'Somebody else kept another one meanwhile. Yours still stands here: keep it again to put it in its place, or go back to theirs.';
  }
  return error.fields[0]?.detail ?? error.message;
}
