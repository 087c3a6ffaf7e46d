import { polygonArea } from 'd3-polygon';
import { describe, expect, it } from 'vitest';
import { developedAt } from '#shared/core/fit.ts';
import { webRoom } from '#shared/core/parts/web.ts';
import { ribArea } from '#shared/core/parts/ribs.ts';
import type { Part, SectionSpec, Strip, Surface } from '#shared/core/plan.ts';
import { areaBetween } from '#shared/core/section-integrals.ts';
import { stationAt, surfaceLine } from '#shared/core/stations.ts';
import { contourOf, distanceTo } from '#shared/drawing/contour.ts';
import { sectionView } from '#shared/drawing/section-view.ts';
import type { Point, Shape, ShapeKind } from '#shared/drawing/shape.ts';
import { layOut } from '#shared/drawing/surface-view.ts';
import { expectNearly, ROUNDING } from '#tests/support/nearly.ts';
import { MATERIALS, wingOf } from '#tests/support/plans.ts';

/** Straight lines between 200 nodes cut this much off a curved section; the calculator extrapolates it away. */
const CORNERED = 3e-4;

const areaOf = ({ points }: Pick<Shape, 'points'>) => Math.abs(polygonArea(points.map(([x, z]) => [x, z])));
const withSection = (spec: SectionSpec, parts: Part[]): Surface =>
  wingOf(parts, { panels: [{ ...wingOf([]).panels[0]!, rootSection: spec, tipSection: spec }] });
const drawn = (surface: Surface, s: number, kind: ShapeKind) =>
  sectionView(surface, s, MATERIALS).shapes.filter((shape) => shape.kind === kind);

const ribs: Part = {
  id: 'ribs',
  name: 'Ribs',
  kind: 'ribs',
  material: 'balsa',
  stations: [100, 300],
  thickness: 2,
  lightening: 0,
};
const spar = (changes: Partial<Strip> = {}): Strip => ({
  id: 'spar',
  name: 'Spar',
  kind: 'strip',
  material: 'balsa',
  from: 0,
  to: 500,
  seat: 'top',
  at: [0.3, 0.3],
  width: [7, 7],
  height: [3, 3],
  profile: 'rectangle',
  letIn: true,
  ...changes,
});
const sheeting: Part = {
  id: 'nose',
  name: 'Nose',
  kind: 'skin',
  material: 'balsa',
  from: 0,
  to: 500,
  start: 0.35,
  end: 0.35,
  seat: 'wrap',
  thickness: 1,
};

describe('a section drawn', () => {
  it('has the area that the calculator integrates', () => {
    for (const naca of ['0012', '4409', '6409']) {
      const surface = withSection({ naca }, []);
      const station = stationAt(surfaceLine(surface), 211);
      const [outline] = drawn(surface, 211, 'outline');
      expectNearly(areaOf(outline!), areaBetween(station.section, 0, 1).amount * 200 ** 2, CORNERED);
    }
  });

  it('of a plate is a rectangle of its thickness', () => {
    const surface = withSection({ flat: 3 }, []);
    const [outline] = drawn(surface, 0, 'outline');
    expectNearly(areaOf(outline!), 600, ROUNDING);
    expect(sectionView(surface, 0, MATERIALS)).toMatchObject({ chord: 200, thickness: 3, rib: null });
  });

  it('says where it is thickest', () => {
    const { thickness, thicknessAt } = sectionView(withSection({ naca: '0012' }, []), 0, MATERIALS);
    // NACA Report 460: 12 % of the chord at 30 %; nodes lie within half a per cent of the chord
    expectNearly(thickness, 24, 1e-3);
    expect(thicknessAt).toBeCloseTo(0.3, 1);
  });

  it('shows a rib only where one stands', () => {
    const surface = withSection({ naca: '4409' }, [ribs]);
    expect(sectionView(surface, 300.9, MATERIALS).rib).toBe('wing/ribs');
    expect(sectionView(surface, 301.1, MATERIALS).rib).toBeNull();
    expect(drawn(surface, 200, 'ribs')).toEqual([]);
  });
});

