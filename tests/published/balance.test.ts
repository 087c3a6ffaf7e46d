import { describe, expect, test } from 'vitest';
import reference from '#data/reference/balance.json';
import { balanceAfter, ballastFor } from '#shared/core/ballast.ts';
import { balancePoint, percentOfMac, positionOfPercent } from '#shared/core/balance.ts';
import { estimate } from '#shared/core/estimate.ts';
import { itemsPlan } from './plans.ts';
import { expectNear, expectPrinted, SAME_SUM } from './tolerance.ts';

/** Tables print pounds and inches; the core only multiplies and divides them. */
type Row = { mass: number; at: number };
const balanceOf = (rows: readonly Row[]) => {
  const at = balancePoint(rows.map(({ mass, at: x }) => ({ mass, at: [x, 0, 0] })));
  return at?.[0] ?? Number.NaN;
};
const massOf = (rows: readonly Row[]) => rows.reduce((sum, row) => sum + row.mass, 0);
const table = (id: string) => {
  const found = reference.tables.find((row) => row.id === id);
  if (!found) throw new Error(id);
  return found;
};

describe('balance point from a table of masses and arms', () => {
  test.each(reference.tables)('$id ($source)', ({ masses, mass, moment, momentDecimals, balance }) => {
    expectNear(massOf(masses), mass, SAME_SUM);
    expectPrinted(balanceOf(masses) * mass, moment, momentDecimals);
    if (balance) expectPrinted(balanceOf(masses), balance.printed, balance.decimals);
  });

  // A plan takes no negative mass: what is taken out has no place in it.
  const built = reference.tables.filter(({ masses }) => masses.every((row) => row.mass >= 0));
  test.each(built)('$id comes out of a whole estimate too, row by row', (row) => {
    const { lines, totals, balance } = estimate(itemsPlan(row.masses));
    row.masses.forEach((printed, i) => {
      if ('moment' in printed && typeof printed.moment === 'number')
        expectPrinted(lines[i]?.moment, printed.moment, row.momentDecimals);
    });
    expectNear(totals.mass, row.mass, SAME_SUM);
    expectPrinted((totals.at?.[0] ?? Number.NaN) * totals.mass, row.moment, row.momentDecimals);
    if (row.balance) expectPrinted(balance.x, row.balance.printed, row.balance.decimals);
  });

  test('moving the datum from the plank’s end to its centre moves the answer by that half length and no more', () => {
    const [end, centre] = [table('plank-left-end'), table('plank-centre')];
    // The centre lies 100 in from the left end in both tables.
    expect(end.masses.map((row) => row.at - 100)).toEqual(centre.masses.map((row) => row.at));
    expect(balanceOf(end.masses) - balanceOf(centre.masses)).toBeCloseTo(100, 10);
  });

  test('about its balance point the plank’s left and right moments are equal, as its proof prints them', () => {
    const { table: id, about, left, right } = reference.balanceProof;
    const masses = table(id).masses;
    for (const { mass, distance, moment } of left) {
      expect(masses).toContainEqual(
        expect.objectContaining({ mass, at: expect.closeTo(about - distance, 9) }),
      );
      expectPrinted(mass * distance, moment, 2);
    }
    for (const { mass, distance, moment } of right) {
      expect(masses).toContainEqual(
        expect.objectContaining({ mass, at: expect.closeTo(about + distance, 9) }),
      );
      expectPrinted(mass * distance, moment, 1);
    }
    const exact = balanceOf(masses);
    const about0 = (rows: readonly Row[]) => rows.reduce((sum, row) => sum + row.mass * (row.at - exact), 0);
    expect(Math.abs(about0(masses))).toBeLessThan(SAME_SUM * 52_900);
  });
});

describe('something added or taken off', () => {
  test.each(reference.changes)('$id moves the balance point by $shift.printed ($source)', (change) => {
    const before = change.momentBefore / change.mass;
    const after = balanceAfter(change.mass, before, change.added, change.at);
    expectPrinted(after - before, change.shift.printed, change.shift.decimals);
    expectNear(
      after,
      balanceOf([
        { mass: change.mass, at: before },
        { mass: change.added, at: change.at },
      ]),
      SAME_SUM,
    );
  });

  test('what was added is what the ballast formula asks for to get there', () => {
    for (const change of reference.changes.filter(({ added }) => added > 0)) {
      const before = change.momentBefore / change.mass;
      const answer = ballastFor(
        change.mass,
        before,
        balanceAfter(change.mass, before, change.added, change.at),
        change.at,
      );
      expect(answer).toEqual({ mass: expect.closeTo(change.added, 8) });
    }
  });
});

describe('per cent of mean aerodynamic chord', () => {
  test.each(reference.percentOfMac)('$id: $x is $percent % ($source)', ({ x, xLeMac, mac, percent }) => {
    expectNear(percentOfMac(x, xLeMac, mac), percent, SAME_SUM);
    expectNear(positionOfPercent(percent, xLeMac, mac), x, SAME_SUM);
  });
});
