import { cn } from '#client/lib/cn.ts';
import { useUnits } from '#client/lib/units.ts';
import { grams } from '#shared/core/cut/assign-account.ts';
import type { CutPart } from '#shared/core/cut/cut-parts.ts';
import type { Plan } from '#shared/core/plan.ts';
import { PartRows } from './part-rows.tsx';
import type { Assignment } from './use-assignment.ts';
import { faultWords } from './words.ts';

interface AssignTableProps {
  assignment: Assignment;
  plan: Plan;
  canEdit: boolean;
}

/** Every part with the piece that it is cut from, to be chosen by hand; the pieces of one part fold together. */
export function AssignTable({ assignment, plan, canEdit }: AssignTableProps) {
  const units = useUnits();
  const { problem, pieces, choice, account } = assignment;
  const densityOf = new Map(problem.stock.map(({ id, density }) => [id, density]));
  const numberOf = new Map(pieces.map(({ id, number }) => [id, number]));
  const lines = new Map<string, CutPart[]>();
  for (const part of problem.parts) lines.set(part.line, [...(lines.get(part.line) ?? []), part]);
  const placeOf = (surface: string | null) => {
    const role = plan.surfaces.find(({ key }) => key === surface)?.role ?? 'wing';
    return role === 'wing' ? '' : ` (${role})`;
  };
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
          <details key={line} className="group border-b border-rule">
            <summary className="grid min-h-row cursor-pointer grid-cols-[1rem_1fr_auto] items-center gap-x-2 py-1 sm:grid-cols-[1rem_1fr_auto_5rem] pointer-coarse:min-h-11">
              <span aria-hidden="true" className="text-graphite transition-transform group-open:rotate-90">
                ›
              </span>
              <span className="font-semibold">
                {parts[0]?.name}
                <span className="font-normal text-graphite">
                  {parts.length > 1 && `, ${parts.length} pieces`}
                  {placeOf(parts[0]?.surface ?? null)}
                </span>
              </span>
              <span
                className={cn(
                  'max-sm:col-span-2 max-sm:col-start-2 max-sm:row-start-2 sm:text-right',
                  isWrong ? 'text-red' : 'text-graphite',
                )}
              >
                {isWrong && <span aria-hidden="true">▲ </span>}
                {isWrong ? 'does not fit as it is chosen' : from}
              </span>
              <span className="text-right">{units.format(mass, 'mass')}</span>
            </summary>
            <PartRows assignment={assignment} parts={parts} canEdit={canEdit} />
          </details>
        );
      })}
    </div>
  );
}
