import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { overrunOf } from '#shared/core/built/overrun.ts';
import { matchPanels } from '#shared/core/built/panel-match.ts';
import { readingOf } from '#shared/core/built/reading.ts';
import { EXAMPLE_PORT, EXAMPLE_STARBOARD } from '#shared/core/example-wing.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';

const terms = { root: 20, tip: 500, uOf: { port: 0.04, starboard: 0.04 } };
const heavier = (by: number) => ({ ...EXAMPLE_PORT, mass: 10 + by });

describe('port against starboard', () => {
  it('is matched within what the scale can tell apart, and not beyond', () => {
    // Two readings of 0.04 g each: 2·√(0.04² + 0.04²) = 0.113 g.
    expect(matchPanels([heavier(0.11), EXAMPLE_STARBOARD], terms).matched).toBe(true);
    expect(matchPanels([heavier(0.12), EXAMPLE_STARBOARD], terms).matched).toBe(false);
  });

  it('is not matched where masses are equal and the moments are not', () => {
    const out = { ...EXAMPLE_PORT, at: [50, -270, 0] as [number, number, number] };
    const match = matchPanels([out, EXAMPLE_STARBOARD], terms);
    expect(match).toMatchObject({ byMass: 0, byRoll: 200, heavy: 'port', matched: false });
  });

  it('counts moments about the root rib and about the roll axis', () => {
    const { port } = matchPanels([EXAMPLE_PORT], terms);
    expect(port).toEqual({ mass: 10, u: 0.04, aboutRoot: 2300, aboutRoll: 2500 });
  });

  it('is levelled by the tip weight that it names, and by each sanding that it names', () => {
    fc.assert(
      fc.property(fc.integer({ min: -1400, max: 1400 }), (milligrams) => {
        const by = milligrams / 1000;
        const { heavy, byRoll, tipWeight, sanding } = matchPanels([heavier(by), EXAMPLE_STARBOARD], terms);
        expect(heavy).toBe(by === 0 ? null : by > 0 ? 'port' : 'starboard');
        expectNearly((tipWeight ?? 0) * 500, byRoll, ROUNDING);
        for (const { takeOff, share } of sanding) {
          expectNearly(takeOff * 250, byRoll, ROUNDING);
          expect(share).toBeLessThanOrEqual(0.15);
        }
      }),
    );
  });

  it('names no sanding where a part has not enough to give', () => {
    expect(matchPanels([heavier(3), EXAMPLE_STARBOARD], terms).sanding).toEqual([]);
  });
});

describe('a reading', () => {
  it('doubts the step of the scale for reading and zero even when repeats agree', () => {
    expectNearly(readingOf({ values: [5, 5, 5], tare: 0, resolution: 0.1 })?.u, 0.1 / Math.sqrt(6), ROUNDING);
  });

  it('adds the scatter of repeats', () => {
    // s = 0.1 of three: mean’s variance 0.01/3; the steps 2·(0.01)²/12.
    const reading = readingOf({ values: [5, 5.1, 4.9], tare: 1, resolution: 0.01 });
    expectNearly(reading?.mass, 4, ROUNDING);
    expectNearly(reading?.u, Math.sqrt(0.01 / 3 + 2e-4 / 12), ROUNDING);
  });
});

describe('why a part ran over', () => {
  it('lays a difference to density, then to thickness, and the rest to what was not measured', () => {
    const over = overrunOf(
      { estimated: 10, measured: 13, u: 0.02 },
      { density: 1.1, thickness: 1.1, cv: 0.1 },
    );
    expectNearly(over.density, 1, ROUNDING);
    expectNearly(over.thickness, 1.1, ROUNDING);
    expectNearly(over.rest, 0.9, ROUNDING);
    expect(over.likely).toBe('more_than_spread');
    expectNearly((over.density ?? 0) + (over.thickness ?? 0) + over.rest, over.over, ROUNDING);
  });

  it('calls usual what the spread of the wood explains, and nothing at all what a scale cannot see', () => {
    const causes = { density: null, thickness: null, cv: 0.1 };
    expect(overrunOf({ estimated: 10, measured: 11.5, u: 0.02 }, causes).likely).toBe('within_spread');
    expect(overrunOf({ estimated: 10, measured: 12.5, u: 0.02 }, causes).likely).toBe('more_than_spread');
    expect(overrunOf({ estimated: 10, measured: 10.05, u: 0.04 }, causes).likely).toBe('explained');
  });
});
