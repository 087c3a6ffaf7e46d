import { describe, expect, it } from 'vitest';
import { ribExtent } from '#shared/core/half.ts';
import type { Part } from '#shared/core/plan.ts';
import { planformOf } from '#shared/core/planform.ts';
import { samplesOver, stationAt, surfaceLine } from '#shared/core/stations.ts';
import { layOut, surfaceShapes } from '#shared/drawing/surface-view.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { MATERIALS } from '#tests/support/plans.ts';
import { areaOf, cranked } from './shapes.ts';

const onBoard = (part: Part) =>
  surfaceShapes(cranked([part]), MATERIALS, 'board', ['starboard']).filter((shape) => shape.line !== null);
/** ∫ of a width along the span, as the calculator samples it. */
const integral = (from: number, to: number, width: (s: number, chord: number) => number) =>
  samplesOver(surfaceLine(cranked([])), from, to).reduce(
    (total, { station, ds }) => total + width(station.s, station.chord) * ds,
    0,
  );

describe('parts in the plan', () => {
  it('draws a strip that tapers, skews and crosses a break as wide as it is', () => {
    const [strip] = onBoard({
      id: 'spar',
      name: 'Spar',
      kind: 'strip',
      material: 'balsa',
      from: 23,
      to: 491,
      seat: 'top',
      at: [0.31, 0.42],
      width: [7, 3],
      height: [3, 2],
      profile: 'rectangle',
      letIn: true,
    });
    expectNearly(
      areaOf(strip!),
      integral(23, 491, (s) => 7 + ((3 - 7) * (s - 23)) / (491 - 23)),
      ROUNDING,
    );
  });

  it('lays a nose strip on the leading edge and a tail strip on the trailing edge', () => {
    const edge = (seat: 'nose' | 'tail'): Part => ({
      id: seat,
      name: seat,
      kind: 'strip',
      material: 'balsa',
      from: 0,
      to: 508,
      seat,
      width: [5, 3],
      height: [5, 3],
      profile: 'rectangle',
    });
    const tip = stationAt(surfaceLine(cranked([])), 508);
    const ends = (seat: 'nose' | 'tail') =>
      onBoard(edge(seat))[0]!
        .points.filter(([, s]) => s === 508)
        .map(([x]) => x);
    expect(Math.min(...ends('nose'))).toBeCloseTo(tip.leadingEdge, 9);
    expect(Math.max(...ends('tail'))).toBeCloseTo(tip.leadingEdge + tip.chord, 9);
  });

  it('draws ribs in their true thickness between the edges', () => {
    const ribs: Part = {
      id: 'ribs',
      name: 'Ribs',
      kind: 'ribs',
      material: 'balsa',
      stations: [50, 311, 480],
      thickness: 1.6,
      lightening: 0,
    };
    const nose: Part = {
      id: 'nose',
      name: 'Nose',
      kind: 'strip',
      material: 'balsa',
      from: 0,
      to: 508,
      seat: 'nose',
      width: [5, 3],
      height: [5, 3],
      profile: 'rectangle',
    };
    const surface = cranked([ribs, nose]);
    const drawn = surfaceShapes(surface, MATERIALS, 'board', ['starboard']).filter((s) => s.kind === 'ribs');
    const half = layOut(surface, 'starboard');
    const expected = half.ribs[0]!.stations.map((station) => {
      const [from, to] = ribExtent(half, station);
      return (to - from) * station.chord * 1.6;
    });
    expect(drawn.map((s) => s.line)).toEqual(['wing/ribs', 'wing/ribs', 'wing/ribs']);
    drawn.forEach((shape, i) => expectNearly(areaOf(shape), expected[i]!, ROUNDING));
  });

  it('draws sheeting as wide as it covers, the underside dashed beneath the top', () => {
    const shapes = onBoard({
      id: 'skin',
      name: 'Sheeting',
      kind: 'skin',
      material: 'balsa',
      from: 0,
      to: 508,
      start: 0.3,
      end: 0.22,
      seat: 'wrap',
      thickness: 1,
    });
    expect(shapes.map((shape) => shape.hidden)).toEqual([true, false]);
    expectNearly(
      areaOf(shapes[0]!),
      integral(0, 508, (_, chord) => 0.22 * chord),
      ROUNDING,
    );
    expectNearly(
      areaOf(shapes[1]!),
      integral(0, 508, (_, chord) => 0.3 * chord),
      ROUNDING,
    );
  });

  it('draws a plate tail over its whole planform', () => {
    const [sheet] = onBoard({
      id: 'sheet',
      name: 'Sheet',
      kind: 'sheet',
      material: 'balsa',
      thickness: 3,
      cutout: 0,
    });
    expectNearly(areaOf(sheet!), planformOf(cranked([])).areaDeveloped / 2, ROUNDING);
  });

  it('lays cap strips over the ribs in their range only', () => {
    const ribs: Part = {
      id: 'ribs',
      name: 'Ribs',
      kind: 'ribs',
      material: 'balsa',
      stations: [50, 150, 400],
      thickness: 1.6,
      lightening: 0,
    };
    const caps: Part = {
      id: 'caps',
      name: 'Caps',
      kind: 'capStrips',
      material: 'balsa',
      from: 100,
      to: 508,
      start: 0.3,
      end: 0.9,
      seat: 'both',
      width: 5,
      thickness: 1,
    };
    const shapes = surfaceShapes(cranked([ribs, caps]), MATERIALS, 'board', ['starboard']).filter(
      (s) => s.kind === 'capStrips',
    );
    const chords = [150, 400].map((s) => stationAt(surfaceLine(cranked([])), s).chord);
    expect(shapes).toHaveLength(2);
    shapes.forEach((shape, i) => expectNearly(areaOf(shape), 0.6 * chords[i]! * 5, ROUNDING));
  });

  it('leaves a part of one side off the other', () => {
    const part: Part = {
      id: 'skin',
      name: 'Patch',
      kind: 'skin',
      material: 'balsa',
      from: 0,
      to: 100,
      start: 0.1,
      end: 0.3,
      seat: 'top',
      thickness: 1,
      side: 'port',
    };
    const drawn = surfaceShapes(cranked([part]), MATERIALS, 'board').filter((shape) => shape.line !== null);
    expect(drawn).toHaveLength(1);
    expect(drawn[0]?.points.every(([, s]) => s <= 0)).toBe(true);
  });
});
