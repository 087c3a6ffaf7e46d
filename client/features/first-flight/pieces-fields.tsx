import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Button } from '#client/components/ui/button.tsx';
import { Checkbox } from '#client/components/ui/checkbox.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { builtQueries, saveTerms } from '#client/lib/built/queries.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { BuildTermsDto } from '#shared/schemas/weighing.ts';

type Piece = BuildTermsDto['pieces'][number];

interface PiecesFieldsProps {
  pieces: readonly Piece[];
  onChange: (pieces: Piece[]) => void;
  terms: BuildTermsDto | null;
  /** where ballast goes, mm aft of the datum */
  at: number;
  gliderId: string;
}

/** Lead and putty at hand; with none named, as much putty as it takes is thought of. */
export function PiecesFields({ pieces, onChange, terms, at, gliderId }: PiecesFieldsProps) {
  const client = useQueryClient();
  const { queryKey } = builtQueries.terms(gliderId);
  const keep = useMutation({
    mutationFn: async (now: BuildTermsDto) => {
      const { version, updatedAt: _, updatedBy: __, ...input } = now;
      return saveTerms(gliderId, { ...input, pieces: [...pieces], ballastAt: at }, version);
    },
    onSuccess: (saved) => client.setQueryData(queryKey, saved),
    onError: () => void client.invalidateQueries({ queryKey }),
  });
  const put = (i: number, changes: Partial<Piece>) =>
    onChange(pieces.map((piece, k) => (k === i ? { ...piece, ...changes } : piece)));
  const add = () => {
    const id = crypto.randomUUID().slice(0, 8);
    onChange([
      ...pieces,
      { id: `piece-${id}`, name: `Lead ${pieces.length + 1}`, mass: 1, divisible: false },
    ]);
  };
  return (
    <section aria-label="Pieces at hand">
      {pieces.length === 0 && (
        <p className="text-note text-graphite">No pieces are named: any amount is taken to be at hand.</p>
      )}
      {pieces.map((piece, i) => (
        <div
          key={piece.id}
          className="grid grid-cols-[1.4fr_1fr] items-end gap-x-3 border-b border-rule pt-2"
        >
          <TextField
            label="Piece"
            value={piece.name}
            maxLength={LIMITS.name.max}
            onChange={({ currentTarget }) => put(i, { name: currentTarget.value })}
          />
          <NumberField
            label="Mass"
            quantity="mass"
            value={piece.mass}
            above={0}
            max={LIMITS.massG.max}
            onChange={(mass) => mass !== null && mass > 0 && put(i, { mass })}
          />
          <Checkbox
            label="can be cut (putty)"
            checked={piece.divisible}
            onValue={(divisible) => put(i, { divisible })}
            className="min-h-11"
          />
          <Button
            variant="plain"
            className="min-h-11"
            onClick={() => onChange(pieces.filter((_, k) => k !== i))}
          >
            Take away<span className="sr-only"> {piece.name}</span>
          </Button>
        </div>
      ))}
      <div className="mt-2 flex flex-wrap gap-2">
        <Button className="min-h-11" onClick={add} disabled={pieces.length >= LIMITS.ballastPieces.max}>
          Add a piece
        </Button>
        {terms && (
          <Button
            variant="plain"
            className="min-h-11"
            pending={keep.isPending}
            onClick={() => keep.mutate(terms)}
          >
            Keep pieces and place with the glider
          </Button>
        )}
      </div>
      <p role="status" className="text-note text-graphite">
        {keep.isSuccess && 'Kept with the glider.'}
        {keep.isError && `Not kept with the glider: ${keep.error.message} On this device they stand.`}
      </p>
    </section>
  );
}
