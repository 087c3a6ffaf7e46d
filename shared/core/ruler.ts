/** Marks of a scale, and which of them carry a number. */
export interface Ruler {
  /** from one number to the next */
  step: number;
  /** numbered marks */
  numbered: number[];
  /** marks halfway between */
  between: number[];
}

/**
 * Marks from `from` to `to` (above it) for a scale drawn `room` wide, numbers at least `gap` apart in the units of
 * the drawing: steps of 1, 2 or 5 times a power of ten.
 * @example rulerOf(-30, 120, 300, 60).numbered // → [0, 50, 100]
 */
export function rulerOf(from: number, to: number, room: number, gap: number): Ruler {
  const least = ((to - from) * gap) / room;
  const power = 10 ** Math.floor(Math.log10(least));
  const step = ([1, 2, 5].find((n) => n * power >= least) ?? 10) * power;
  const marks = (every: number) => {
    const first = Math.ceil(from / every - 1e-9);
    const count = Math.floor(to / every + 1e-9) - first + 1;
    return Array.from({ length: Math.max(0, count) }, (_, i) => (first + i) * every + 0);
  };
  const numbered = marks(step);
  return { step, numbered, between: marks(step / 2).filter((mark) => !numbered.includes(mark)) };
}

/** A label that would like to be centred at `x`. */
export interface Wish {
  x: number;
  width: number;
}

/**
 * Centres for labels in one line so that none overlaps its neighbour and each lies as near to its wish as the
 * others let it (least squares, by pooling neighbours that push each other), between `from` and `to` while there is
 * room. Answers in the order given.
 * @example spreadLabels([{ x: 10, width: 10 }, { x: 12, width: 10 }], 0, 100) // → [6, 16]
 */
export function spreadLabels(wishes: readonly Wish[], from: number, to: number): number[] {
  const order = wishes
    .map((wish, index) => ({ ...wish, index }))
    .sort((a, b) => a.x - b.x || a.index - b.index);
  const pools: { sum: number; members: { index: number; offset: number }[]; width: number }[] = [];
  for (const { x, width, index } of order) {
    let pool = { sum: x - width / 2, members: [{ index, offset: width / 2 }], width };
    for (
      let before = pools.at(-1);
      before && startOf(before) + before.width > startOf(pool);
      before = pools.at(-1)
    ) {
      pools.pop();
      const shift = before.width;
      pool = {
        sum: before.sum + pool.sum - shift * pool.members.length,
        members: [...before.members, ...pool.members.map((m) => ({ ...m, offset: m.offset + shift }))],
        width: before.width + pool.width,
      };
    }
    pools.push(pool);
  }
  let free = from;
  const starts = pools.map((pool) => {
    const start = Math.max(free, startOf(pool));
    free = start + pool.width;
    return start;
  });
  let limit = to;
  for (let i = pools.length - 1; i >= 0; i--) {
    const width = pools[i]?.width ?? 0;
    starts[i] = Math.min(starts[i] ?? 0, limit - width);
    limit = starts[i] ?? 0;
  }
  const centres = wishes.map(({ x }) => x);
  pools.forEach((pool, i) => {
    for (const { index, offset } of pool.members) centres[index] = (starts[i] ?? 0) + offset;
  });
  return centres;
}

function startOf(pool: { sum: number; members: readonly unknown[] }): number {
  return pool.sum / pool.members.length;
}
