import { Link } from 'react-router-dom';
import { Amount } from '#client/components/ui/amount.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { Fact } from './fact.tsx';
import { Offcuts } from './offcuts.tsx';
import { PieceState } from './piece-state.tsx';
import type { RackLinks } from './rack.tsx';
import { sizeText } from './words.ts';

/** The figures of a piece and its story. */
export function PieceFacts({ piece, ...links }: RackLinks & { piece: StockPieceDto }) {
  const units = useUnits();
  return (
    <dl className="grid grid-cols-[8rem_minmax(0,1fr)] content-start gap-x-4">
      <Fact name="Size">{sizeText(piece, units)}</Fact>
      <Fact name="Mass">
        <Amount value={piece.mass} quantity="mass" />
        {piece.mass !== null && (
          <span className="ml-2 text-note text-graphite">
            {piece.weighed ? 'weighed' : 'worked out from the piece it was cut from; weigh it again'}
            {piece.resolution !== null && `, scale step ${units.format(piece.resolution, 'mass')}`}
          </span>
        )}
      </Fact>
      {piece.grade !== '' && <Fact name="Grade">{piece.grade}</Fact>}
      {piece.grainCut !== null && <Fact name="Grain cut">{piece.grainCut}</Fact>}
      <Fact name="State">
        <PieceState piece={piece} gliderHref={links.gliderHref} />
      </Fact>
      {piece.parent && (
        <Fact name="Cut from">
          <Link to={links.pieceHref(piece.parent.id)} className="link">
            Piece {piece.parent.number}
          </Link>
        </Fact>
      )}
      {(piece.state === 'split' || piece.state === 'used') && (
        <Offcuts piece={piece} pieceHref={links.pieceHref} />
      )}
      {piece.note !== '' && (
        <Fact name="Note">
          <span className="whitespace-pre-line">{piece.note}</span>
        </Fact>
      )}
    </dl>
  );
}
