import { describe, expect, test } from 'vitest';
import table from '#data/materials.json';
import { estimate } from '#shared/core/estimate.ts';
import type { Part, Plan, PlanMaterial, Strip } from '#shared/core/plan.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { convert } from '#shared/units/units.ts';
import { panel, plainPlan, surface } from './plans.ts';
import { expectNear } from './tolerance.ts';

/**
 * Common practice, no source: a half wing of 31 in, 30 in of it panel and 1 in tip cap, chord 7 in to 5 in, built
 * as such wings are. Its bare mass is judged by what builders find on the scale.
 */
const inch = (value: number) => convert(value, 'in', 'mm');
const SPAN = inch(30);
const SIXTEENTH = inch(1 / 16);
const RIBS = 12;
/** Half wings of that size in light wood come out between these, g. */
const BELIEVABLE = { from: 20, to: 35 };

const snapshot = (key: string): PlanMaterial => {
  const row = table.materials.find((material) => material.key === key);
  if (!row?.density) throw new Error(key);
  return { name: row.name, category: 'wood', density: row.density, cv: row.cv };
};

function stringer(id: string, at: number, seat: 'top' | 'bottom', letIn: boolean): Strip {
  const size: [number, number] = [SIXTEENTH, SIXTEENTH];
  const place = { from: 0, to: SPAN, at: [at, at] as [number, number], seat, width: size, height: size };
  return { kind: 'strip', id, name: 'Stringer', material: 'medium', profile: 'rectangle', letIn, ...place };
}

function halfWing(letIn: boolean): Plan {
  const spar = (id: string, seat: 'top' | 'bottom'): Part => ({
    ...stringer(id, 0.28, seat, letIn),
    name: `Spar, ${seat}`,
    material: 'hard',
    width: [inch(1 / 4), inch(1 / 4)],
    height: [inch(1 / 8), inch(1 / 8)],
  });
  const parts: Part[] = [
    {
      kind: 'ribs',
      id: 'ribs',
      name: 'Ribs',
      material: 'light',
      from: 0,
      to: SPAN,
      count: RIBS,
      thickness: SIXTEENTH,
      lightening: 0,
    },
    spar('spar-top', 'top'),
    spar('spar-bottom', 'bottom'),
    stringer('stringer-1', 0.45, 'top', letIn),
    stringer('stringer-2', 0.65, 'top', letIn),
    stringer('stringer-3', 0.45, 'bottom', letIn),
    stringer('stringer-4', 0.65, 'bottom', letIn),
    {
      kind: 'skin',
      id: 'sheeting',
      name: 'Nose sheeting',
      material: 'light',
      from: 0,
      to: SPAN,
      start: 0.3,
      end: 0.3,
      seat: 'wrap',
      thickness: SIXTEENTH,
    },
    { kind: 'tipBlock', id: 'tip', name: 'Tip cap', material: 'light', length: inch(1), hollow: 0 },
  ];
  const section = { naca: '2412' };
  const shape = panel({
    span: SPAN,
    rootChord: inch(7),
    tipChord: inch(5),
    sweep: inch(0.5),
    rootSection: section,
    tipSection: section,
  });
  const materials = {
    light: snapshot('balsa-light'),
    medium: snapshot('balsa-medium'),
    hard: snapshot('balsa-medium-hard'),
  };
  return plainPlan({ materials, surfaces: [surface([shape], parts, { mirrored: false })] });
}

const notched = estimate(halfWing(true));
const line = (result: typeof notched, id: string) => {
  const found = result.lines.find((row) => row.id === `wing/${id}`);
  if (!found) throw new Error(id);
  return found;
};

describe('a half wing of 31 in (common practice, no source)', () => {
  test('is a plan that the schema takes', () => {
    expect(planSchema.safeParse(halfWing(true)).error).toBeUndefined();
  });

  test('has every part on its sheet, each with a mass, and twelve ribs', () => {
    expect(notched.lines.map((row) => row.id)).toEqual(
      [
        'ribs',
        'spar-top',
        'spar-bottom',
        'stringer-1',
        'stringer-2',
        'stringer-3',
        'stringer-4',
        'sheeting',
        'tip',
      ].map((id) => `wing/${id}`),
    );
    for (const row of notched.lines) expect(row.mass, row.id).toBeGreaterThan(0.1);
    expect(line(notched, 'ribs').pieces).toBe(RIBS);
    expect(notched.planform['wing']?.span).toBeCloseTo(inch(31), 9);
  });

  test('is told nothing but what a bare wing on its own lacks: a tailplane, and the weight to fly fast enough', () => {
    expect(notched.notices.map((notice) => notice.code)).toEqual(['no_tailplane', 'reynolds_low']);
  });

  test('its ribs lose exactly the notches of four stringers and two spars', () => {
    const whole = estimate(halfWing(false));
    const notchArea = 4 * SIXTEENTH ** 2 + 2 * inch(1 / 4) * inch(1 / 8);
    const lost = line(whole, 'ribs').mass - line(notched, 'ribs').mass;
    expectNear(lost, RIBS * notchArea * SIXTEENTH * 112e-6, 1e-10);
    for (const row of whole.lines.filter(({ id }) => id !== 'wing/ribs')) {
      expect(row.mass, row.id).toBe(notched.lines.find(({ id }) => id === row.id)?.mass);
    }
  });

  test('the sheeting over them comes off the ribs as well', () => {
    const plan = halfWing(true);
    const bare = plan.surfaces.map((wing) => ({
      ...wing,
      parts: wing.parts.filter((part) => part.id !== 'sheeting'),
    }));
    const uncovered = line(estimate({ ...plan, surfaces: bare }), 'ribs').mass;
    // Mean developed length 0.6346 of the chord (four-digit section 2412, cut at 30 %) under a sixteenth of light balsa.
    const underSheet = 0.6346 * inch(6) * SIXTEENTH * RIBS * SIXTEENTH * 112e-6;
    expectNear(uncovered - line(notched, 'ribs').mass, underSheet, 1e-3);
  });

  test('weighs what a builder would believe, most of it in the sheeting', () => {
    expect(notched.totals.mass).toBeGreaterThan(BELIEVABLE.from);
    expect(notched.totals.mass).toBeLessThan(BELIEVABLE.to);
    const heaviest = notched.lines.toSorted((a, b) => b.mass - a.mass)[0];
    expect(heaviest?.id).toBe('wing/sheeting');
    expectNear(
      notched.lines.reduce((sum, row) => sum + row.mass, 0),
      notched.totals.mass,
      1e-13,
    );
  });

  test('balances a little before the middle of the chord and about half way out, the tip cap counting', () => {
    expect(notched.balance.percentMac).toBeGreaterThan(25);
    expect(notched.balance.percentMac).toBeLessThan(40);
    expect(notched.totals.at?.[1]).toBeGreaterThan(0.45 * SPAN);
    expect(notched.totals.at?.[1]).toBeLessThan(0.55 * SPAN);
  });
});
