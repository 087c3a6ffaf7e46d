import { describe, expect, test } from 'vitest';
import reference from '#data/reference/aero.json';
import atmosphere from '#data/reference/atmosphere.json';
import { downwashSlope, liftSlope, neutralPoint } from '#shared/core/aero.ts';
import { airAt } from '#shared/core/atmosphere.ts';
import { estimate } from '#shared/core/estimate.ts';
import { GRAVITY } from '#shared/core/frame.ts';
import { loadingOf, speedAt } from '#shared/core/loading.ts';
import { convert } from '#shared/units/units.ts';
import { itemsPlan, panel, plainPlan, surface } from './plans.ts';
import { expectNear, expectPrinted, SAME_SUM } from './tolerance.ts';

describe('lift slope and downwash', () => {
  test.each(reference.liftSlopes.rows)(
    `aspect ratio $aspectRatio: $slope per radian (${reference.liftSlopes.source})`,
    ({ aspectRatio, slope, downwash }) => {
      expectPrinted(liftSlope(aspectRatio), slope, 5);
      if (downwash !== null) expectPrinted(downwashSlope(aspectRatio), downwash, 5);
    },
  );

  test.each(reference.liftingLine.rows)(
    `at aspect ratio $aspectRatio the formula lies within 1 % of the lifting line (${reference.liftingLine.source})`,
    ({ aspectRatio, slope }) => {
      expectNear(liftSlope(aspectRatio), slope, 0.01);
    },
  );

  test('a very long wing comes to 2π per radian and leaves no downwash', () => {
    expectNear(liftSlope(1e6), 2 * Math.PI, 1e-5);
    expect(downwashSlope(1e6)).toBeLessThan(1e-5);
  });
});

describe(`neutral point of wing and tail (${reference.neutralPoint.source})`, () => {
  const { wingAspectRatio, tailAspectRatio, areaRatio, tailPlace, efficiency, k, exact, shortForm } =
    reference.neutralPoint;
  const wingSlope = liftSlope(wingAspectRatio);
  const tailShare =
    efficiency * areaRatio * (liftSlope(tailAspectRatio) / wingSlope) * (1 - downwashSlope(wingAspectRatio));
  const given = { wingArea: 1, tailArea: areaRatio, wingAspectRatio, tailAspectRatio, tailPlace };
  const found = neutralPoint({ ...given, tailEfficiency: efficiency });

  test('where the wing’s and the tail’s added lift balance', () => {
    expectPrinted(tailShare, k.printed, k.decimals);
    expectPrinted(found, exact.printed, exact.decimals);
  });

  test('the arm between the quarter chords, with the slope of wing and tail together, gives the same point', () => {
    const tailVolume = areaRatio * (tailPlace - 0.25);
    const together = wingSlope * (1 + tailShare);
    const byVolume =
      0.25 +
      efficiency *
        tailVolume *
        (liftSlope(tailAspectRatio) / together) *
        (1 - downwashSlope(wingAspectRatio));
    expectNear(byVolume, found, SAME_SUM);
  });

  test('the short form, with the wing’s slope alone, would put it too far aft, on the wrong side of caution', () => {
    const short = 0.25 + tailShare * (tailPlace - 0.25);
    expectPrinted(short, shortForm.printed, shortForm.decimals);
    expect(short).toBeGreaterThan(found + 0.019);
  });

  test('a tail in the wing’s full wash moves it aft less than the default of nine tenths would', () => {
    expect(neutralPoint(given)).toBeLessThan(found);
    expect(neutralPoint({ ...given, tailEfficiency: 0.9 })).toBe(neutralPoint(given));
  });

  test('a drawn model of these proportions has its neutral point there, and its margin from the balance point', () => {
    // Wing 1000 × 100 mm; tail of half the aspect ratio and 0.15 of the area: 273.9 × 54.77 mm.
    const tailArea = areaRatio * 100_000;
    const tailChord = Math.sqrt(tailArea / tailAspectRatio);
    const wing = surface([panel({ span: 500, rootChord: 100, tipChord: 100 })]);
    const tail = surface(
      [panel({ span: tailArea / tailChord / 2, rootChord: tailChord, tipChord: tailChord })],
      [],
      {
        key: 'tail',
        role: 'tailplane',
        apex: [tailPlace * 100 - tailChord / 4, 0, 0],
      },
    );
    const { items } = itemsPlan([{ mass: 100, at: 40 }]);
    const { balance } = estimate(plainPlan({ surfaces: [wing, tail], items }));
    const expected = 100 * neutralPoint(given);
    expectNear(balance.neutralPoint, expected, 1e-12);
    expectNear(balance.staticMargin, (expected - 40) / 100, 1e-12);
  });
});

describe(`wing loading and stall (${reference.stall.source})`, () => {
  const { rows, altitudes } = reference.stall;
  const earth = atmosphere.earthRadius.metres;
  const density = (z: number) => airAt((earth * z) / (earth + z)).density;

  test.each(rows)('$mass g on $areaDm2 dm² at C_L $clMax: $loading g/dm², stall $speeds m/s', (row) => {
    const area = row.areaDm2 * 10_000;
    const loading = loadingOf(row.mass, area) ?? Number.NaN;
    expectPrinted(loading, row.loading, 4);
    expectPrinted(convert(loading, 'g/dm2', 'oz/ft2'), row.loadingOz, 4);
    // 1 g/dm² weighs 0.980665 N/m².
    expectPrinted((loading * GRAVITY) / 10, row.loadingN, 4);
    altitudes.forEach((z, i) => {
      expectPrinted(speedAt(row.mass, area, row.clMax, density(z)), row.speeds[i] ?? Number.NaN, 5);
    });
  });

  test(`speed at another lift coefficient (${reference.trimSpeed.source})`, () => {
    const { loading, liftCoefficient, speed } = reference.trimSpeed;
    expectPrinted(speedAt(loading, 10_000, liftCoefficient, density(0)), speed.printed, speed.decimals);
  });

  test('a whole estimate answers the same loading and stall', () => {
    const [row] = rows;
    const mass = row?.mass ?? Number.NaN;
    const clMax = row?.clMax ?? Number.NaN;
    // 6 dm²: 600 × 100 mm
    const wing = surface([panel({ span: 300, rootChord: 100, tipChord: 100 })]);
    const { items } = itemsPlan([{ mass, at: 30 }]);
    const answer = estimate(
      plainPlan({ surfaces: [wing], items, flight: { clMax, airDensity: density(0) } }),
    );
    expectPrinted(answer.loading.wing, row?.loading ?? Number.NaN, 4);
    expectPrinted(answer.speeds.stall, row?.speeds[0] ?? Number.NaN, 5);
  });
});
