import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { QueryView } from '#client/components/query-view.tsx';
import { Button, buttonClass } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { useUnits } from '#client/lib/units.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { DeleteDialog } from './delete-dialog.tsx';
import { EditDialog } from './edit-dialog.tsx';
import { densityText } from './figures.ts';
import { useReservePiece } from './mutations.ts';
import { PhotoPart } from './photo-part.tsx';
import { PieceFacts } from './piece-facts.tsx';
import { rackQueries } from './queries.ts';
import type { RackLinks } from './rack.tsx';
import { ReserveDialog } from './reserve-dialog.tsx';
import { SplitDialog } from './split-dialog.tsx';
import { UseDialog } from './use-dialog.tsx';
import { pieceName } from './words.ts';

interface PieceViewProps extends RackLinks {
  id: string;
  rackHref: string;
  onDeleted: () => void;
}

/** One piece: its figures, where it came from and what became of it. */
export function PieceView({ id, ...rest }: PieceViewProps) {
  const query = useQuery(rackQueries.piece(id));
  const back = (
    <Link to={rest.rackHref} className={buttonClass()}>
      To the rack
    </Link>
  );
  return (
    <QueryView query={query} otherwise={back}>
      {(piece) => <Piece key={piece.id} piece={piece} {...rest} />}
    </QueryView>
  );
}

type OpenDialog = 'edit' | 'split' | 'reserve' | 'use' | 'delete' | null;

function Piece({
  piece,
  rackHref,
  onDeleted,
  ...links
}: Omit<PieceViewProps, 'id'> & { piece: StockPieceDto }) {
  useTitle(`Piece ${piece.number}`);
  const units = useUnits();
  const [dialog, setDialog] = useState<OpenDialog>(null);
  const free = useReservePiece();
  const close = () => setDialog(null);
  const whole = piece.state === 'free' || piece.state === 'reserved';
  return (
    <>
      <Link to={rackHref} className="link inline-flex min-h-row items-center text-note">
        Rack
      </Link>
      <div className="flex flex-wrap items-start gap-x-4 gap-y-3">
        <div className="mr-auto min-w-0">
          <h1 className="text-figure font-semibold">{pieceName(piece)}</h1>
          <p className="mt-1 text-heading">
            {piece.density === null
              ? 'Not weighed yet: its density is not known.'
              : densityText(piece.material, piece.density, units)}
          </p>
        </div>
        <div className="flex flex-wrap gap-3">
          <Button onClick={() => setDialog('edit')}>Edit</Button>
          {whole && (
            <>
              <Button onClick={() => setDialog('split')}>Cut up</Button>
              {piece.state === 'reserved' ? (
                <Button
                  onClick={() => free.mutate({ id: piece.id, gliderId: null })}
                  pending={free.isPending}
                  pendingText="Freeing …"
                >
                  Free it
                </Button>
              ) : (
                <Button onClick={() => setDialog('reserve')}>Reserve</Button>
              )}
              <Button onClick={() => setDialog('use')}>Used</Button>
            </>
          )}
          <Link to={links.labelsHref([piece.id])} className={buttonClass()}>
            Label
          </Link>
          <Button variant="danger" onClick={() => setDialog('delete')}>
            Delete
          </Button>
        </div>
      </div>
      {free.error && (
        <Notice tone="red" live word="Not freed." className="mt-3">
          {free.error.message}
        </Notice>
      )}
      <div className="mt-5 grid gap-x-10 gap-y-6 border-t border-strong-rule pt-4 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <PieceFacts piece={piece} {...links} />
        <PhotoPart piece={piece} />
      </div>
      {dialog === 'edit' && <EditDialog piece={piece} onClose={close} />}
      {dialog === 'split' && <SplitDialog piece={piece} onClose={close} />}
      {dialog === 'reserve' && <ReserveDialog piece={piece} onClose={close} />}
      {dialog === 'use' && <UseDialog piece={piece} onClose={close} />}
      {dialog === 'delete' && <DeleteDialog piece={piece} onClose={close} onDeleted={onDeleted} />}
    </>
  );
}
