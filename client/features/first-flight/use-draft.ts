import { useKept } from '#client/hooks/use-kept.ts';
import { useState } from 'react';
import { draft, freshDraft, type FlightDraft } from './draft.ts';

export type ChangeDraft = (changes: Partial<FlightDraft>) => void;

/** The record in the making of a person for a glider; at every change it is on the device. */
export function useDraft(
  person: string,
  gliderId: string,
): [FlightDraft, ChangeDraft, (next: FlightDraft) => void] {
  const [first] = useState(() => freshDraft());
  const [kept, keep] = useKept(`featherbeam.flight.${person}.${gliderId}`, draft, first);
  return [kept, (changes) => keep({ ...kept, ...changes }), keep];
}
