import type { FirstFlightDto } from '#shared/schemas/first-flight.ts';
import type { FirstFlight } from '#server/models/first-flight.ts';

export function presentFirstFlight(row: FirstFlight): FirstFlightDto {
  return {
    ...row.body,
    gliderId: row.gliderId,
    number: row.number,
    measured: row.measured,
    flown: row.flown,
    signedBy: row.signedByName,
    receivedAt: row.receivedAt.toISOString(),
  };
}
