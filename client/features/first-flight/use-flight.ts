import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo } from 'react';
import { countedOf, notedOf } from '#client/lib/built/account.ts';
import { builtQueries } from '#client/lib/built/queries.ts';
import { usePostBox } from '#client/lib/post/use-post-box.ts';
import type { PostBox, WaitingRecord } from '#client/lib/post/post-box.ts';
import { asBuilt } from '#shared/core/built/as-built.ts';
import type { Known } from '#shared/core/field/compare-forecast.ts';
import { fieldAccount } from '#shared/core/field/field-account.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { Estimate } from '#shared/core/result.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import type { BuildTermsDto } from '#shared/schemas/weighing.ts';
import type { FirstFlightDto } from '#shared/schemas/first-flight.ts';
import { methodOf, type FlightDraft } from './draft.ts';
import { flightQueries, showSigned } from './queries.ts';
import { wantedRange, type RangeSources } from './wanted-range.ts';

/** What drawing and weighings say that the model weighs and where it balances. */
export interface Forecast {
  mass: Known;
  x: Known | null;
  percentMac: number | null;
}

/** What is known of a glider on the field; it needs no connection. */
export interface FieldFacts {
  box: PostBox;
  /** records of this glider that wait on the device */
  waiting: WaitingRecord[];
  /** null while they cannot be had */
  signed: FirstFlightDto[] | null;
  terms: BuildTermsDto | null;
  forecast: Forecast;
  sources: RangeSources;
}

/** The forecast narrows with what was weighed at the bench, as far as this device knows it. */
export function useFieldFacts(gliderId: string, person: string, plan: Plan, result: Estimate): FieldFacts {
  const client = useQueryClient();
  const { box, waiting } = usePostBox(person, gliderId);
  useEffect(() => showSigned(box, client), [box, client]);
  const terms = useQuery(builtQueries.terms(gliderId));
  const weighings = useQuery(builtQueries.weighings(gliderId));
  const signed = useQuery(flightQueries.signed(gliderId));
  const kept = weighings.data?.weighings;
  const forecast = useMemo((): Forecast => {
    const account = asBuilt(plan, countedOf(notedOf(kept ?? [], waiting)));
    const { x, ux } = account;
    return {
      mass: { value: account.mass, u: account.u },
      x: x === null ? null : { value: x, u: ux ?? 0 },
      percentMac: account.percentMac,
    };
  }, [plan, kept, waiting]);
  const neutralPoint = result.balance.neutralPoint;
  const sources = useMemo(
    () => ({ target: plan.target, wing: wingReference(plan), neutralPoint }),
    [plan, neutralPoint],
  );
  return {
    box,
    waiting,
    signed: signed.data?.firstFlights ?? null,
    terms: terms.data ?? null,
    forecast,
    sources,
  };
}

/** What the draft comes to. */
export function flightAccount(draft: FlightDraft, { sources }: Pick<FieldFacts, 'sources'>) {
  const method = methodOf(draft);
  const account = method && fieldAccount(method, draft.ballast, sources.wing);
  return { method: account && method, account, range: wantedRange(sources, draft) };
}
export type FlightAccount = ReturnType<typeof flightAccount>;
