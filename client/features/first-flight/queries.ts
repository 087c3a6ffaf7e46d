import { queryOptions, type QueryClient } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import type { PostBox } from '#client/lib/post/post-box.ts';
import { firstFlight, firstFlightList, type FirstFlightListDto } from '#shared/schemas/first-flight.ts';

export const flightQueries = {
  signed: (gliderId: string) =>
    queryOptions({
      queryKey: ['first-flights', gliderId],
      queryFn: ({ signal }) =>
        request(`/gliders/${encodeURIComponent(gliderId)}/first-flights`, firstFlightList, { signal }),
    }),
};

/** Shows a record as kept at the moment at which the server says so. */
export function showSigned(box: PostBox, client: QueryClient): () => void {
  return box.onArrival(({ kind, gliderId }, answer) => {
    if (kind !== 'first-flight') return;
    const { queryKey } = flightQueries.signed(gliderId);
    const kept = firstFlight.safeParse(answer);
    if (kept.success) {
      client.setQueryData<FirstFlightListDto>(queryKey, (list) => {
        const others = (list?.firstFlights ?? []).filter(({ id }) => id !== kept.data.id);
        return { firstFlights: [kept.data, ...others] };
      });
    }
    void client.invalidateQueries({ queryKey });
  });
}
