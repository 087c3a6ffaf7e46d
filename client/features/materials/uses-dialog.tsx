import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { QueryView } from '#client/components/query-view.tsx';
import { Dialog } from '#client/components/ui/dialog.tsx';
import type { MaterialDto, MaterialUsesDto } from '#shared/schemas/material.ts';
import { materialQueries } from './queries.ts';

interface UsesDialogProps {
  row: MaterialDto;
  onClose: () => void;
  gliderHref: (id: string) => string;
}

/** In which gliders a material is used. */
export function UsesDialog({ row, onClose, gliderHref }: UsesDialogProps) {
  const query = useQuery(materialQueries.uses(row.id));
  return (
    <Dialog open onOpenChange={(open) => !open && onClose()} title={`Where ${row.name} is used`}>
      <QueryView query={query}>{(uses) => <UsesList uses={uses} gliderHref={gliderHref} />}</QueryView>
    </Dialog>
  );
}

interface UsesListProps {
  uses: MaterialUsesDto;
  gliderHref: (id: string) => string;
}

export function UsesList({ uses: { gliders, others }, gliderHref }: UsesListProps) {
  if (gliders.length === 0 && others === 0) return <p>It is not used any more.</p>;
  return (
    <ul className="border-t border-rule">
      {gliders.map(({ id, name }) => (
        <li key={id} className="border-b border-rule">
          <Link to={gliderHref(id)} className="link flex min-h-row items-center">
            {name}
          </Link>
        </li>
      ))}
      {others > 0 && (
        <li className="flex min-h-row items-center text-graphite">
          {others === 1 ? 'One glider of somebody else' : `${others} gliders of others`}
        </li>
      )}
    </ul>
  );
}
