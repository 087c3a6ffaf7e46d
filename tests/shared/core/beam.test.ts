import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { layHung } from '#shared/core/beam-layout.ts';
import type { HungLabel } from '#shared/core/beam-places.ts';
import { beamOf, TILT_LIMIT, tiltOf } from '#shared/core/beam.ts';
import type { Balance, Line, Totals } from '#shared/core/result.ts';
import { rulerOf, spreadLabels } from '#shared/core/ruler.ts';

function line(id: string, group: string, surface: string | null, mass: number, x: number): Line {
  const blank = { material: null, pieces: 1, length: null, area: null, volume: null };
  return { ...blank, id, name: id, group, surface, mass, u: 0, at: [x, 0, 0], moment: mass * x };
}
// By hand: 20 g at −150, 30 + 10 g of wing at 40 and 80 (together 40 g at 50), 10 g at 600: 70 g at 5000/70 mm.
const lines = [
  line('wing/ribs', 'ribs', 'wing', 30, 40),
  line('wing/edge', 'edges', 'wing', 10, 80),
  line('item/lead', 'ballast', null, 20, -150),
  line('solid/tail', 'tail', null, 10, 600),
  line('item/ghost', 'ghost', null, 0, 10),
];
const x = 5000 / 70;
const totals: Totals = { mass: 70, u: 1, at: [x, 0, 0], wingMass: 40, byGroup: {}, inertia: null };
const balance: Balance = {
  x,
  u: 0.5,
  percentMac: (100 * (x - 10)) / 120,
  uPercentMac: 50 / 120,
  neutralPoint: 80,
  staticMargin: 0.1,
};
const reference = { area: 100_000, mac: 120, xLeMac: 10 };
const estimate = { lines, totals, balance };

describe('beamOf', () => {
  it('hangs each group with a mass at its centre of mass, from nose to tail', () => {
    const beam = beamOf(estimate, reference, undefined);
    expect(beam?.masses.map((m) => [m.key, m.mass, m.x])).toEqual([
      ['ballast', 20, -150],
      ['wing', 40, 50],
      ['tail', 10, 600],
    ]);
    expect(beam?.masses[1]?.lines).toEqual(['wing/ribs', 'wing/edge']);
  });

  it('stands level on its own balance point where none is asked for', () => {
    const beam = beamOf(estimate, reference, undefined);
    expect(beam).toMatchObject({
      pivot: x,
      wanted: null,
      leftOver: 0,
      tilt: 0,
      chord: { from: 10, to: 130 },
    });
  });

  it('turns about the wanted point by the moment that is left over', () => {
    // 50 % of 120 mm behind 10 mm is 70 mm, ±2 % is 2.4 mm; 70 g · (5000/70 − 70) mm = 100 g·mm, tail down.
    const beam = beamOf(estimate, reference, { percentMac: 50, tolerance: 2 });
    expect(beam?.wanted).toEqual({ x: 70, from: 67.6, to: 72.4, percentMac: 50 });
    expect(beam?.leftOver).toBeCloseTo(100, 9);
    expect(beam?.tilt).toBeGreaterThan(0);
  });

  it('has a beam without a wing, and none without a mass', () => {
    expect(beamOf(estimate, null, { percentMac: 50, tolerance: 2 })).toMatchObject({
      wanted: null,
      chord: null,
    });
    const weightless = { ...estimate, balance: { ...balance, x: null } };
    expect(beamOf(weightless, reference, undefined)).toBeNull();
  });
});

describe('tiltOf', () => {
  it('leans more for more, the same to either side, and never beyond its limit', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1e6, noNaN: true }),
        fc.double({ min: 0.01, max: 100, noNaN: true }),
        (by, small) => {
          const tilt = tiltOf(by, small);
          expect(tilt).toBeLessThanOrEqual(TILT_LIMIT);
          expect(tiltOf(-by, small)).toBeCloseTo(-tilt, 12);
          expect(tiltOf(by * 2 + 1, small)).toBeGreaterThanOrEqual(tilt);
        },
      ),
    );
  });
});

