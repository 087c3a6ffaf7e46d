import { useState } from 'react';
import { planMaterial } from '#shared/schemas/plan.ts';
import type { Trial } from '#shared/core/wood-trial.ts';
import type { TrialWood } from '#shared/core/wood-groups.ts';

const PREFIX = 'featherbeam.trials.';

/** The trials of a glider as this browser keeps them; null until somebody has changed them. */
export function useTrials(place: string): [Trial[] | null, (trials: Trial[] | null) => void] {
  const [trials, setTrials] = useState(() => read(place));
  return [
    trials,
    (next) => {
      setTrials(next);
      keep(place, next);
    },
  ];
}

function keep(place: string, trials: Trial[] | null): void {
  try {
    if (trials === null) localStorage.removeItem(PREFIX + place);
    else localStorage.setItem(PREFIX + place, JSON.stringify(trials));
  } catch {
    // Storage is full or refused: the trials then hold until the page is left.
  }
}

function read(place: string): Trial[] | null {
  try {
    return parseTrials(JSON.parse(localStorage.getItem(PREFIX + place) ?? 'null'));
  } catch {
    return null;
  }
}

/** Trials from storage; null where they are not what this page would write. */
export function parseTrials(value: unknown): Trial[] | null {
  if (!Array.isArray(value)) return null;
  const trials = value.map(parseTrial);
  return trials.every((trial) => trial !== null) ? trials : null;
}

function parseTrial(value: unknown): Trial | null {
  if (typeof value !== 'object' || value === null) return null;
  const { name, materials } = value as { name?: unknown; materials?: unknown };
  if (typeof name !== 'string' || typeof materials !== 'object' || materials === null) return null;
  const woods: Record<string, TrialWood> = {};
  for (const [group, wood] of Object.entries(materials)) {
    const { key, material } = (wood ?? {}) as { key?: unknown; material?: unknown };
    const parsed = planMaterial.safeParse(material);
    if (typeof key !== 'string' || !parsed.success) return null;
    woods[group] = { key, material: parsed.data };
  }
  return { name, materials: woods };
}
