import { same } from '#client/lib/same.ts';
import type { TrialDto, TrialsInput } from '#shared/schemas/trials.ts';

type Woods = TrialDto['materials'];

/**
 * Two people's lists of trials that were one, joined by the names of the trials so that nothing anybody made is
 * lost: what only one of them changed is as they made it; a trial that one deleted and the other changed stays; two
 * woods for the same group leave both trials, mine under another name. Of the terms mine hold where both changed
 * the same.
 */
export function joinTrials(base: TrialsInput, mine: TrialsInput, theirs: TrialsInput): TrialsInput {
  const [before, my, their] = [base, mine, theirs].map(({ trials }) => byName(trials)) as [
    Named,
    Named,
    Named,
  ];
  const joined = new Map<string, TrialDto[]>();
  for (const key of new Set([...their.keys(), ...my.keys()])) {
    joined.set(key, settled(before.get(key), my.get(key), their.get(key)));
  }
  const reordered = !same([...before.keys()], [...my.keys()]) && same([...before.keys()], [...their.keys()]);
  const order = reordered ? [...my.keys(), ...their.keys()] : [...their.keys(), ...my.keys()];
  const trials: TrialDto[] = [];
  for (const key of new Set(order)) {
    for (const trial of joined.get(key) ?? []) {
      trials.push({ ...trial, name: freeName(trial.name, trials) });
    }
  }
  return { trials, terms: joinTerms(base.terms, mine.terms, theirs.terms) };
}

type Named = Map<string, TrialDto>;

/** Trials by their names; a second one of a name counts as another. */
function byName(trials: readonly TrialDto[]): Named {
  const named: Named = new Map();
  for (const trial of trials) {
    let key = trial.name;
    for (let n = 2; named.has(key); n++) key = `${trial.name}\n${n}`;
    named.set(key, trial);
  }
  return named;
}

function settled(base?: TrialDto, mine?: TrialDto, theirs?: TrialDto): TrialDto[] {
  if (!mine || !theirs) {
    const kept = mine ?? theirs;
    // Deleted on one side: it goes, unless the other has changed it since or made it.
    return kept && !(base && same(base, kept)) ? [kept] : [];
  }
  const materials = joinWoods(base?.materials ?? {}, mine.materials, theirs.materials);
  return materials ? [{ ...theirs, materials }] : [theirs, mine];
}

/** Null where both chose another wood for the same. */
function joinWoods(base: Woods, mine: Woods, theirs: Woods): Woods | null {
  const joined: Woods = {};
  for (const key of new Set([...Object.keys(theirs), ...Object.keys(mine)])) {
    const [b, m, t] = [base[key], mine[key], theirs[key]];
    if (!same(m, t) && !same(m, b) && !same(t, b)) return null;
    const kept = same(m, b) ? t : m;
    if (kept) joined[key] = kept;
  }
  return joined;
}

function joinTerms(
  base: TrialsInput['terms'],
  mine: TrialsInput['terms'],
  theirs: TrialsInput['terms'],
): TrialsInput['terms'] {
  return {
    arm: mine.arm === base.arm ? theirs.arm : mine.arm,
    minimumMass: mine.minimumMass === base.minimumMass ? theirs.minimumMass : mine.minimumMass,
  };
}

/** A name that no other trial has: `Light ribs`, then `Light ribs, 2`. */
export function freeName(name: string, others: readonly Pick<TrialDto, 'name'>[]): string {
  let free = name;
  for (let n = 2; others.some((other) => other.name === free); n++) free = `${name}, ${n}`;
  return free;
}