const hung = fc
  .array(
    fc.record({
      at: fc.double({ min: 0.1, max: 0.9, noNaN: true }),
      radius: fc.integer({ min: 5, max: 22 }),
      width: fc.integer({ min: 30, max: 70 }),
    }),
    { minLength: 1, maxLength: 8 },
  )
  .map((all) => all.map((one, i): HungLabel => ({ ...one, key: `g${i}`, x: one.at * 900, height: 30 })));

describe('layHung', () => {
  it('lets no weight or label cover another, and no label leave the drawing, for up to eight groups', () => {
    fc.assert(
      fc.property(hung, (labels) => {
        const boxes = layHung(labels, 900).flatMap((place, i) => boxesOf(labels[i], place));
        boxes.forEach((a, i) => {
          expect(a.x0).toBeGreaterThanOrEqual(0);
          expect(a.x1).toBeLessThanOrEqual(900);
          for (const b of boxes.slice(i + 1)) {
            if (a.key !== b.key) expect(apart(a, b), `${a.key} and ${b.key}`).toBe(true);
          }
        });
      }),
    );
  });

  it('keeps weights that have room on the shortest string', () => {
    const labels = [100, 400, 800].map((at, i) => ({
      key: `g${i}`,
      x: at,
      radius: 12,
      width: 50,
      height: 30,
    }));
    expect(new Set(layHung(labels, 900).map((p) => p.string)).size).toBe(1);
  });

  it('keeps labels clear of the post of the pivot', () => {
    const [place] = layHung([{ key: 'wing', x: 400, radius: 20, width: 60, height: 30 }], 900, [440]);
    expect(place?.side).toBe('left');
  });
});

function boxesOf(
  label: HungLabel | undefined,
  place: { string: number; labelX: number; labelY: number; key: string },
) {
  if (!label) return [];
  const { x: at, radius, width, height } = label;
  const { key, string, labelX, labelY } = place;
  return [
    { key, x0: at - radius, x1: at + radius, y0: string, y1: string + 2 * radius },
    { key, x0: labelX, x1: labelX + width, y0: labelY, y1: labelY + height },
  ];
}

type Box = { x0: number; x1: number; y0: number; y1: number };
const apart = (a: Box, b: Box) => a.x1 <= b.x0 || b.x1 <= a.x0 || a.y1 <= b.y0 || b.y1 <= a.y0;

describe('rulerOf', () => {
  it('numbers in steps of 1, 2 or 5 and marks halfway between', () => {
    expect(rulerOf(-210, 430, 640, 90)).toEqual({
      step: 100,
      numbered: [-200, -100, 0, 100, 200, 300, 400],
      between: [-150, -50, 50, 150, 250, 350],
    });
    expect(rulerOf(0, 1, 300, 60).step).toBe(0.2);
  });
});

describe('spreadLabels', () => {
  it('leaves labels that have room where they want to be', () => {
    expect(
      spreadLabels(
        [
          { x: 80, width: 20 },
          { x: 30, width: 20 },
        ],
        0,
        100,
      ),
    ).toEqual([80, 30]);
  });

  it('pushes them apart, keeps their order and stays inside', () => {
    const wish = fc.record({
      x: fc.integer({ min: -50, max: 1050 }),
      width: fc.integer({ min: 5, max: 120 }),
    });
    fc.assert(
      fc.property(fc.array(wish, { maxLength: 8 }), (wishes) => {
        const centres = spreadLabels(wishes, 0, 1000);
        const spans = wishes
          .map(({ x: at, width }, i) => ({
            at,
            from: (centres[i] ?? 0) - width / 2,
            to: (centres[i] ?? 0) + width / 2,
          }))
          .sort((a, b) => a.from - b.from);
        spans.forEach((span, i) => {
          expect(span.from).toBeGreaterThanOrEqual(-1e-6);
          expect(span.to).toBeLessThanOrEqual(1000 + 1e-6);
          const next = spans[i + 1];
          if (next) {
            expect(next.from).toBeGreaterThanOrEqual(span.to - 1e-6);
            expect(next.at).toBeGreaterThanOrEqual(span.at);
          }
        });
      }),
    );
  });
});
