import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo } from 'react';
import { usePostBox } from '#client/lib/post/use-post-box.ts';
import { asBuilt, type AsBuilt } from '#shared/core/built/as-built.ts';
import { budgetOverTime, type BudgetStep } from '#shared/core/built/budget.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { BuildTermsDto, WeighingInput } from '#shared/schemas/weighing.ts';
import { countedOf, notedOf, type Noted } from './account.ts';
import { builtQueries, showArrivals } from './queries.ts';

/** The account of a glider while it is built. */
export interface Built {
  noted: Noted[];
  counted: ReturnType<typeof countedOf>;
  account: AsBuilt;
  steps: BudgetStep[];
  terms: BuildTermsDto;
  /** writes a weighing down on this device and sends it */
  note: (input: WeighingInput) => void;
  /** takes back what has not been sent */
  drop: (id: string) => void;
  /** how many wait to be sent */
  waiting: number;
  refetch: () => void;
}

/** Null until it is fetched; what waits on this device counts at once. */
export function useBuilt(gliderId: string, person: string, plan: Plan): Built | 'failed' | null {
  const client = useQueryClient();
  const { box, waiting } = usePostBox(person, gliderId);
  useEffect(() => showArrivals(box, client), [box, client]);
  const weighings = useQuery(builtQueries.weighings(gliderId));
  const terms = useQuery(builtQueries.terms(gliderId));
  const kept = weighings.data?.weighings;
  const noted = useMemo(() => (kept ? notedOf(kept, waiting) : null), [kept, waiting]);
  const counted = useMemo(() => countedOf(noted ?? []), [noted]);
  const account = useMemo(() => asBuilt(plan, counted), [plan, counted]);
  const steps = useMemo(() => budgetOverTime(plan, counted), [plan, counted]);
  if (!noted || !terms.data) return weighings.isError || terms.isError ? 'failed' : null;
  return {
    noted,
    counted,
    account,
    steps,
    terms: terms.data,
    note: (input) => box.put({ key: crypto.randomUUID(), gliderId, kind: 'weighing', body: input }),
    drop: (id) => box.drop(id),
    waiting: noted.filter(({ number }) => number === null).length,
    refetch: () => {
      void weighings.refetch();
      void terms.refetch();
    },
  };
}
