import { useMutation, useQueryClient, type InfiniteData } from '@tanstack/react-query';
import { command, request } from '#client/lib/api.ts';
import {
  importPreview,
  importResult,
  splitResult,
  useResult,
  type ImportInput,
  type RackListDto,
  type SplitInput,
  type UseInput,
} from '#shared/schemas/rack.ts';
import { stockPiece, type StockPieceDto, type StockPieceInput } from '#shared/schemas/stock-piece.ts';
import { piecePath, rackQueries } from './queries.ts';

const LISTS = [...rackQueries.all, 'list'];

type Held = Pick<StockPieceDto, 'id' | 'version'>;
const ifMatch = ({ version }: Held) => ({ 'If-Match': `"${version}"` });

/** Something that changes the rack; whatever shows it is asked for anew. */
function useRackChange<I, O>(change: (input: I) => Promise<O>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSuccess: () => client.invalidateQueries({ queryKey: rackQueries.all }),
  });
}

/** `wish` is made once per piece, so that a retry on a bad line adds one. */
export const useAddPiece = () =>
  useRackChange(({ input, wish }: { input: StockPieceInput; wish: string }) =>
    request('/rack', stockPiece, { method: 'POST', body: input, headers: { 'Idempotency-Key': wish } }),
  );

export const useSavePiece = () =>
  useRackChange(({ piece, input }: { piece: Held; input: StockPieceInput }) =>
    request(piecePath(piece.id), stockPiece, { method: 'PUT', body: input, headers: ifMatch(piece) }),
  );

export function useDeletePiece() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (piece: Held) => command(piecePath(piece.id), { method: 'DELETE', headers: ifMatch(piece) }),
    onSuccess: (_, { id }) => {
      // Gone from what is shown next, before it is asked for anew; the page of the piece itself is being left.
      client.setQueriesData<InfiniteData<RackListDto, string | null>>(
        { queryKey: LISTS },
        (list) =>
          list && {
            ...list,
            pages: list.pages.map((page) => ({
              ...page,
              pieces: page.pieces.filter((piece) => piece.id !== id),
            })),
          },
      );
      return client.invalidateQueries({ queryKey: LISTS });
    },
  });
}

export const useSplitPiece = () =>
  useRackChange(({ id, cuts }: { id: string; cuts: SplitInput }) =>
    request(piecePath(id, '/split'), splitResult, { method: 'POST', body: cuts }),
  );

/** A glider's id, or null to free the piece. */
export const useReservePiece = () =>
  useRackChange(({ id, gliderId }: { id: string; gliderId: string | null }) =>
    request(
      piecePath(id, '/reservation'),
      stockPiece,
      gliderId === null ? { method: 'DELETE' } : { method: 'PUT', body: { gliderId } },
    ),
  );

export const useBuildIn = () =>
  useRackChange(({ id, use }: { id: string; use: UseInput }) =>
    request(piecePath(id, '/use'), useResult, { method: 'POST', body: use }),
  );

/** A picture of the piece, or null to take it off. One that is gone is not asked for once more. */
export function useSetPhoto() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, file }: { id: string; file: File | null }) =>
      file === null
        ? request(piecePath(id, '/photo'), stockPiece, { method: 'DELETE' })
        : request(piecePath(id, '/photo'), stockPiece, { method: 'PUT', body: formOf(file) }),
    onSuccess: async (piece) => {
      client.setQueryData(rackQueries.piece(piece.id).queryKey, piece);
      if (piece.hasPhoto) await client.invalidateQueries({ queryKey: rackQueries.photo(piece).queryKey });
      await client.invalidateQueries({ queryKey: LISTS });
    },
  });
}

/** Nothing is stored by it. */
export const usePreviewImport = () =>
  useMutation({
    mutationFn: (file: File) =>
      request('/rack/import-previews', importPreview, { method: 'POST', body: formOf(file) }),
  });

export const useImportPieces = () =>
  useRackChange(({ rows, wish }: { rows: ImportInput['rows']; wish: string }) =>
    request('/rack/imports', importResult, {
      method: 'POST',
      body: { rows },
      headers: { 'Idempotency-Key': wish },
    }),
  );

function formOf(file: File): FormData {
  const form = new FormData();
  form.set('file', file, file.name);
  return form;
}
