import { accountOf, layOn, type AssignProblem, type Choice } from './assign-account.ts';
import type { CutPart } from './cut-parts.ts';
import { misfit, type CutStock } from './stock-fit.ts';

/**
 * The simple way at the bench: the largest part first, each from the best piece with room: the lightest, or for
 * spars of the strongest wing the heaviest. What was put somewhere by hand stays.
 * @example Object.fromEntries(assignGreedily(EXAMPLE_ASSIGNMENT)) // → { 'rib port': '1', 'rib starboard': '1' }
 */
export function assignGreedily(problem: AssignProblem): Map<string, string | null> {
  return fillIn(problem, problem.fixed);
}

/**
 * Mends a choice: takes from crowded pieces what has no room on them, the smallest first, and finds other places.
 * @example Object.fromEntries(mended(EXAMPLE_ASSIGNMENT, new Map([['rib port', '2']]))) // → { 'rib port': '2', 'rib starboard': '1' }
 */
export function mended(problem: AssignProblem, choice: Choice): Map<string, string | null> {
  const { faults } = accountOf(problem, choice);
  const kept = new Map([...problem.fixed, ...choice]);
  const byId = new Map(problem.parts.map((part) => [part.id, part]));
  const pieces = new Map(problem.stock.map((piece) => [piece.id, piece]));
  for (const fault of faults) {
    if (fault.code === 'misfit') {
      kept.delete(fault.part);
      continue;
    }
    const piece = pieces.get(fault.stock);
    if (!piece) continue;
    const own = fault.parts.flatMap((id) => byId.get(id) ?? []).toSorted((a, b) => area(b) - area(a));
    while (own.length > 0 && !layOn(piece, own, problem.terms.kerf)) {
      const loose = own.findLastIndex(({ id }) => !problem.fixed.has(id));
      const [gone] = own.splice(loose < 0 ? own.length - 1 : loose, 1);
      if (gone) kept.delete(gone.id);
    }
  }
  return fillIn(problem, kept);
}

const area = ({ length, width }: CutPart) => length * width;

function fillIn({ parts, stock, terms }: AssignProblem, given: Choice): Map<string, string | null> {
  const choice = new Map<string, string | null>();
  const held = new Map<string, CutPart[]>();
  for (const part of parts) {
    const place = given.get(part.id);
    if (place === undefined || place === null) continue;
    choice.set(part.id, place);
    held.set(place, [...(held.get(place) ?? []), part]);
  }
  const rising = stock.toSorted((a, b) => a.density - b.density);
  const orderFor = ({ isSpar }: CutPart): readonly CutStock[] =>
    isSpar && terms.aim === 'strongest' ? rising.toReversed() : rising;
  const loose = parts.filter(({ id }) => !choice.has(id)).toSorted((a, b) => area(b) - area(a));
  for (const part of loose) {
    const place = orderFor(part).find((piece) => {
      if (misfit(part, piece)) return false;
      return layOn(piece, [...(held.get(piece.id) ?? []), part], terms.kerf) !== null;
    });
    choice.set(part.id, place?.id ?? null);
    if (place) held.set(place.id, [...(held.get(place.id) ?? []), part]);
  }
  return choice;
}
