import { describe, expect, test } from 'vitest';
import reference from '#data/reference/weighing.json';
import { balancePoint } from '#shared/core/balance.ts';
import { balanceOfLayout, balanceOnSupports, type WheelLayout } from '#shared/core/supports.ts';
import { expectNear, expectPrinted, SAME_SUM } from './tolerance.ts';

type LayoutRow = (typeof reference.layouts)[number];
const layoutOf = (row: LayoutRow): WheelLayout => ({
  ...row,
  third: row.third === 'nose' ? 'nose' : 'tail',
  datum: row.datum === 'forward of mains' ? 'forward of mains' : 'aft of mains',
});
/** Where the main wheels lie from the datum, aft positive. */
const mainsOf = (row: LayoutRow) => (row.datum === 'forward of mains' ? 1 : -1) * row.datumToMains;
const layout = (id: string) => {
  const found = reference.layouts.find((row) => row.id === id);
  if (!found) throw new Error(id);
  return found;
};

describe('the four wheel layouts', () => {
  test.each(reference.layouts)('$id balances at $balance.printed ($source)', (row) => {
    expectPrinted(balanceOfLayout(layoutOf(row)), row.balance.printed, row.balance.decimals);
  });

  test.each(reference.layouts)('$id comes out the same from what stands on each scale', (row) => {
    const mains = mainsOf(row);
    const third = row.third === 'nose' ? mains - row.wheelbase : mains + row.wheelbase;
    const found = balanceOnSupports([
      { reading: row.total - row.onThird, tare: 0, x: mains },
      { reading: row.onThird, tare: 0, x: third },
    ]);
    expectNear(found?.x, balanceOfLayout(layoutOf(row)), 1e-12);
  });

  test('one aircraft lies equally far from its wheels, whichever way its datum was chosen', () => {
    // FAA-H-8083-30B p. 6-16: 13.2 in forward of the mains, 12.2 in aft of them.
    for (const [first, second, fromMains] of [
      ['nose-forward', 'nose-aft', -13.2],
      ['tail-forward', 'tail-aft', 12.2],
    ] as const) {
      const a = balanceOfLayout(layoutOf(layout(first))) - mainsOf(layout(first));
      const b = balanceOfLayout(layoutOf(layout(second))) - mainsOf(layout(second));
      expect(a).toBeCloseTo(b, 10);
      expectPrinted(a, fromMains, 1);
    }
  });
});

describe('readings on three scales', () => {
  test.each(reference.weighings)('$id ($source)', ({ supports, mass, moment, x, y }) => {
    const found = balanceOnSupports(supports);
    expectNear(found?.mass, mass, SAME_SUM);
    expectPrinted((found?.x ?? Number.NaN) * mass, moment, 1);
    if (x) expectPrinted(found?.x, x.printed, x.decimals);
    if (y) expectPrinted(found?.y, y.printed, y.decimals);
  });

  test('empty weight follows from the weighing less the fuel that was aboard', () => {
    const { weighing, changes, mass, moment, balance } = reference.emptyWeight;
    const weighed = balanceOnSupports(reference.weighings.find((row) => row.id === weighing)?.supports ?? []);
    const rows = [{ mass: weighed?.mass ?? Number.NaN, at: weighed?.x ?? Number.NaN }, ...changes];
    const x = balancePoint(rows.map((row) => ({ mass: row.mass, at: [row.at, 0, 0] })))?.[0] ?? Number.NaN;
    expectNear(
      rows.reduce((sum, row) => sum + row.mass, 0),
      mass,
      SAME_SUM,
    );
    expectPrinted(x * mass, moment, 1);
    expectPrinted(x, balance.printed, balance.decimals);
  });

  test('moving the datum to the spinner moves the answer by 115 in and the lateral place not at all', () => {
    const at = (id: string) =>
      balanceOnSupports(reference.weighings.find((row) => row.id === id)?.supports ?? []);
    const [mains, spinner] = [at('mains-datum'), at('spinner-datum')];
    expect((spinner?.x ?? Number.NaN) - (mains?.x ?? Number.NaN)).toBeCloseTo(115, 10);
    expect(spinner?.y).toBe(mains?.y);
  });

  test('scales that carry nothing but their tare give no balance point', () => {
    expect(
      balanceOnSupports([
        { reading: 2, tare: 2, x: 10 },
        { reading: 1, tare: 1, x: 90 },
      ]),
    ).toBeNull();
  });
});
