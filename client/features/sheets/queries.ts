import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import { sheet, sheetList } from '#shared/schemas/sheet.ts';

const PAGE_SIZE = 30;

/** Everything fetched about balance sheets. A sheet never changes, so it is fetched once. */
export const sheetQueries = {
  list: (gliderId: string) =>
    infiniteQueryOptions({
      queryKey: ['sheets', 'list', gliderId],
      queryFn: ({ pageParam, signal }) => {
        const query = new URLSearchParams({ limit: String(PAGE_SIZE) });
        if (pageParam !== null) query.set('cursor', pageParam);
        return request(`/gliders/${encodeURIComponent(gliderId)}/sheets?${query.toString()}`, sheetList, {
          signal,
        });
      },
      initialPageParam: null as string | null,
      getNextPageParam: ({ nextCursor }) => nextCursor,
      select: ({ pages }) => pages.flatMap(({ sheets }) => sheets),
    }),
  detail: (id: string) =>
    queryOptions({
      queryKey: ['sheets', 'detail', id],
      queryFn: ({ signal }) => request(`/sheets/${encodeURIComponent(id)}`, sheet, { signal }),
      staleTime: Infinity,
    }),
};

interface NewSheet {
  note: string;
  /** made once per wish, so that a retry on a bad line makes one sheet */
  wish: string;
}

/** Freezes the saved plan of a glider as its next sheet. */
export function useSaveSheet(gliderId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ note, wish }: NewSheet) =>
      request(`/gliders/${encodeURIComponent(gliderId)}/sheets`, sheet, {
        method: 'POST',
        body: { note },
        headers: { 'Idempotency-Key': wish },
      }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['sheets', 'list', gliderId] }),
  });
}

/** Address of a sheet as a file. */
export function fileHref(id: string, format: 'csv' | 'json'): string {
  return `/api/sheets/${encodeURIComponent(id)}/${format}`;
}
