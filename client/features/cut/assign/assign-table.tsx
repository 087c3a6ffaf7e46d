import { useUnits } from '#client/lib/units.ts';
import { grams } from '#shared/core/cut/assign-account.ts';
import type { CutPart } from '#shared/core/cut/cut-parts.ts';
import { PartRows } from './part-rows.tsx';
import type { Assignment } from './use-assignment.ts';
import { faultWords } from './words.ts';

/** Every part with the piece that it is cut from, to be chosen by hand; the pieces of one part fold together. */
export function AssignTable({ assignment, canEdit }: { assignment: Assignment; canEdit: boolean }) {
  const units = useUnits();
  const { problem, pieces, choice, account } = assignment;
  const densityOf = new Map(problem.stock.map(({ id, density }) => [id, density]));
  const numberOf = new Map(pieces.map(({ id, number }) => [id, number]));
  const lines = new Map<string, CutPart[]>();
  for (const part of problem.parts) lines.set(part.line, [...(lines.get(part.line) ?? []), part]);
  return (
    <div className="mt-6 max-w-4xl border-t border-rule">
      {[...lines].map(([line, parts]) => {
        const numbers = new Set(
          parts.flatMap(({ id }) => numberOf.get(choice.get(id) ?? '') ?? []).toSorted((a, b) => a - b),
        );
        const bought = parts.filter(({ id }) => (choice.get(id) ?? null) === null).length;
        const isWrong = parts.some(({ id }) => faultWords(id, account.faults, units) !== null);
        const mass = parts.reduce(
          (sum, part) => sum + grams(part, densityOf.get(choice.get(part.id) ?? '') ?? part.density),
          0,
        );
        const from = [
          ...(numbers.size > 0 ? [`from No. ${[...numbers].join(', ')}`] : []),
          ...(bought > 0 ? [bought === parts.length ? 'to be bought' : `${bought} to be bought`] : []),
        ].join('; ');
        return (
          <details key={line} className="border-b border-rule">
            <summary className="flex min-h-row cursor-pointer flex-wrap items-center gap-x-4 px-1 py-1 pointer-coarse:min-h-11">
              <span className="min-w-48 flex-1 font-semibold">
                {parts[0]?.name}
                {parts.length > 1 && (
                  <span className="font-normal text-graphite">, {parts.length} pieces</span>
                )}
              </span>
              <span className={isWrong ? 'text-red' : 'text-graphite'}>
                {isWrong && <span aria-hidden="true">▲ </span>}
                {isWrong ? 'does not fit as it is chosen' : from}
              </span>
              <span className="w-20 text-right">{units.format(mass, 'mass')}</span>
            </summary>
            <PartRows assignment={assignment} parts={parts} canEdit={canEdit} />
          </details>
        );
      })}
    </div>
  );
}
