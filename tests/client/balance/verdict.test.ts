import { describe, expect, it } from 'vitest';
import { spareBallast, withBallast, withLess } from '#client/features/balance/ballast-edit.ts';
import { verdictOf } from '#client/features/balance/verdict.ts';
import { beamOf } from '#shared/core/beam.ts';
import { estimate } from '#shared/core/estimate.ts';
import type { Item, Plan } from '#shared/core/plan.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import { USUAL_UNITS } from '#shared/format/units.ts';

/** A wing of 100 mm chord without wood, so that items alone decide: 100 % MAC is 100 mm. */
function plan(items: Partial<Item>[], target?: Plan['target']): Plan {
  const section = { flat: 2 };
  const panel = { span: 300, rootChord: 100, tipChord: 100, sweep: 0, dihedral: 0 };
  const wing = { ...panel, rootSection: section, tipSection: section };
  return {
    version: 1,
    name: 'Plate',
    materials: {},
    surfaces: [{ key: 'wing', role: 'wing', apex: [0, 0, 0], mirrored: true, panels: [wing], parts: [] }],
    items: items.map((item, i) => ({
      id: `i${i}`,
      name: 'Lead',
      group: 'gear',
      mass: 10,
      at: [0, 0, 0],
      ...item,
    })),
    solids: [],
    target,
  };
}

function verdict(of: Plan, nose = -100) {
  const result = estimate(of);
  return verdictOf(of, result, beamOf(result, wingReference(of), of.target), nose, USUAL_UNITS);
}

describe('verdictOf', () => {
  const target = { percentMac: 40, tolerance: 2 };

  it('says how far behind and what to put at the nose', () => {
    // 100 g at 50 mm, wanted at 40: 100·10/140 = 7.14 g at −100 mm.
    const found = verdict(plan([{ mass: 100, at: [50, 0, 0] }], target));
    expect(found.kind).toBe('outside');
    expect(plain(found.headline)).toBe('10.0 mm behind the wanted balance point');
    expect(plain(found.advice)).toBe('Put 7.1 g at the nose (−100.0 mm) and it balances at 40.0 % MAC.');
    expect(plain(found.detail)).toBe('It balances at 50.0 % MAC; 38.0–42.0 % is asked for.');
  });

  it('takes ballast off a nose-heavy model, as much as puts it right', () => {
    // 100 g at 50 mm and 20 g at −100 mm balance at 25; without m of it at 40: (3000 + 100m)/(120 − m) = 40, m = 12.86.
    const items = [
      { mass: 100, at: [50, 0, 0] },
      { mass: 20, at: [-100, 0, 0], group: 'ballast' },
    ] satisfies Partial<Item>[];
    expect(plain(verdict(plan(items, target)).advice)).toBe(
      'Take 12.9 g of the ballast at −100.0 mm off and it balances at 40.0 % MAC.',
    );
  });

  it('sends gear aft where no ballast is there to come off, or not enough', () => {
    expect(verdict(plan([{ at: [10, 0, 0] }], target)).advice).toContain('nose-heavy without any ballast');
    const short = [
      { mass: 100, at: [20, 0, 0] },
      { mass: 1, at: [-100, 0, 0], group: 'ballast' },
    ] satisfies Partial<Item>[];
    expect(plain(verdict(plan(short, target)).advice)).toBe(
      'Take the 1.0 g of the ballast at −100.0 mm off first; no piece of ballast alone is enough.',
    );
  });

  it('is inside to the very edge of the range, and close where doubt reaches over it', () => {
    expect(verdict(plan([{ mass: 100, at: [42, 0, 0] }], target)).kind).toBe('inside');
    const doubtful = [
      { mass: 100, at: [41.5, 0, 0] },
      { mass: 1, u: 5, at: [41.5 - 100, 0, 0] },
      { mass: 1, at: [141.5, 0, 0] },
    ] satisfies Partial<Item>[];
    expect(verdict(plan(doubtful, target)).kind).toBe('close');
  });

  it('asks for nothing where nothing is asked, and for parts where nothing has a mass', () => {
    expect(verdict(plan([{ at: [42, 0, 0] }])).kind).toBe('none');
    expect(verdict(plan([])).headline).toBe('Nothing has a mass yet');
  });
});

describe('spareBallast', () => {
  const lead = (id: string, mass: number, x: number): Item => ({
    id,
    name: id,
    group: 'ballast',
    mass,
    at: [x, 0, 0],
  });

  it('passes over a foremost piece that is not enough alone for one that is', () => {
    // 120 g at 25 mm, wanted at 40: 120·15/(40 + 90) = 13.8 g of the piece at −90 mm.
    const found = spareBallast([lead('small', 2, -100), lead('large', 20, -90)], 120, 25, 40);
    expect(found).toMatchObject({ item: { id: 'large' }, enough: true });
    expect(found?.takeOff).toBeCloseTo(1800 / 130, 9);
  });

  it('has none behind the wanted point, and no gear to spare', () => {
    expect(
      spareBallast([lead('aft', 20, 90), { ...lead('cell', 20, -90), group: 'gear' }], 120, 25, 40),
    ).toBeNull();
  });
});

describe('withBallast and withLess', () => {
  it('add a piece under a free id and take it away again', () => {
    const one = withBallast(plan([]), 'Nose ballast', 5, [-100, 0, 0]);
    const two = withBallast(one, 'Nose ballast', 3, [-100, 0, 0]);
    expect(two.items.map(({ id, group }) => [id, group])).toEqual([
      ['ballast', 'ballast'],
      ['ballast-2', 'ballast'],
    ]);
    expect(withLess(two, 'ballast', 2).items.map(({ mass }) => mass)).toEqual([3, 3]);
    expect(withLess(two, 'ballast', 5).items.map(({ id }) => id)).toEqual(['ballast-2']);
  });
});

/** Narrow and no-break spaces as plain ones. */
function plain(text: string | null): string | undefined {
  return text?.replace(/[\u202f\u00a0]/g, ' ');
}
