import { queryOptions } from '@tanstack/react-query';
import { z } from 'zod';
import { request } from '#client/lib/api.ts';
import { gliderTrials, trialsInput, type GliderTrialsDto, type TrialsInput } from '#shared/schemas/trials.ts';
import type { TrialDraft } from './trial-desk.ts';

const pathOf = (glider: string) => `/gliders/${encodeURIComponent(glider)}/trials`;

export const trialsQuery = (glider: string) =>
  queryOptions({
    queryKey: ['gliders', 'trials', glider],
    queryFn: ({ signal }) => request(pathOf(glider), gliderTrials, { signal }),
    // Others try woods as well: looked at again while the window is in view.
    refetchInterval: 30_000,
    gcTime: 0,
  });

/** @throws ApiError 412 with the list as it now is as `current`, where somebody else kept one meanwhile */
export function sendTrials(glider: string, list: TrialsInput, version: number): Promise<GliderTrialsDto> {
  return request(pathOf(glider), gliderTrials, {
    method: 'PUT',
    body: list,
    headers: { 'If-Match': `"${version}"` },
  });
}

const draftSchema = z.object({ base: trialsInput, list: trialsInput });

/** What of a glider's trials has not reached the server, as this browser keeps it. */
export function draftShelf(glider: string) {
  const key = `featherbeam.trials.draft.${glider}`;
  return {
    take: (): TrialDraft | null => {
      try {
        return draftSchema.safeParse(JSON.parse(localStorage.getItem(key) ?? 'null')).data ?? null;
      } catch {
        return null;
      }
    },
    put: (draft: TrialDraft | null): void => {
      try {
        if (draft === null) localStorage.removeItem(key);
        else localStorage.setItem(key, JSON.stringify(draft));
      } catch {
        // Storage is full or refused: the list then holds until the page is left.
      }
    },
  };
}
