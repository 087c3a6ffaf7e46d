import type { Layout } from './draws-layout.ts';
import type { FoldedPlan } from './linear-model.ts';
import { weigh } from './linear-model-weigh.ts';
import { NOTHING } from './lump.ts';
import { randomOf } from './random.ts';

/** Drawn values, and what share of their variance each deviate explains by regression. */
export interface Drawn {
  mass: Float64Array;
  x: Float64Array;
  massShares: Float64Array;
  balanceShares: Float64Array;
}

/** Variance of an even deviate from −1 to 1. */
const EVEN_VARIANCE = 1 / 3;

/** Draws at a time: their deviates lie near the processor, and each loop is short enough to be compiled well. */
const BLOCK = 100;
/** Blocks from one rest to the next. */
const BLOCKS_A_STEP = 10;

/**
 * The loop over the draws. Each draw is gone through once more for how mass and balance go with each deviate: these
 * are independent, so a regression on one is a regression on all. A draw without any mass balances as reckoned.
 * Rests after every thousand draws, with the number drawn, so that whoever draws can do other things or stop there.
 * @example [...drawOut(foldPlan(EXAMPLE_PLAN), layoutOf(foldPlan(EXAMPLE_PLAN), {}), { seed: 1, draws: 2_500 })] // → [1000, 2000]
 */
export function* drawOut(
  fold: FoldedPlan,
  layout: Layout,
  { seed, draws }: { seed: number; draws: number },
): Generator<number, Drawn, undefined> {
  const { mass: wholeMass, at } = weigh(fold);
  const whole = { mass: wholeMass, x: at?.[0] ?? 0 };
  const random = randomOf(seed);
  const z = new Float64Array(layout.normals * BLOCK);
  const r = new Float64Array(layout.evens * BLOCK);
  const out = valuesOf(draws);
  const normals = valuesOf(layout.normals);
  const evens = valuesOf(layout.evens);
  for (let from = 0; from < draws; from += BLOCK) {
    const to = Math.min(draws, from + BLOCK);
    random.fillNormal(z);
    random.fillEven(r);
    moveTogether(layout, z);
    sumMasses(layout, z, r, out, from, to, whole.x);
    gather(z, normals, out, from, to, whole);
    gather(r, evens, out, from, to, whole);
    if (to < draws && to % (BLOCK * BLOCKS_A_STEP) === 0) yield to;
  }
  const own = (sums: Float64Array) => sums.map((sum, i) => ((layout.normal[i] ?? i) === i ? sum : 0));
  const shares = (drawn: Float64Array, byNormal: Float64Array, byEven: Float64Array) => {
    const variance = varianceOf(drawn);
    const share = (sum: number, of: number) => (variance > 0 ? (sum / draws) ** 2 / of / variance : 0);
    return Float64Array.of(
      ...own(byNormal).map((sum) => share(sum, 1)),
      ...byEven.map((sum) => share(sum, EVEN_VARIANCE)),
    );
  };
  return {
    ...out,
    massShares: shares(out.mass, normals.mass, evens.mass),
    balanceShares: shares(out.x, normals.x, evens.x),
  };
}

/** Lines of one measured piece take the deviate of its first line. */
function moveTogether({ normal, normals }: Layout, z: Float64Array): void {
  for (let line = 0; line < normal.length; line++) {
    const first = normal[line] ?? line;
    if (first === line) continue;
    for (let at = 0; at < z.length; at += normals) z[at + line] = z[at + first] ?? 0;
  }
}

/** A figure of mass and one of balance, of every draw or of every deviate. */
interface Values {
  mass: Float64Array;
  x: Float64Array;
}

const valuesOf = (length: number): Values => ({
  mass: new Float64Array(length),
  x: new Float64Array(length),
});

function sumMasses(
  { stretches, mass, slope, tolerance, x, normals }: Layout,
  z: Float64Array,
  r: Float64Array,
  { mass: outMass, x: outX }: Values,
  from: number,
  to: number,
  emptyAt: number,
): void {
  let even = 0;
  for (let draw = from; draw < to; draw++) {
    const at = (draw - from) * normals;
    let follows = at + mass.length;
    let total = 0;
    let moment = 0;
    for (const stretch of stretches) {
      let grams = 0;
      let turn = 0;
      for (let line = stretch.from; line < stretch.to; line++) {
        let one = (mass[line] ?? 0) + (slope[line] ?? 0) * (z[at + line] ?? 0);
        if (line < stretch.sticks) one *= 1 + (tolerance[line] ?? 0) * (r[even++] ?? 0);
        if (one < 0) one = 0;
        grams += one;
        turn += one * (x[line] ?? 0);
      }
      let behind = 1;
      for (const { share, slope: scatter } of stretch.followers) {
        behind += Math.max(0, share + scatter * (z[follows++] ?? 0));
      }
      total += grams * behind;
      moment += turn * behind;
    }
    outMass[draw] = total;
    outX[draw] = total > NOTHING ? moment / total : emptyAt;
  }
}

/** Adds to the sums, one a deviate, how far mass and balance lie from `whole` times the deviate. */
function gather(
  deviates: Float64Array,
  sums: Values,
  { mass, x }: Values,
  from: number,
  to: number,
  whole: { mass: number; x: number },
): void {
  const { mass: withMass, x: withX } = sums;
  const width = withMass.length;
  for (let draw = from; draw < to; draw++) {
    const start = (draw - from) * width;
    const byMass = (mass[draw] ?? 0) - whole.mass;
    const byX = (x[draw] ?? 0) - whole.x;
    for (let i = 0; i < width; i++) {
      const deviate = deviates[start + i] ?? 0;
      withMass[i] = (withMass[i] ?? 0) + deviate * byMass;
      withX[i] = (withX[i] ?? 0) + deviate * byX;
    }
  }
}

function varianceOf(values: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < values.length; i++) sum += values[i] ?? 0;
  const mean = sum / values.length;
  let square = 0;
  for (let i = 0; i < values.length; i++) square += ((values[i] ?? 0) - mean) ** 2;
  return square / values.length;
}
