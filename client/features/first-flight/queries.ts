import { queryOptions, type QueryClient } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import { builtQueries } from '#client/lib/built/queries.ts';
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

/** Long enough for the open page to be there first, ms. */
const SETTLED = 3_000;

/** Asks ahead for what the field needs, so that a glider that was opened once can be flown without a connection. */
export function fetchFieldRecords(client: QueryClient, gliderId: string): () => void {
  const timer = setTimeout(() => {
    void client.prefetchQuery(builtQueries.weighings(gliderId));
    void client.prefetchQuery(builtQueries.terms(gliderId));
    void client.prefetchQuery(flightQueries.signed(gliderId));
  }, SETTLED);
  return () => clearTimeout(timer);
}

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
