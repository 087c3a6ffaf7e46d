import { describe, expect, it } from 'vitest';
import { ribArea } from '#shared/core/parts/ribs.ts';
import type { Part } from '#shared/core/plan.ts';
import { stationAt } from '#shared/core/stations.ts';
import { notched } from '#shared/drawing/paper/notch.ts';
import { ribPattern } from '#shared/drawing/paper/rib-pattern.ts';
import { layOut } from '#shared/drawing/surface-view.ts';
import { DEMO_NAMES, demoPlan, wingOf } from '#tests/support/plans.ts';
import { areaOf } from '../shapes.ts';

const ribs: Part = {
  id: 'ribs',
  name: 'Ribs',
  kind: 'ribs',
  material: 'balsa',
  stations: [200],
  thickness: 2,
  lightening: 0.25,
};
const patternOf = (parts: Part[]) => {
  const half = layOut(wingOf([ribs, ...parts]), 'starboard');
  const station = stationAt(half.line, 200);
  const pattern = ribPattern(half, station, 0.25);
  if (!pattern) throw new Error('no pattern');
  return { pattern, net: ribArea(half, station).amount };
};

describe('the pattern of a rib', () => {
  // Skins are taken off square to the contour here, which turns round the nose, and by their outer arc there; a notch
  // under a cap strip is cut from what that has left here, and counted whole there.
  it.each(DEMO_NAMES)('of %s has the area that the calculator weighs, to two per cent', (name) => {
    for (const surface of demoPlan(name).surfaces) {
      const half = layOut(surface, 'starboard');
      for (const station of half.ribs.flatMap(({ stations }) => stations)) {
        const pattern = ribPattern(half, station, 0);
        const drawn = pattern ? areaOf({ points: pattern.outline }) : 0;
        const holes = pattern?.holes.reduce((sum, points) => sum + areaOf({ points }), 0) ?? 0;
        const { amount } = ribArea(half, station);
        expect(Math.abs(drawn - holes - amount), `${surface.key} at ${station.s}`).toBeLessThan(
          0.02 * amount,
        );
      }
    }
  });

  it('ends square at the strips of nose and tail', () => {
    const edge = { kind: 'strip', material: 'balsa', from: 0, to: 500, profile: 'rectangle' } as const;
    const { pattern } = patternOf([
      { ...edge, id: 'le', name: 'LE', seat: 'nose', width: [5, 5], height: [5, 5] },
      { ...edge, id: 'te', name: 'TE', seat: 'tail', width: [17, 17], height: [4, 4] },
    ]);
    const xs = pattern.outline.map(([x]) => x);
    expect(Math.min(...xs)).toBeCloseTo(5, 9);
    expect(Math.max(...xs)).toBeCloseTo(pattern.chord - 17, 9);
  });

  it('has a notch for each strip let in from outside, and a hole for one through its middle', () => {
    const strip = {
      kind: 'strip',
      material: 'balsa',
      from: 0,
      to: 500,
      width: [6, 6],
      height: [3, 3],
      letIn: true,
    } as const;
    const before = patternOf([]);
    const { pattern, net } = patternOf([
      { ...strip, id: 'a', name: 'A', seat: 'top', at: [0.3, 0.3], profile: 'rectangle' } as Part,
      { ...strip, id: 'b', name: 'B', seat: 'bottom', at: [0.3, 0.3], profile: 'rectangle' } as Part,
      { ...strip, id: 'c', name: 'C', seat: 'middle', at: [0.6, 0.6], profile: 'round' } as Part,
    ]);
    expect(pattern.holes).toHaveLength(1);
    // Both notches are 6 × 3 mm, square to the chord; the sliver over the slope of the section is the difference.
    const cut = areaOf({ points: before.pattern.outline }) - areaOf({ points: pattern.outline });
    expect(cut).toBeCloseTo(36, 0);
    expect(before.net - net).toBeCloseTo(54, 6);
  });

  it('shows what lightening takes out, of that very share', () => {
    const { pattern } = patternOf([]);
    expect(areaOf({ points: pattern.lightening }) / areaOf({ points: pattern.outline })).toBeCloseTo(0.25, 3);
  });

  it('is none where a strip of the nose meets one of the tail', () => {
    const half = layOut(
      wingOf([
        ribs,
        {
          id: 'le',
          name: 'LE',
          kind: 'strip',
          material: 'balsa',
          from: 0,
          to: 500,
          seat: 'nose',
          width: [400, 400],
          height: [5, 5],
          profile: 'rectangle',
        },
      ]),
      'starboard',
    );
    expect(ribPattern(half, stationAt(half.line, 200), 0)).toBeNull();
  });
});

describe('a notch', () => {
  const line = [
    [0, 10],
    [40, 10],
    [100, 10],
  ] as const;

  it('is cut square into a line, whichever way that runs', () => {
    const wanted = [
      [0, 10],
      [20, 10],
      [20, 7],
      [60, 7],
      [60, 10],
      [100, 10],
    ];
    expect(notched(line, 20, 60, 7)).toEqual(wanted);
    expect(notched([...line].reverse(), 20, 60, 7)).toEqual([...wanted].reverse());
  });

  it('begins on its floor where the line begins inside of it', () => {
    expect(notched(line, -5, 60, 7)).toEqual([
      [0, 7],
      [60, 7],
      [60, 10],
      [100, 10],
    ]);
  });

  it('is found from a corner of the line on', () => {
    expect(notched(line, 40, 60, 7)).toEqual([
      [0, 10],
      [40, 10],
      [40, 10],
      [40, 7],
      [60, 7],
      [60, 10],
      [100, 10],
    ]);
  });
});
