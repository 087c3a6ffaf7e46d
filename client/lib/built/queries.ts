import { queryOptions, type QueryClient } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import type { PostBox } from '#client/lib/post/post-box.ts';
import {
  buildTerms,
  weighing,
  weighingList,
  type BuildTermsDto,
  type BuildTermsInput,
  type WeighingListDto,
} from '#shared/schemas/weighing.ts';

const at = (gliderId: string) => `/gliders/${encodeURIComponent(gliderId)}`;

export const builtQueries = {
  weighings: (gliderId: string) =>
    queryOptions({
      queryKey: ['built', gliderId, 'weighings'],
      queryFn: ({ signal }) => request(`${at(gliderId)}/weighings`, weighingList, { signal }),
    }),
  terms: (gliderId: string) =>
    queryOptions({
      queryKey: ['built', gliderId, 'terms'],
      queryFn: ({ signal }) => request(`${at(gliderId)}/build-terms`, buildTerms, { signal }),
    }),
};

/** @throws ApiError 412 where somebody else saved in between */
export function saveTerms(gliderId: string, input: BuildTermsInput, version: number): Promise<BuildTermsDto> {
  return request(`${at(gliderId)}/build-terms`, buildTerms, {
    method: 'PUT',
    body: input,
    headers: { 'If-Match': `"${version}"` },
  });
}

/** Shows a weighing as kept at the moment at which the server says so. */
export function showArrivals(box: PostBox, client: QueryClient): () => void {
  return box.onArrival(({ kind, gliderId }, answer) => {
    if (kind !== 'weighing') return;
    const { queryKey } = builtQueries.weighings(gliderId);
    const kept = weighing.safeParse(answer);
    if (kept.success) {
      client.setQueryData<WeighingListDto>(queryKey, (list) => {
        if (!list || list.weighings.some(({ id }) => id === kept.data.id)) return list;
        const before = list.weighings.map((one) =>
          one.id === kept.data.corrects ? { ...one, correctedBy: kept.data.id } : one,
        );
        return { weighings: [...before, kept.data] };
      });
    }
    void client.invalidateQueries({ queryKey });
  });
}
