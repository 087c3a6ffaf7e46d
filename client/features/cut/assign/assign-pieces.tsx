import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import { SheetFigure } from '../sheet-figure.tsx';
import type { Assignment } from './use-assignment.ts';

/** The pieces that are cut, each with what lies on it. */
export function AssignPieces({ assignment, plan }: { assignment: Assignment; plan: Plan }) {
  const units = useUnits();
  const { problem, pieces, account } = assignment;
  const used = pieces.filter(({ id }) => account.laid.has(id));
  const longest = Math.max(1, ...used.map(({ length }) => length));
  const byId = new Map(problem.parts.map((part) => [part.id, part]));
  if (used.length === 0) return null;
  return (
    <ul className="mt-3 grid grid-cols-1 gap-x-10 gap-y-3 lg:grid-cols-2" aria-label="Pieces that are cut">
      {used.map((piece) => {
        const laid = account.laid.get(piece.id) ?? [];
        const width = Math.max(piece.width, piece.thickness);
        const blanks = new Map(
          laid.flatMap(({ id }) => {
            const part = byId.get(id);
            if (!part) return [];
            // A stick is drawn as wide as it is, whichever of its sides is laid.
            const across = piece.kind === 'stick' ? width : part.width;
            return [[id, { length: part.length, width: across, number: part.number ?? 1 }] as const];
          }),
        );
        const [first] = laid;
        const material = plan.materials[byId.get(first?.id ?? '')?.material ?? ''];
        const size = `${units.format(piece.length, 'length')} × ${units.format(width, 'length')}`;
        const dense = piece.density === null ? '' : `, ${units.format(piece.density, 'density')}`;
        return (
          <li key={piece.id}>
            <SheetFigure
              label={`No. ${piece.number}, ${size}, with ${laid.length} parts`}
              sheet={{ length: piece.length, width }}
              laid={laid}
              blanks={blanks}
              longest={longest}
              material={material}
              {...(piece.density !== null && { density: piece.density })}
            />
            <p className="text-note text-graphite">
              <Link to={paths.rackPiece(piece.id)}>No. {piece.number}</Link>, {piece.material.name}, {size}
              {dense}: {laid.length} {laid.length === 1 ? 'part' : 'parts'}
            </p>
          </li>
        );
      })}
    </ul>
  );
}
