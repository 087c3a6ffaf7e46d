import type { Plan } from '#shared/core/plan.ts';
import type { Draft } from './desk-state.ts';

const PREFIX = 'featherbeam.draft';
/** Two windows of one glider keep apart what each has not sent yet. */
const PAGE = Math.random().toString(36).slice(2, 10);

/** Unsent edits, kept in this browser until they are acknowledged. */
export interface DraftShelf {
  /** The newest draft of this person and glider, whichever window left it; it then belongs to this window. */
  take: () => Draft | null;
  put: (draft: Draft) => void;
  clear: () => void;
}

export function draftShelf(
  gliderId: string,
  userId: string,
  storage: Storage = localStorage,
  page = PAGE,
): DraftShelf {
  const common = `${PREFIX}.${userId}.${gliderId}.`;
  const own = common + page;
  return {
    take: () => {
      const found = keysUnder(storage, common)
        .map((key) => ({ key, draft: read(storage, key) }))
        .sort((a, b) => (b.draft?.at ?? '').localeCompare(a.draft?.at ?? ''));
      for (const { key, draft } of found) {
        if (draft === null) quietly(() => storage.removeItem(key));
      }
      const newest = found.find(({ draft }) => draft !== null);
      if (!newest?.draft) return null;
      const { key, draft } = newest;
      quietly(() => {
        storage.setItem(own, JSON.stringify(draft));
        if (key !== own) storage.removeItem(key);
      });
      return draft;
    },
    put: (draft) =>
      firstThatFits(
        // Without what they were made from, edits are still edits: they are then asked for line by line.
        [draft, { ...draft, sent: null, base: null }],
        (fit) => storage.setItem(own, JSON.stringify(fit)),
      ),
    clear: () => quietly(() => storage.removeItem(own)),
  };
}

const SAMPLE = 'featherbeam.sample';

/** The visitor's own state of the sample; null when it is as delivered. */
export function readSample(storage: Storage = localStorage): Plan | null {
  return read(storage, SAMPLE)?.plan ?? null;
}

export function keepSample(plan: Plan | null, storage: Storage = localStorage): void {
  quietly(() => {
    if (plan === null) storage.removeItem(SAMPLE);
    else storage.setItem(SAMPLE, JSON.stringify(draftOf(plan)));
  });
}

/** Edits of a plan that no server knows. */
export function draftOf(plan: Plan): Draft {
  return { version: 0, plan, base: null, sent: null, at: '' };
}

function keysUnder(storage: Storage, prefix: string): string[] {
  const keys: string[] = [];
  quietly(() => {
    for (let i = 0; i < storage.length; i++) {
      const key = storage.key(i);
      if (key?.startsWith(prefix)) keys.push(key);
    }
  });
  return keys;
}

function read(storage: Storage, key: string): Draft | null {
  try {
    const value: unknown = JSON.parse(storage.getItem(key) ?? 'null');
    return isDraft(value) ? value : null;
  } catch {
    return null;
  }
}

function isDraft(value: unknown): value is Draft {
  if (typeof value !== 'object' || value === null) return false;
  const { version, plan, at, base } = value as Partial<Draft>;
  return (
    typeof version === 'number' &&
    typeof at === 'string' &&
    isPlanShaped(plan) &&
    (base === null || base === undefined || isPlanShaped(base))
  );
}

/** Written by this page, so the shape of the plan's lists is enough; its values may well be unfinished. */
export function isPlanShaped(value: unknown): value is Plan {
  if (typeof value !== 'object' || value === null) return false;
  const plan = value as Partial<Plan>;
  return (
    (['surfaces', 'items', 'solids'] as const).every((list) => Array.isArray(plan[list])) &&
    typeof plan.materials === 'object'
  );
}

/** Storage may be full or refused; the server's copy and the open page still hold the work. */
function quietly(action: () => void): void {
  firstThatFits([null], action);
}

function firstThatFits<T>(choices: readonly T[], action: (choice: T) => void): void {
  for (const choice of choices) {
    try {
      return action(choice);
    } catch {
      continue;
    }
  }
}
