import { applied, deltaOf, type Delta } from '#client/lib/delta.ts';
import type { Plan } from '#shared/core/plan.ts';
import { isPlanShaped } from './drafts.ts';
import type { History, Step } from './history.ts';

/** Undo and redo as they outlive a reload. */
export type Trail = Pick<History<Plan>, 'past' | 'present' | 'future'>;

export interface TrailShelf {
  take: () => Trail | null;
  put: (trail: Trail) => void;
}

/** Most that one glider's steps may take, in characters; the oldest steps go first. */
const ROOM = 1_000_000;
const PREFIX = 'featherbeam.steps.';

/** The steps of this window, kept as long as the window is. */
export function trailShelf(place: string, storage: Storage = sessionStorage, room = ROOM): TrailShelf {
  const key = PREFIX + place;
  const packed = new Packer();
  return {
    take: () => {
      try {
        return unpack(JSON.parse(storage.getItem(key) ?? 'null'));
      } catch {
        return null;
      }
    },
    put: (trail) => {
      try {
        if (trail.past.length + trail.future.length === 0) storage.removeItem(key);
        else storage.setItem(key, packed.pack(trail, room));
      } catch {
        // Storage is full or refused: undo then holds until the page is left.
      }
    },
  };
}

/** From one end of a step to the other, and from there to the next step, which mostly begins where this one ends. */
interface Link {
  jump: Delta | null;
  step: Delta | null;
}

interface Packed {
  present: Plan;
  /** nearest first, each walked from its later end to its earlier one */
  past: Link[];
  /** nearest first, each walked from its earlier end to its later one */
  future: Link[];
}

class Packer {
  /** What a step comes to is worked out once. */
  private readonly texts = new WeakMap<Step<Plan>, Map<Plan, string>>();

  pack({ past, present, future }: Trail, room: number): string {
    const head = `{"present":${JSON.stringify(present)}`;
    const [done, undone] = [
      this.chain(past.toReversed(), present, ({ after, before }) => [after, before]),
      this.chain(future, present, ({ before, after }) => [before, after]),
    ];
    const left = room - head.length;
    const ahead = fitting(undone, left / 2);
    const behind = fitting(done, left - ahead.join().length);
    return `${head},"past":[${behind.join()}],"future":[${ahead.join()}]}`;
  }

  private chain(
    steps: readonly Step<Plan>[],
    from: Plan,
    ends: (step: Step<Plan>) => [Plan, Plan],
  ): string[] {
    let here = from;
    return steps.map((step) => {
      const [near, far] = ends(step);
      const known = this.texts.get(step) ?? new Map<Plan, string>();
      const text =
        known.get(here) ??
        JSON.stringify({ jump: deltaOf(here, near), step: deltaOf(near, far) } satisfies Link);
      this.texts.set(step, known.set(here, text));
      here = far;
      return text;
    });
  }
}

/** As many of the first as there is room for. */
function fitting(texts: readonly string[], room: number): string[] {
  let taken = 0;
  const end = texts.findIndex((text) => (taken += text.length + 1) > room);
  return texts.slice(0, end === -1 ? texts.length : end);
}

function unpack(value: unknown): Trail | null {
  if (typeof value !== 'object' || value === null) return null;
  const { present, past, future } = value as Partial<Packed>;
  if (!isPlanShaped(present) || !Array.isArray(past) || !Array.isArray(future)) return null;
  const walk = (links: readonly Link[]): [near: Plan, far: Plan][] => {
    let here: Plan = present;
    return links.map(({ jump, step }) => {
      // What was packed from plans unpacks to plans.
      const near = applied(here, jump) as Plan;
      here = applied(near, step) as Plan;
      return [near, here];
    });
  };
  return {
    present,
    past: walk(past)
      .map(([after, before]) => ({ before, after }))
      .toReversed(),
    future: walk(future).map(([before, after]) => ({ before, after })),
  };
}
