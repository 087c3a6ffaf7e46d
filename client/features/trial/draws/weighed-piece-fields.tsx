import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Checkbox } from '#client/components/ui/checkbox.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { CuttableLine } from './cuttable-lines.ts';
import { PIECE_CV, type WeighedPiece } from './settings.ts';

interface WeighedPieceFieldsProps {
  piece: WeighedPiece;
  lines: readonly CuttableLine[];
  /** lines that an earlier piece has, with its name: they count there */
  takenBy: ReadonlyMap<string, string>;
  onPiece: (piece: WeighedPiece) => void;
  onRemove: () => void;
}

/** One weighed piece: its name, what is left in doubt, and the parts cut from it. */
export function WeighedPieceFields({ piece, lines, takenBy, onPiece, onRemove }: WeighedPieceFieldsProps) {
  const [open, setOpen] = useState(piece.lines.length === 0);
  const cut = lines.filter(({ id }) => piece.lines.includes(id));
  const tick = (id: string, on: boolean) =>
    onPiece({ ...piece, lines: on ? [...piece.lines, id] : piece.lines.filter((line) => line !== id) });
  return (
    <div className="mt-2 border-l-3 border-l-strong-rule pl-3">
      <div className="grid grid-cols-2 items-end gap-x-3 gap-y-2 sm:grid-cols-[minmax(0,1fr)_7rem_auto]">
        <div className="max-sm:col-span-2">
          <TextField
            label="Piece"
            keepRoom={false}
            value={piece.name}
            maxLength={LIMITS.name.max}
            onChange={(event) => onPiece({ ...piece, name: event.target.value })}
          />
        </div>
        <NumberField
          label="Density ±"
          quantity="fineShare"
          keepRoom={false}
          suffix="%"
          {...PIECE_CV}
          value={piece.cv}
          onChange={(cv) =>
            cv !== null && cv >= PIECE_CV.min && cv <= PIECE_CV.max && onPiece({ ...piece, cv })
          }
        />
        <Button variant="plain" aria-label={`Remove ${piece.name}`} onClick={onRemove}>
          Remove
        </Button>
      </div>
      <details open={open} onToggle={(event) => setOpen(event.currentTarget.open)}>
        <summary className="opens text-note">
          {cut.length === 0
            ? 'Cut into: tick its parts'
            : `Cut into ${cut.map(({ name }) => name).join(', ')}`}
        </summary>
        {open && (
          <fieldset className="max-h-72 overflow-y-auto pl-1">
            <legend className="sr-only">Parts cut from {piece.name}</legend>
            {lines.map(({ id, name, of }) => {
              const other = takenBy.get(id);
              return (
                <Checkbox
                  key={id}
                  label={
                    <>
                      {name}{' '}
                      <span className="text-note text-graphite">{other ? `counts as of ${other}` : of}</span>
                    </>
                  }
                  disabled={other !== undefined}
                  checked={piece.lines.includes(id)}
                  onValue={(on) => tick(id, on)}
                />
              );
            })}
          </fieldset>
        )}
      </details>
    </div>
  );
}
