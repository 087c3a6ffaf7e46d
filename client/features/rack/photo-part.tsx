import { useRef } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { useSetPhoto } from './mutations.ts';
import { piecePath } from './queries.ts';

/** The photo of a piece, one at most. */
export function PhotoPart({ piece }: { piece: StockPieceDto }) {
  const mutation = useSetPhoto();
  const input = useRef<HTMLInputElement>(null);
  // With the version in it, a new photo is not shown as the old one.
  const source = `/api${piecePath(piece.id, '/photo')}?size=full&v=${piece.version}`;
  return (
    <section aria-labelledby="piece-photo">
      <h2 id="piece-photo" className="caption mb-2">
        Photo
      </h2>
      {mutation.error && (
        <Notice tone="red" live word="Not changed." className="mb-2">
          {mutation.error.message}
        </Notice>
      )}
      {piece.hasPhoto && (
        <img
          src={source}
          alt={`Piece ${piece.number}`}
          className="mb-3 block max-h-80 max-w-full border border-rule"
        />
      )}
      <input
        ref={input}
        type="file"
        accept="image/*"
        aria-label="Photo of the piece"
        tabIndex={-1}
        className="sr-only"
        onChange={(event) => {
          const file = event.target.files?.[0];
          if (file) mutation.mutate({ id: piece.id, file });
          event.target.value = '';
        }}
      />
      <p className="flex flex-wrap gap-3">
        <Button onClick={() => input.current?.click()} pending={mutation.isPending} pendingText="Saving …">
          {piece.hasPhoto ? 'Other photo' : 'Add a photo'}
        </Button>
        {piece.hasPhoto && (
          <Button
            variant="danger"
            disabled={mutation.isPending}
            onClick={() => mutation.mutate({ id: piece.id, file: null })}
          >
            Take it off
          </Button>
        )}
      </p>
    </section>
  );
}
