import { useMutation, useQueryClient } from '@tanstack/react-query';
import { command, request } from '#client/lib/api.ts';
import { gliderSave } from '#shared/schemas/glider-save.ts';
import { glider, type GliderDto } from '#shared/schemas/glider.ts';
import { photo } from '#shared/schemas/photo.ts';
import { logQueries } from './queries.ts';

/** Brings a saved state back as a new save over that version. */
export function restoreSave(gliderId: string, restored: number, version: number): Promise<GliderDto> {
  return request(`/gliders/${encodeURIComponent(gliderId)}/saves/${restored}/restore`, glider, {
    method: 'POST',
    headers: { 'If-Match': `"${version}"` },
  });
}

/** Names a saved state; an empty name takes its name away. */
export function useNameSave(gliderId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ version, name }: { version: number; name: string }) =>
      request(`/gliders/${encodeURIComponent(gliderId)}/saves/${version}/name`, gliderSave, {
        method: 'PUT',
        body: { name },
      }),
    onSuccess: () => client.invalidateQueries({ queryKey: logQueries.saves(gliderId).queryKey }),
  });
}

export function useCaptionPhoto(gliderId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, caption }: { id: string; caption: string }) =>
      request(`/photos/${encodeURIComponent(id)}`, photo, { method: 'PUT', body: { caption } }),
    onSuccess: () => client.invalidateQueries({ queryKey: logQueries.photos(gliderId).queryKey }),
  });
}

export function useDeletePhoto(gliderId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => command(`/photos/${encodeURIComponent(id)}`, { method: 'DELETE' }),
    onSuccess: () => client.invalidateQueries({ queryKey: logQueries.photos(gliderId).queryKey }),
  });
}
