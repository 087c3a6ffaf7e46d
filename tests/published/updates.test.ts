import { describe, expect, test } from 'vitest';
import reference from '#data/reference/updates.json';
import { normalUpdate, observe, type Belief } from '#shared/core/built/belief.ts';
import { expectNear, expectPrinted } from './tolerance.ts';

describe('what is held of a material after weighings', () => {
  const { single, joint } = reference;
  const start: Belief = {
    mean: [1, 1],
    cov: joint.prior.map((sd, i) => joint.prior.map((_, j) => (i === j ? sd ** 2 : 0))),
  };
  const tell = (belief: Belief, order: readonly (typeof joint.observed)[number][]) =>
    order.reduce(
      (held, { weights, value, sd }) => observe(held, { weights, value, variance: sd ** 2 }),
      belief,
    );

  test(`one unknown: ${single.what} (${single.source})`, () => {
    const { mean, sd } = normalUpdate(single.prior, single.observed);
    expectPrinted(mean, single.mean.printed, single.mean.decimals);
    expectPrinted(sd, single.sd.printed, single.sd.decimals);
  });

  test('one unknown comes out alike from the joint update', () => {
    const prior: Belief = { mean: [1], cov: [[single.prior.sd ** 2]] };
    const held = single.observed.reduce(
      (belief, { value, sd }) => observe(belief, { weights: [1], value, variance: sd ** 2 }),
      prior,
    );
    expectNear(held.mean[0], single.mean.printed, 1e-12);
    expectNear(Math.sqrt(held.cov[0]?.[0] ?? 0), single.sd.printed, 1e-12);
  });

  test(`several unknowns: ${joint.what} (${joint.source}), in any order`, () => {
    for (const order of [joint.observed, joint.observed.toReversed()]) {
      const held = tell(start, order);
      joint.mean.forEach((mean, i) => expectNear(held.mean[i], mean, 1e-12));
      joint.cov.forEach((row, i) => row.forEach((c, j) => expectNear(held.cov[i]?.[j], c, 1e-9)));
    }
  });

  test('a second opinion by summing over a grid of the unknown agrees to six digits', () => {
    const density = (x: number, mean: number, sd: number) => Math.exp(-(((x - mean) / sd) ** 2) / 2);
    let [weight, first, second] = [0, 0, 0];
    for (let x = 0.5; x <= 1.6; x += 1e-5) {
      const p = single.observed.reduce(
        (product, { value, sd }) => product * density(value, x, sd),
        density(x, single.prior.mean, single.prior.sd),
      );
      weight += p;
      first += p * x;
      second += p * x * x;
    }
    const mean = first / weight;
    expectNear(mean, single.mean.printed, 1e-6);
    expectNear(Math.sqrt(second / weight - mean ** 2), single.sd.printed, 1e-6);
  });

  test('an exact observation of what is known exactly changes nothing', () => {
    const known: Belief = { mean: [1], cov: [[0]] };
    expect(observe(known, { weights: [1], value: 2, variance: 0 })).toEqual(known);
  });
});
