import { mean, standardDeviation } from 'simple-statistics';
import { describe, expect, test } from 'vitest';
import reference from '#data/reference/uncertainty.json';
import { balancePoint, balanceUncertainty, massUncertainty } from '#shared/core/balance.ts';
import { estimate } from '#shared/core/estimate.ts';
import { balanceOnSupports, supportsUncertainty } from '#shared/core/supports.ts';
import { itemsPlan, plainPlan } from './plans.ts';
import { seededNormal } from './random.ts';
import { expectNear, expectPrinted, SAME_SUM } from './tolerance.ts';

const DRAWS = 100_000;
/** A standard deviation from n draws is itself uncertain by 1/√(2n); five times that is past chance. */
const SAMPLING = 5 / Math.sqrt(2 * DRAWS);

describe('combination in quadrature (GUM)', () => {
  test(`the end gauge’s contributions come to 32 nm (${reference.endGauge.source})`, () => {
    const { contributions, combined, computed } = reference.endGauge;
    const u = massUncertainty(contributions.map((nm) => ({ u: nm })));
    expectPrinted(u, combined.printed, combined.decimals);
    expectPrinted(u, computed.printed, computed.decimals);
  });

  test('errors of one weighed piece add up, those of separate pieces do not', () => {
    expect(massUncertainty([{ u: 3 }, { u: 4 }])).toBe(5);
    expect(
      massUncertainty([
        { u: 3, together: 'sheet' },
        { u: 4, together: 'sheet' },
      ]),
    ).toBe(7);
  });
});

describe(`balance of three uncertain masses (${reference.threeMasses.source})`, () => {
  const { rows, mass, balance, byMass, byArm, u, secondMoment } = reference.threeMasses;
  const x = (masses: readonly { mass: number; x: number }[]) =>
    balancePoint(masses.map((row) => ({ mass: row.mass, at: [row.x, 0, 0] })))?.[0] ?? Number.NaN;

  test('the balance point and its standard uncertainty', () => {
    expectNear(
      rows.reduce((sum, row) => sum + row.mass, 0),
      mass,
      SAME_SUM,
    );
    expectPrinted(x(rows), balance.printed, balance.decimals);
    expectPrinted(balanceUncertainty(rows), u.printed, u.decimals);
  });

  test.each([0, 1, 2])('term of row %i alone, by mass and by arm', (i) => {
    const only = (keep: 'u' | 'ux') =>
      rows.map((row, j) => ({ ...row, u: 0, ux: 0, ...(i === j && { [keep]: row[keep] }) }));
    expectPrinted(balanceUncertainty(only('u')), Math.abs(byMass[i] ?? Number.NaN), 4);
    expectPrinted(balanceUncertainty(only('ux')), byArm[i] ?? Number.NaN, 4);
  });

  test('drawing masses and arms at random gives the same mean and spread', () => {
    const draw = seededNormal(20_261_201);
    const sample = Array.from({ length: DRAWS }, () =>
      x(rows.map((row) => ({ mass: row.mass + row.u * draw(), x: row.x + row.ux * draw() }))),
    );
    expectNear(standardDeviation(sample), balanceUncertainty(rows) ?? Number.NaN, SAMPLING);
    expect(Math.abs(mean(sample) - balance.printed)).toBeLessThan((5 * u.printed) / Math.sqrt(DRAWS));
  });

  test('masses that are wrong together move the balance point as a draw that moves them together', () => {
    const together = rows.map((row) => ({ ...row, ux: 0, together: 'one scale' }));
    const draw = seededNormal(7);
    const sample = Array.from({ length: DRAWS }, () => {
      const error = draw();
      return x(rows.map((row) => ({ mass: row.mass + row.u * error, x: row.x })));
    });
    expectNear(standardDeviation(sample), balanceUncertainty(together) ?? Number.NaN, SAMPLING);
  });

  test('a whole estimate of these items answers the masses’ share of it, and their inertia', () => {
    const plan = itemsPlan(rows.map((row) => ({ mass: row.mass, at: row.x })));
    const { balance: answered, totals } = estimate(
      plainPlan({ items: plan.items.map((item, i) => ({ ...item, u: rows[i]?.u })) }),
    );
    expectNear(answered.u, Math.hypot(...byMass), 1e-3);
    expectNear(totals.u, Math.hypot(...rows.map((row) => row.u)), SAME_SUM);
    // All masses lie on the x axis: I_yy = I_zz = Σm(x − x̄)².
    expectPrinted(totals.inertia?.yy, secondMoment.printed, secondMoment.decimals);
    expectPrinted(totals.inertia?.zz, secondMoment.printed, secondMoment.decimals);
    expect(totals.inertia?.xx).toBe(0);
  });
});

describe(`weighing on two supports (${reference.twoSupports.source})`, () => {
  const { rear, total, wheelbase, uScale, uWheelbase, offset, u } = reference.twoSupports;
  const supports = [
    { reading: total - rear, tare: 0, x: 0 },
    { reading: rear, tare: 0, x: wheelbase },
  ];

  test('the balance point lies R·L/W behind the front support', () => {
    expectPrinted(balanceOnSupports(supports)?.x, offset.printed, offset.decimals);
  });

  test('both scales and the distance between them make its uncertainty', () => {
    const masses = supports.map(({ reading, x }) => ({
      mass: reading,
      x,
      u: uScale,
      ux: x === 0 ? 0 : uWheelbase,
    }));
    expectPrinted(balanceUncertainty(masses), u.printed, u.decimals);
  });

  test('the scales alone make what the distance leaves of it', () => {
    const byDistance = (rear / total) * uWheelbase;
    const rest = Math.sqrt(u.printed ** 2 - byDistance ** 2);
    expectPrinted(supportsUncertainty(supports, uScale, 0), rest, u.decimals);
    const placesWrongBoth = supportsUncertainty(supports, 0, uWheelbase);
    expectNear(placesWrongBoth, Math.hypot(rear / total, 1 - rear / total) * uWheelbase, SAME_SUM);
  });
});
