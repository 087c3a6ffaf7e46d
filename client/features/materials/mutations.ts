import { useMutation, useQueryClient } from '@tanstack/react-query';
import { command, request } from '#client/lib/api.ts';
import { material, type MaterialDto, type MaterialInput } from '#shared/schemas/material.ts';
import { materialQueries } from './queries.ts';

interface SaveMaterial {
  /** The row that is changed, with the version it was read at; null for a new one. */
  row: Pick<MaterialDto, 'id' | 'version'> | null;
  input: MaterialInput;
}

function saveMaterial({ row, input }: SaveMaterial): Promise<MaterialDto> {
  if (row === null) return request('/materials', material, { method: 'POST', body: input });
  return request(`/materials/${encodeURIComponent(row.id)}`, material, {
    method: 'PUT',
    body: input,
    headers: { 'If-Match': `"${row.version}"` },
  });
}

function useRefresh() {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: materialQueries.all });
}

export function useSaveMaterial() {
  return useMutation({ mutationFn: saveMaterial, onSuccess: useRefresh() });
}

export function useDeleteMaterial() {
  return useMutation({
    mutationFn: (id: string) => command(`/materials/${encodeURIComponent(id)}`, { method: 'DELETE' }),
    onSuccess: useRefresh(),
  });
}
