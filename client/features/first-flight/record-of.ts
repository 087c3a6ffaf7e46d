import type { FirstFlightInput } from '#shared/schemas/first-flight.ts';
import { firstFlightInput } from '#shared/schemas/first-flight.ts';
import { checkState, type CheckLine } from './checks.ts';
import type { FlightDraft } from './draft.ts';
import type { FlightAccount, Forecast } from './use-flight.ts';

/** What a record still lacks, in words, in the order of the page. */
export function missingOf(
  draft: FlightDraft,
  { account, range }: FlightAccount,
  lines: readonly CheckLine[],
): string[] {
  const { open } = checkState(lines, draft.checks);
  const noWords = lines.some(
    ({ id }) => draft.checks[id]?.answer === 'no' && draft.checks[id].note.trim() === '',
  );
  return [
    ...(account ? [] : ['The weighing is not all there.']),
    ...(range ? [] : ['The range is not all there.']),
    ...(open.length > 0 ? [`${open.length} of the check ${open.length === 1 ? 'is' : 'are'} open.`] : []),
    ...(noWords ? ['Note what is not right, where you answered no.'] : []),
  ];
}

interface RecordOptions {
  draft: FlightDraft;
  account: FlightAccount;
  lines: readonly CheckLine[];
  forecast: Forecast;
  gliderVersion: number;
  now: Date;
}

/** The record as it is signed. @throws ZodError where something is still missing, which `missingOf` tells before */
export function recordOf({
  draft,
  account,
  lines,
  forecast,
  gliderVersion,
  now,
}: RecordOptions): FirstFlightInput {
  const { from, to, basis } = account.range ?? {};
  return firstFlightInput.parse({
    id: draft.id,
    gliderVersion,
    forecast: {
      mass: forecast.mass.value,
      u: forecast.mass.u,
      x: forecast.x?.value ?? null,
      ux: forecast.x?.u ?? null,
      percentMac: forecast.percentMac,
    },
    method: account.method,
    range: { from, to, basis },
    ballast: draft.ballast,
    checks: lines.map(({ id, words }) => ({ id, words, ...draft.checks[id] })),
    place: draft.place,
    wind: draft.wind,
    glides: draft.glides,
    note: draft.note,
    signature: draft.signature,
    signedAt: now.toISOString(),
    follows: draft.follows,
  });
}
