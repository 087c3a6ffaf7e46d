import {
  accountOf,
  type AssignProblem,
  type AssignTerms,
  type Choice,
} from '#shared/core/cut/assign-account.ts';
import { woodOf, type CutPart } from '#shared/core/cut/cut-parts.ts';
import type { CutStock } from '#shared/core/cut/stock-fit.ts';
import type { AssignedPiece, AssignmentEntry } from '#shared/schemas/assignment.ts';

/** A piece that parts may be cut from: free on the reader's rack, or held for this glider. */
export type AtHand = Pick<
  AssignedPiece,
  'id' | 'number' | 'kind' | 'material' | 'length' | 'width' | 'thickness' | 'density' | 'grainCut'
>;

/** Pieces that can be chosen from: sheets and sticks of wood of which a density is known. */
export function stockAtHand(pieces: readonly AtHand[]): CutStock[] {
  return pieces.flatMap(({ id, kind, material, length, width, thickness, density, grainCut }) => {
    if (kind !== 'sheet' && kind !== 'stick') return [];
    if (material.category !== 'wood' || density === null) return [];
    return [{ id, form: kind, length, width, thickness, density, grainCut, wood: woodOf(material.name) }];
  });
}

const nameOf = ({ line, n }: { line: string; n: number }) => `${line} ${n}`;

/** What was kept, as far as it still means parts and pieces that there are. */
export function choiceOf(
  entries: readonly AssignmentEntry[],
  { parts, stock }: Pick<AssignProblem, 'parts' | 'stock'>,
): { choice: Choice; fixed: ReadonlySet<string> } {
  const pieces = new Set(stock.map(({ id }) => id));
  const kept = new Map(entries.map((entry) => [nameOf(entry), entry]));
  const choice = new Map<string, string | null>();
  const fixed = new Set<string>();
  for (const part of parts) {
    const entry = kept.get(nameOf(part));
    if (!entry || entry.pieceId === null || !pieces.has(entry.pieceId)) continue;
    choice.set(part.id, entry.pieceId);
    if (entry.fixed) fixed.add(part.id);
  }
  return { choice, fixed };
}

/** A choice as it is kept. */
export function entriesOf(
  problem: AssignProblem,
  choice: Choice,
  fixed: ReadonlySet<string>,
): AssignmentEntry[] {
  const { laid } = accountOf(problem, choice);
  const at = new Map([...laid.values()].flat().map((place) => [place.id, place.at]));
  return problem.parts.map(({ id, line, n, side, length, width, thickness }) => ({
    line,
    n,
    side: side === 'middle' ? null : side,
    length,
    width,
    thickness,
    pieceId: choice.get(id) ?? null,
    at: at.get(id) ?? null,
    fixed: fixed.has(id),
  }));
}

/** What the search is asked for. */
export function problemOf(
  parts: readonly CutPart[],
  stock: readonly CutStock[],
  terms: AssignTerms,
  pinned: { choice: Choice; fixed: ReadonlySet<string> },
): AssignProblem {
  const fixed = new Map([...pinned.choice].filter(([id]) => pinned.fixed.has(id)));
  return { parts, stock, terms, fixed };
}
