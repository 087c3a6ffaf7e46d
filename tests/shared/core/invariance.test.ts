import { describe, expect, it } from 'vitest';
import { estimate } from '#shared/core/estimate.ts';
import { expectNearly, ROUNDING, SAMPLED } from '#tests/support/nearly.ts';
import { moved, scaled, splitFirstPanel } from '#tests/support/plan-changes.ts';
import { DEMO_NAMES, demoPlan, lineOf } from '#tests/support/plans.ts';

describe.each(DEMO_NAMES)('%s', (name) => {
  const plan = demoPlan(name);
  const result = estimate(plan);

  it('moves every x with the datum, and nothing else', () => {
    const shifted = estimate(moved(plan, 137));
    result.lines.forEach((line, i) => {
      const other = shifted.lines[i];
      expectNearly(other?.mass, line.mass, ROUNDING);
      expectNearly(other?.at[0], line.at[0] + 137, ROUNDING);
      expectNearly(other?.at[1], line.at[1], ROUNDING);
      expectNearly(other?.at[2], line.at[2], ROUNDING);
    });
    expectNearly(shifted.balance.x, (result.balance.x ?? 0) + 137, ROUNDING);
    expectNearly(shifted.balance.u, result.balance.u ?? 0, ROUNDING);
    expectNearly(shifted.balance.percentMac, result.balance.percentMac ?? 0, ROUNDING);
    expectNearly(shifted.balance.neutralPoint, (result.balance.neutralPoint ?? 0) + 137, ROUNDING);
    expectNearly(shifted.balance.staticMargin, result.balance.staticMargin ?? 0, ROUNDING);
    expectNearly(shifted.totals.inertia?.yy, result.totals.inertia?.yy ?? 0, SAMPLED);
    expect(shifted.loading).toEqual(result.loading);
  });

  it('has eight times the volume when every length is doubled', () => {
    const double = estimate(scaled(plan, 2));
    for (const line of result.lines) {
      if (line.volume === null) continue;
      const twice = lineOf(double, line.id);
      expectNearly(twice.volume, line.volume * 8, SAMPLED);
      if (line.length !== null) expectNearly(twice.length, line.length * 2, SAMPLED);
      expectNearly(twice.at[0], line.at[0] * 2, SAMPLED);
    }
    for (const [key, planform] of Object.entries(result.planform)) {
      expectNearly(double.planform[key]?.mac, planform.mac * 2, ROUNDING);
      expectNearly(double.planform[key]?.areaDeveloped, planform.areaDeveloped * 4, ROUNDING);
    }
    expectNearly(
      double.balance.percentMac === null ? null : double.planform['wing']?.aspectRatio,
      result.planform['wing']?.aspectRatio ?? 0,
      ROUNDING,
    );
  });

  it('gives the same figures when a panel is split where nothing changes', () => {
    const split = estimate({ ...plan, surfaces: plan.surfaces.map(splitFirstPanel) });
    result.lines.forEach((line, i) => {
      expectNearly(split.lines[i]?.mass, line.mass, SAMPLED);
      expectNearly(split.lines[i]?.at[0], line.at[0], SAMPLED);
    });
    expectNearly(split.planform['wing']?.mac, result.planform['wing']?.mac ?? 0, ROUNDING);
    expectNearly(split.planform['wing']?.xLeMac, result.planform['wing']?.xLeMac ?? 0, ROUNDING);
  });

  it('weighs half when its wing is not mirrored', () => {
    const half = estimate({
      ...plan,
      surfaces: plan.surfaces.map((s) => ({ ...s, mirrored: false })),
    });
    for (const surface of plan.surfaces.filter((s) => s.mirrored)) {
      for (const part of surface.parts) {
        const id = `${surface.key}/${part.id}`;
        expectNearly(lineOf(half, id).mass * 2, lineOf(result, id).mass, ROUNDING);
        expectNearly(lineOf(half, id).at[0], lineOf(result, id).at[0], ROUNDING);
        expectNearly(lineOf(result, id).at[1], 0, ROUNDING);
        expect(lineOf(half, id).at[1]).toBeGreaterThan(0);
      }
    }
  });
});
