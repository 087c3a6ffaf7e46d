import { polygonArea } from 'd3-polygon';
import { describe, expect, it } from 'vitest';
import { ribExtent } from '#shared/core/half.ts';
import type { Part, Surface } from '#shared/core/plan.ts';
import { planformOf } from '#shared/core/planform.ts';
import { samplesOver, stationAt, surfaceLine } from '#shared/core/stations.ts';
import { TIP_STEPS } from '#shared/drawing/outline.ts';
import { planView } from '#shared/drawing/plan-view.ts';
import type { Shape } from '#shared/drawing/shape.ts';
import { layOut, surfaceShapes } from '#shared/drawing/surface-view.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { DEMO_NAMES, demoPlan, MATERIALS, planOf, wingOf } from '#tests/support/plans.ts';

const areaOf = (shape: Pick<Shape, 'points'>) => Math.abs(polygonArea(shape.points.map(([x, y]) => [x, y])));
const sum = (shapes: readonly Shape[]) => shapes.reduce((total, shape) => total + areaOf(shape), 0);
/** A quarter turn drawn in n chords holds sin(δ)/δ of the ellipse's area, δ = 90°/n. */
const STEP = Math.PI / 2 / TIP_STEPS;
const INSCRIBED = Math.sin(STEP) / STEP;

/** A cranked, swept, tapered wing whose breaks fall on no round figure. */
const cranked = (parts: Part[]): Surface =>
  wingOf(parts, {
    apex: [7, 11, 3],
    panels: [
      {
        span: 311,
        rootChord: 173,
        tipChord: 151,
        sweep: 13,
        dihedral: 5,
        rootSection: { naca: '4409' },
        tipSection: { naca: '4409' },
      },
      {
        span: 197,
        rootChord: 151,
        tipChord: 83,
        sweep: 41,
        dihedral: 17,
        rootSection: { naca: '4409' },
        tipSection: { naca: '2408' },
      },
    ],
  });
const onBoard = (part: Part) =>
  surfaceShapes(cranked([part]), MATERIALS, 'board', ['starboard']).filter((shape) => shape.line !== null);
/** ∫ of a width along the span, as the calculator samples it. */
const integral = (from: number, to: number, width: (s: number, chord: number) => number) =>
  samplesOver(surfaceLine(cranked([])), from, to).reduce(
    (total, { station, ds }) => total + width(station.s, station.chord) * ds,
    0,
  );

describe('the planform drawn', () => {
  it.each(DEMO_NAMES)('of %s has the area that is computed, seen from above and on the board', (name) => {
    const plan = demoPlan(name);
    for (const surface of plan.surfaces.filter((s) => s.role !== 'fin')) {
      const bare = { ...surface, parts: surface.parts.filter((part) => part.kind !== 'tipBlock') };
      const { areaProjected, areaDeveloped } = planformOf(bare);
      const outline = (view: 'above' | 'board') =>
        surfaceShapes(bare, plan.materials, view).filter((shape) => shape.kind === 'outline');
      expectNearly(sum(outline('above')), areaProjected, ROUNDING);
      expectNearly(sum(outline('board')), areaDeveloped, ROUNDING);
    }
  });

  it('takes in a tip block as half an ellipse, short only of what its chords cut off', () => {
    const tip: Part = { id: 'tip', name: 'Tip', kind: 'tipBlock', material: 'balsa', length: 37, hollow: 0 };
    const [bare, tipped] = [cranked([]), cranked([tip])];
    const block = planformOf(tipped).areaDeveloped - planformOf(bare).areaDeveloped;
    const shapes = surfaceShapes(tipped, MATERIALS, 'board');
    expectNearly(sum(shapes.filter((shape) => shape.kind === 'tipBlock')), block * INSCRIBED, ROUNDING);
    const whole = planformOf(bare).areaDeveloped + block * INSCRIBED;
    expectNearly(sum(shapes.filter((shape) => shape.kind === 'outline')), whole, ROUNDING);
  });

  it('keeps a step in the chord as a step, without losing area', () => {
    const stepped = wingOf([], {
      panels: [100, 130].map((chord) => ({
        ...wingOf([]).panels[0]!,
        rootChord: chord,
        tipChord: chord,
        span: 200,
      })),
    });
    const [outline] = surfaceShapes(stepped, MATERIALS, 'board', ['starboard']).filter(
      (s) => s.kind === 'outline',
    );
    // 200 mm × 100 mm + 200 mm × 130 mm
    expectNearly(areaOf(outline!), 46_000, ROUNDING);
  });

  it('mirrors the port half in the plane of symmetry', () => {
    const [starboard, port] = planView(planOf([cranked([])])).filter((shape) => shape.kind === 'outline');
    expect(port?.points).toEqual(starboard?.points.map(([x, y]) => [x, -y]));
    expect(
      planView(planOf([cranked([])]), { half: 'starboard' }).filter((s) => s.kind === 'outline'),
    ).toHaveLength(1);
  });

  it('shows a fin from above by its sections, not as a line without width', () => {
    const fin = wingOf([], {
      role: 'fin',
      mirrored: false,
      panels: [{ ...wingOf([]).panels[0]!, dihedral: 90, rootSection: { flat: 4 }, tipSection: { flat: 4 } }],
    });
    const shapes = planView(planOf([fin]));
    expect(shapes).toHaveLength(2);
    // 200 mm of chord, 4 mm thick
    for (const shape of shapes) expectNearly(areaOf(shape), 800, ROUNDING);
  });
});

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
