import { describe, expect, it } from 'vitest';
import { balanceUncertainty, massUncertainty } from '#shared/core/balance.ts';
import { balanceContributions, massContributions, momentsAbout } from '#shared/core/contributions.ts';
import type { Line, Totals } from '#shared/core/result.ts';

function line(id: string, group: string, mass: number, x: number, u: number): Line {
  const blank = { surface: null, material: null, pieces: 1, length: null, area: null, volume: null };
  return { ...blank, id, name: id, group, mass, u, at: [x, 0, 0], moment: mass * x };
}
// By hand: 5 + 3 + 2 = 10 g, balance (5·(−20) + 3·10 + 2·70)/10 = 7 mm.
const lines = [
  line('lead', 'nose', 5, -20, 0.7),
  line('wing', 'wing', 3, 10, 0.5),
  line('tail', 'tail', 2, 70, 0.3),
];
const totals: Totals = { mass: 10, u: 0, at: [7, 0, 0], wingMass: 0, byGroup: {}, inertia: null };

describe('contributions', () => {
  it('ranks what makes the mass uncertain, with shares of the variance', () => {
    // 0.49 + 0.25 + 0.09 = 0.83
    const found = massContributions({ lines });
    expect(found.map(({ id }) => id)).toEqual(['lead', 'wing', 'tail']);
    expect(found.map(({ share }) => share)).toEqual([0.49 / 0.83, 0.25 / 0.83, 0.09 / 0.83].map(near));
  });

  it('ranks what makes the balance uncertain by distance from it as well', () => {
    // |−27|/10·0.7 = 1.89, |3|/10·0.5 = 0.15, |63|/10·0.3 = 1.89
    const found = balanceContributions({ lines, totals });
    expect(Object.fromEntries(found.map(({ id, u }) => [id, u]))).toEqual({
      lead: near(1.89),
      tail: near(1.89),
      wing: near(0.15),
    });
  });

  it('adds up in quadrature to the uncertainties of mass and balance', () => {
    const square = (found: { u: number }[]) => Math.sqrt(found.reduce((sum, { u }) => sum + u * u, 0));
    expect(square(massContributions({ lines }))).toBeCloseTo(massUncertainty(lines), 12);
    const weighed = lines.map((l) => ({ mass: l.mass, x: l.at[0], u: l.u }));
    expect(square(balanceContributions({ lines, totals }))).toBeCloseTo(
      balanceUncertainty(weighed) ?? Number.NaN,
      12,
    );
  });

  it('leaves out what is exactly known', () => {
    expect(massContributions({ lines: [line('weighed', 'gear', 4, 0, 0)] })).toEqual([]);
  });
});

describe('momentsAbout', () => {
  it('cancels about the balance point', () => {
    // 5·(−27) = −135, 3·3 = 9, 2·63 = 126
    const found = momentsAbout({ lines }, 7);
    expect(found.map(({ name, moment }) => [name, moment])).toEqual([
      ['Nose', near(-135)],
      ['Wing', near(9)],
      ['Tail', near(126)],
    ]);
  });
});

function near(value: number): unknown {
  return expect.closeTo(value, 12);
}
