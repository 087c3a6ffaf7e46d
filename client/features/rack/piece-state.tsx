import { Link } from 'react-router-dom';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { STATE_WORDS } from './words.ts';

interface PieceStateProps {
  piece: Pick<StockPieceDto, 'state' | 'reservedFor' | 'usedIn'>;
  gliderHref: (id: string) => string;
}

/** Free, or what it is reserved for or used in. */
export function PieceState({ piece: { state, reservedFor, usedIn }, gliderHref }: PieceStateProps) {
  const glider = reservedFor ?? usedIn;
  if (glider === null) return <>{STATE_WORDS[state]}</>;
  return (
    <>
      {state === 'reserved' ? 'Reserved for ' : 'Used in '}
      <Link to={gliderHref(glider.id)} className="link">
        {glider.name}
      </Link>
    </>
  );
}
