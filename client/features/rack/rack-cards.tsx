import { Link } from 'react-router-dom';
import { Amount } from '#client/components/ui/amount.tsx';
import { useUnits } from '#client/lib/units.ts';
import { PieceState } from './piece-state.tsx';
import { toggled } from './rack-table.tsx';
import type { PiecesProps } from './rack.tsx';
import { gradeWord, KIND_WORDS, sizeText } from './words.ts';

/** The same pieces for a narrow screen. */
export function RackCards({ pieces, chosen, onChosen, pieceHref, gliderHref }: PiecesProps) {
  const units = useUnits();
  return (
    <ul className="border-t border-strong-rule">
      {pieces.map((piece) => {
        const grade = piece.grade || gradeWord(piece.material, piece.density);
        return (
          <li key={piece.id} className="flex gap-2 border-b border-rule py-2">
            <div className="min-w-0 flex-1">
              <h3>
                <Link
                  to={pieceHref(piece.id)}
                  className="link inline-flex min-h-row items-center font-semibold"
                >
                  {piece.number} · {KIND_WORDS[piece.kind]}, {piece.material.name}
                </Link>
              </h3>
              <p className="flex flex-wrap gap-x-3">
                <span>{sizeText(piece, units)}</span>
                <Amount value={piece.mass} quantity="mass" />
              </p>
              <p className="flex flex-wrap gap-x-3">
                <strong className="font-semibold">
                  <Amount value={piece.density} quantity="density" />
                </strong>
                {grade && <span>{grade}</span>}
                {piece.grainCut && <span>cut {piece.grainCut}</span>}
              </p>
              <p className="text-note text-graphite">
                <PieceState piece={piece} gliderHref={gliderHref} />
              </p>
            </div>
            <label className="grid size-11 shrink-0 cursor-pointer place-items-center">
              <span className="sr-only">Choose piece {piece.number} for labels</span>
              <input
                type="checkbox"
                checked={chosen.has(piece.id)}
                onChange={() => onChosen(toggled(chosen, piece.id))}
                className="size-6 accent-ink"
              />
            </label>
          </li>
        );
      })}
    </ul>
  );
}
