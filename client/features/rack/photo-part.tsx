import { useQuery } from '@tanstack/react-query';
import { useCallback, useRef } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { useSetPhoto } from './mutations.ts';
import { rackQueries } from './queries.ts';

/** The photo of a piece, one at most. */
export function PhotoPart({ piece }: { piece: StockPieceDto }) {
  const mutation = useSetPhoto();
  const input = useRef<HTMLInputElement>(null);
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
      {piece.hasPhoto && <Photo piece={piece} />}
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

function Photo({ piece }: { piece: StockPieceDto }) {
  const { data, error } = useQuery(rackQueries.photo(piece));
  const show = useCallback(
    (image: HTMLImageElement) => {
      if (!data) return undefined;
      const address = URL.createObjectURL(data);
      image.src = address;
      return () => URL.revokeObjectURL(address);
    },
    [data],
  );
  if (error) return <p className="mb-3 text-red">The photo could not be fetched. {error.message}</p>;
  if (!data) return null;
  return (
    <img
      ref={show}
      alt={`Piece ${piece.number}`}
      className="mb-3 block max-h-80 max-w-full border border-rule"
    />
  );
}
