import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { useUnits } from '#client/lib/units.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { Fact } from './fact.tsx';
import { fetchOffcuts } from './fetch-offcuts.ts';
import { rackQueries } from './queries.ts';
import { sizeText } from './words.ts';

interface OffcutsProps {
  piece: StockPieceDto;
  pieceHref: (id: string) => string;
}

/** What a piece was cut into, or what of it went back on the rack. */
export function Offcuts({ piece, pieceHref }: OffcutsProps) {
  const units = useUnits();
  const { data } = useQuery({
    queryKey: [...rackQueries.all, 'offcuts', piece.id],
    queryFn: ({ signal }) => fetchOffcuts(piece, signal),
  });
  if (!data || (data.found.length === 0 && data.whole && piece.state === 'used')) return null;
  return (
    <Fact name={piece.state === 'split' ? 'Cut into' : 'Left over'}>
      <ul>
        {data.found.map((one) => (
          <li key={one.id}>
            <Link to={pieceHref(one.id)} className="link">
              Piece {one.number}
            </Link>
            , {sizeText(one, units)}
          </li>
        ))}
        {data.found.length === 0 && <li className="text-graphite">None of its pieces was found.</li>}
        {!data.whole && (
          <li className="text-note text-graphite">Only the newest pieces of the rack were looked through.</li>
        )}
      </ul>
    </Fact>
  );
}
