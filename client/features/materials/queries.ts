import { queryOptions } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import { materialList, materialUses } from '#shared/schemas/material.ts';

/** Everything fetched about materials. */
export const materialQueries = {
  all: ['materials'] as const,
  list: () =>
    queryOptions({
      queryKey: ['materials', 'list'],
      queryFn: ({ signal }) => request('/materials', materialList, { signal }),
      select: ({ materials }) => materials,
    }),
  uses: (id: string) =>
    queryOptions({
      queryKey: ['materials', 'uses', id],
      queryFn: ({ signal }) => request(`/materials/${encodeURIComponent(id)}/uses`, materialUses, { signal }),
      staleTime: 0,
    }),
};