describe('strips in the section', () => {
  it('sit in notches of the size and at the place that the rib loses', () => {
    for (const seat of ['top', 'bottom', 'middle'] as const) {
      const [plain, notched] = [
        withSection({ naca: '4409' }, [ribs]),
        withSection({ naca: '4409' }, [ribs, spar({ seat })]),
      ];
      const [notch] = drawn(notched, 100, 'notch');
      const station = stationAt(surfaceLine(plain), 100);
      const before = ribArea(layOut(plain, 'starboard'), station);
      const after = ribArea(layOut(notched, 'starboard'), station);
      const [xs, zs] = [notch!.points.map(([x]) => x), notch!.points.map(([, z]) => z)];
      const centre = (v: number[]) => (Math.min(...v) + Math.max(...v)) / 2;
      expectNearly(areaOf(notch!), 21, ROUNDING);
      expectNearly(before.amount - after.amount, 21, ROUNDING);
      expectNearly(centre(xs), (before.x - after.x) / 21, ROUNDING);
      expectNearly(centre(zs), (before.z - after.z) / 21, ROUNDING);
    }
  });

  it('need no notch between ribs, or where they only lie on them', () => {
    expect(drawn(withSection({ naca: '4409' }, [ribs, spar()]), 200, 'notch')).toEqual([]);
    expect(drawn(withSection({ naca: '4409' }, [ribs, spar({ letIn: false })]), 100, 'notch')).toEqual([]);
  });

  it('have the cross-section that is weighed', () => {
    const area = (changes: Partial<Strip>) =>
      areaOf(drawn(withSection({ naca: '4409' }, [spar(changes)]), 50, 'strip')[0]!);
    expectNearly(area({ profile: 'rectangle' }), 21, ROUNDING);
    expectNearly(area({ profile: 'triangle' }), 10.5, ROUNDING);
    // a 32-sided ellipse holds sin(2π/32)/(2π/32) of the round one
    const sided = Math.sin(Math.PI / 16) / (Math.PI / 16);
    expectNearly(area({ profile: 'round' }), (Math.PI / 4) * 21 * sided, ROUNDING);
    const [tube] = drawn(withSection({ naca: '4409' }, [spar({ profile: 'tube', wall: 0.5 })]), 50, 'strip');
    expectNearly(areaOf({ points: tube!.hole! }), (Math.PI / 4) * 6 * 2 * sided, ROUNDING);
  });

  it('of the nose are sanded to the section, with the stock dashed round them', () => {
    const surface = withSection({ naca: '4409' }, [
      { ...spar({ seat: 'nose', width: [6, 6], height: [9, 9] }), at: undefined, letIn: undefined },
    ]);
    const [strip] = drawn(surface, 0, 'strip');
    const [stock] = drawn(surface, 0, 'stock');
    const { section } = stationAt(surfaceLine(surface), 0);
    expectNearly(areaOf(stock!), 54, ROUNDING);
    expect(stock?.hidden).toBe(true);
    // the stock is higher than the nose, so what is left is the section's own first 6 mm; 24 steps round the nose
    expectNearly(areaOf(strip!), areaBetween(section, 0, 6 / 200).amount * 200 ** 2, 2e-2);
    expect(areaOf(strip!)).toBeLessThan(54);
  });
});

describe('sheeting in the section', () => {
  it('is a strip of true thickness along the contour', () => {
    const surface = withSection({ naca: '4409' }, [sheeting]);
    const [skin] = drawn(surface, 100, 'skin');
    const { amount } = developedAt(
      { seat: 'wrap', start: 0.35, end: 0.35 },
      stationAt(surfaceLine(surface), 100),
    );
    // Steiner: a parallel strip inside a line that turns by θ has area L·t − t²·θ/2
    const turn = turning(skin!.points.slice(0, skin!.points.length / 2));
    expectNearly(areaOf(skin!), amount - turn / 2, 2e-3);
  });

  it('leaves no loops inside a nose that is sharper than it is thick', () => {
    const surface = withSection({ naca: '0004' }, [{ ...sheeting, thickness: 2 }]);
    const [skin] = drawn(surface, 100, 'skin');
    const contour = contourOf(stationAt(surfaceLine(surface), 100));
    const depth = (p: Point) =>
      Math.min(...contour.slice(1).map((q, i) => distanceTo(p, contour[i] ?? q, q)));
    const inner = (skin?.points ?? []).map(depth).filter((d) => d > 1e-9);
    expect(inner.length).toBeGreaterThan(50);
    // a mitred corner of the contour lies deeper than its sides, never less deep
    expect(Math.min(...inner)).toBeGreaterThan(2 * 0.99);
  });

  it('carries the spars under it', () => {
    const bare = drawn(withSection({ naca: '4409' }, [spar()]), 200, 'strip')[0]!;
    const under = drawn(withSection({ naca: '4409' }, [spar(), sheeting]), 200, 'strip')[0]!;
    expect(under.points).toEqual(bare.points.map(([x, z]) => [x, expect.closeTo(z - 1, 9) as number]));
  });
});

describe('a shear web in the section', () => {
  const web: Part = {
    id: 'web',
    name: 'Web',
    kind: 'web',
    material: 'balsa',
    from: 0,
    to: 500,
    at: [0.3, 0.3],
    thickness: 1.5,
  };
  const parts = [ribs, spar(), spar({ id: 'lower', seat: 'bottom' }), sheeting, web];

  it('stands between the spars, as high as is computed', () => {
    const surface = withSection({ naca: '4409' }, parts);
    const [piece, ...rest] = drawn(surface, 200, 'web');
    const half = layOut(surface, 'starboard');
    expect(rest).toEqual([]);
    expectNearly(areaOf(piece!) / 1.5, webRoom(half, web, stationAt(half.line, 200)).height, ROUNDING);
  });

  it('is parted by a strip through its middle', () => {
    const surface = withSection({ naca: '4409' }, [
      ...parts,
      spar({ id: 'rod', seat: 'middle', width: [2, 2], height: [2, 2] }),
    ]);
    const half = layOut(surface, 'starboard');
    const pieces = drawn(surface, 200, 'web');
    expect(pieces).toHaveLength(2);
    const height = pieces.reduce((sum, piece) => sum + areaOf(piece) / 1.5, 0);
    expectNearly(height, webRoom(half, web, stationAt(half.line, 200)).height, ROUNDING);
  });

  it('is dashed where a rib stands in its place', () => {
    const surface = withSection({ naca: '4409' }, parts);
    expect(drawn(surface, 100, 'web').map((shape) => shape.hidden)).toEqual([true]);
    expect(drawn(surface, 200, 'web').map((shape) => shape.hidden)).toEqual([false]);
  });
});

/** Sum of the angles by which a line turns, radians. */
function turning(points: Shape['points']): number {
  let total = 0;
  for (let i = 2; i < points.length; i++) {
    const [a, b, c] = [points[i - 2]!, points[i - 1]!, points[i]!];
    const before = Math.atan2(b[1] - a[1], b[0] - a[0]);
    const after = Math.atan2(c[1] - b[1], c[0] - b[0]);
    total += Math.abs(Math.atan2(Math.sin(after - before), Math.cos(after - before)));
  }
  return total;
}
