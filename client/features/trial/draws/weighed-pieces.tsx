import { useRef } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import type { Plan } from '#shared/core/plan.ts';
import { cuttableLines } from './cuttable-lines.ts';
import { PIECES, type WeighedPiece } from './settings.ts';
import { WeighedPieceFields } from './weighed-piece-fields.tsx';

interface WeighedPiecesProps {
  plan: Plan;
  pieces: readonly WeighedPiece[];
  onPieces: (pieces: WeighedPiece[]) => void;
}

/** What a weighing on the workshop scale and a rule leave in doubt of a density (common practice, no source). */
const USUAL_CV = 0.02;

/** Sheets and sticks that were weighed: what is cut from one moves together, and by little. */
export function WeighedPieces({ plan, pieces, onPieces }: WeighedPiecesProps) {
  const addButton = useRef<HTMLButtonElement>(null);
  const lines = cuttableLines(plan);
  const add = () => {
    let n = pieces.length + 1;
    while (pieces.some(({ id }) => id === `piece-${n}`)) n++;
    onPieces([...pieces, { id: `piece-${n}`, name: `Sheet ${n}`, lines: [], cv: USUAL_CV }]);
  };
  return (
    <details className="mt-4 print:hidden">
      <summary className="opens min-h-row font-semibold">
        Weighed sheets and sticks{pieces.length > 0 && ` (${pieces.length})`}
      </summary>
      <p className="max-w-prose text-note text-graphite">
        Parts cut from one weighed piece share its density: they are wrong together, and by little. Tick the
        parts that each piece was cut into.
      </p>
      <ul>
        {pieces.map((piece, index) => (
          <li key={piece.id}>
            <WeighedPieceFields
              piece={piece}
              lines={lines}
              takenBy={new Map(pieces.slice(0, index).flatMap((p) => p.lines.map((line) => [line, p.name])))}
              onPiece={(next) => onPieces(pieces.map((one) => (one.id === piece.id ? next : one)))}
              onRemove={() => {
                onPieces(pieces.filter(({ id }) => id !== piece.id));
                addButton.current?.focus();
              }}
            />
          </li>
        ))}
      </ul>
      {pieces.length < PIECES.max && (
        <Button ref={addButton} className="mt-2" onClick={add}>
          Add a weighed piece
        </Button>
      )}
    </details>
  );
}
