import { useMutation, useQueryClient } from '@tanstack/react-query';
import { command, request } from '#client/lib/api.ts';
import type { Plan } from '#shared/core/plan.ts';
import { glider, type GliderDto } from '#shared/schemas/glider.ts';
import { dropFromLists } from './bench-queries.ts';
import { gliderQueries } from './queries.ts';

/** Saves a plan over that version; a newer one on the server refuses it with 412. */
export function putGlider(id: string, plan: Plan, version: number): Promise<GliderDto> {
  return request(`/gliders/${encodeURIComponent(id)}`, glider, {
    method: 'PUT',
    body: { plan },
    headers: { 'If-Match': `"${version}"` },
  });
}

export interface NewGlider {
  plan: Plan;
  /** Made once per wish, so that a retry on a bad line makes one glider. */
  wish: string;
}

function postGlider({ plan, wish }: NewGlider): Promise<GliderDto> {
  return request('/gliders', glider, {
    method: 'POST',
    body: { plan },
    headers: { 'Idempotency-Key': wish },
  });
}

export function useCreateGlider() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: postGlider,
    onSuccess: () => client.invalidateQueries({ queryKey: ['gliders', 'list'] }),
  });
}

export function useDeleteGlider() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => command(`/gliders/${encodeURIComponent(id)}`, { method: 'DELETE' }),
    onSuccess: (_, id) => {
      dropFromLists(client, [id]);
      client.removeQueries({ queryKey: gliderQueries.detail(id).queryKey });
    },
  });
}
