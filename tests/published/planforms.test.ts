import { describe, expect, test } from 'vitest';
import reference from '#data/reference/planforms.json';
import { planformOf } from '#shared/core/planform.ts';
import type { Panel } from '#shared/core/plan.ts';
import { stationAt, surfaceLine } from '#shared/core/stations.ts';
import { panel, surface } from './plans.ts';
import { expectNear, expectPrinted, NINE_DIGITS, SAME_SUM } from './tolerance.ts';

interface HalfWing {
  y: readonly number[];
  chord: readonly number[];
  leadingEdge: readonly number[];
}
const at = (list: readonly number[], i: number) => list[i] ?? Number.NaN;
const panelsOf = ({ y, chord, leadingEdge }: HalfWing): Panel[] =>
  y.slice(1).map((end, i) =>
    panel({
      span: end - at(y, i),
      rootChord: at(chord, i),
      tipChord: at(chord, i + 1),
      sweep: at(leadingEdge, i + 1) - at(leadingEdge, i),
    }),
  );
const wing = (id: string) => {
  const found = reference.wings.find((row) => row.id === id);
  if (!found) throw new Error(id);
  return found;
};
const straightTaper = (rootChord: number, tipChord: number, halfSpan: number) =>
  planformOf(surface([panel({ span: halfSpan, rootChord, tipChord })]));

/** Decimals that the reference gives of its exact values. */
const decimalsOf = (value: number) => (String(value).split('.')[1] ?? '').length;

describe('wings of one to three panels', () => {
  test.each(reference.wings)('$id: MAC $mac at $xLeMac aft, $yMac out ($source)', (row) => {
    const found = planformOf(surface(panelsOf(row)));
    expectNear(found.areaProjected, row.area, SAME_SUM);
    expectNear(found.areaDeveloped, row.area, SAME_SUM);
    for (const key of ['mac', 'xLeMac', 'yMac'] as const)
      expectPrinted(found[key], row[key], decimalsOf(row[key]), key);
    expectNear(found.span, 2 * Math.max(...row.y), SAME_SUM);
    expectNear(found.aspectRatio, (2 * Math.max(...row.y)) ** 2 / row.area, SAME_SUM);
  });

  test('on the cranked wing the MAC’s leading edge is not the leading edge where it lies', () => {
    const cranked = wing('cranked-glider');
    const laid = surface(panelsOf(cranked));
    const { xLeMac, yMac } = planformOf(laid);
    const local = stationAt(surfaceLine(laid), yMac).leadingEdge;
    expectPrinted(local, cranked.localLeadingEdge ?? Number.NaN, 3);
    expect(xLeMac - local).toBeGreaterThan(5);
  });

  test('splitting a panel in two changes nothing', () => {
    const whole = planformOf(surface(panelsOf(wing('one-piece'))));
    const split = planformOf(surface(panelsOf(wing('one-piece-split'))));
    for (const key of ['areaProjected', 'mac', 'xLeMac', 'yMac', 'span'] as const) {
      expectNear(split[key], whole[key], SAME_SUM, key);
    }
  });

  test('dihedral shortens the projected plan by its cosine and leaves the developed one', () => {
    const flat = panelsOf(wing('single-taper'));
    const raised = planformOf(surface(flat.map((p) => ({ ...p, dihedral: 60 }))));
    expectNear(raised.areaDeveloped, 160_000, SAME_SUM);
    expectNear(raised.areaProjected, 80_000, SAME_SUM);
    expectNear(raised.span, 500, SAME_SUM);
    expectNear(raised.mac, wing('single-taper').mac, NINE_DIGITS);
  });
});

describe('straight tapers', () => {
  const { rows, source } = reference.tapers;
  test.each(rows)(`taper $taper: MAC $mac, $yMac out (${source})`, ({ taper, mac, yMac }) => {
    const found = straightTaper(1, taper, 1);
    expectPrinted(found.mac, mac, 6);
    expectPrinted(found.yMac, yMac, 6);
  });

  test(`the centroid of a tapered panel (${reference.trapezoid.source})`, () => {
    const { rootChord, tipChord, span, area, yMac } = reference.trapezoid;
    const found = straightTaper(rootChord, tipChord, span);
    expectNear(found.areaProjected, 2 * area, SAME_SUM);
    expectPrinted(found.yMac, yMac.printed, yMac.decimals);
  });

  test.each(reference.aircraft)(
    '$id: chord, MAC and its place from area, span and taper ($source)',
    (row) => {
      const rootChord = (2 * row.area) / (row.span * (1 + row.taper));
      expectPrinted(rootChord, row.rootChord.printed, row.rootChord.decimals);
      const found = straightTaper(rootChord, row.taper * rootChord, row.span / 2);
      expectNear(found.areaProjected, row.area, SAME_SUM);
      expectPrinted(found.mac, row.mac.printed, row.mac.decimals);
      expectPrinted(found.yMac, row.yMac.printed, row.yMac.decimals);
      expectPrinted(found.aspectRatio, row.aspectRatio.printed, row.aspectRatio.decimals);
    },
  );

  test(`a centre section and two tapers (${reference.twoPiece.source})`, () => {
    const { etaRoot, etaBreak, taperBreak, taperTip, meanChord, macPerRootChord } = reference.twoPiece;
    const chords = {
      y: [0, etaRoot, etaBreak, 1],
      chord: [1, 1, taperBreak, taperTip],
      leadingEdge: [0, 0, 0, 0],
    };
    const found = planformOf(surface(panelsOf(chords)));
    expectNear(found.areaProjected / 2, meanChord, SAME_SUM);
    expectPrinted(found.mac, macPerRootChord, 6);
  });
});

describe(`ellipses (${reference.ellipse.source})`, () => {
  const { rootChord, halfSpan, area, mac, xLeMac, yMac, polygons, evenPanels } = reference.ellipse;
  /** Chords of the ellipse at these shares of the half span, threaded on a straight line at `share` of the chord. */
  const inscribed = (etas: number[], share = 0.5): HalfWing => {
    const chord = etas.map((eta) => rootChord * Math.sqrt(Math.max(0, 1 - eta ** 2)));
    return {
      y: etas.map((eta) => eta * halfSpan),
      chord,
      leadingEdge: chord.map((c) => (rootChord - c) * share),
    };
  };
  const cosineSteps = (n: number) =>
    Array.from({ length: n + 1 }, (_, i) => Math.sin((i * Math.PI) / (2 * n)));

  test.each(polygons)('cut into $panels panels with cosine steps', (row) => {
    const found = planformOf(surface(panelsOf(inscribed(cosineSteps(row.panels)))));
    expectPrinted(found.areaProjected, row.area, 3);
    expectPrinted(found.mac, row.mac, 6);
  });

  test('cut into even panels', () => {
    const etas = Array.from({ length: evenPanels.panels + 1 }, (_, i) => i / evenPanels.panels);
    const found = planformOf(surface(panelsOf(inscribed(etas))));
    expectPrinted(found.areaProjected, evenPanels.area, 3);
    expectPrinted(found.mac, evenPanels.mac, 6);
  });

  test('the more panels, the closer to the exact ellipse: 400 of them to five digits', () => {
    const found = planformOf(surface(panelsOf(inscribed(cosineSteps(400)))));
    for (const [key, exact] of Object.entries({ areaProjected: area, mac, xLeMac, yMac })) {
      expectNear(found[key as 'mac'], exact, 1e-5, key);
    }
  });

  test.each([0, 0.25, 0.5, 1])(
    'threaded on a straight line at %d of the chord, its MAC begins there too',
    (share) => {
      const found = planformOf(surface(panelsOf(inscribed(cosineSteps(400), share))));
      expect(found.xLeMac + share * found.mac).toBeCloseTo(share * rootChord, 9);
    },
  );

  test(`a tip block is half an ellipse on the last chord, exactly (${reference.halfEllipseTip.source})`, () => {
    const { chord, span, length } = reference.halfEllipseTip;
    const tip = { kind: 'tipBlock', id: 'tip', name: 'Tip', material: 'unit', length, hollow: 0 } as const;
    const found = planformOf(surface([panel({ span, rootChord: chord, tipChord: chord })], [tip]));
    const block = (Math.PI / 4) * chord * length;
    const square = chord ** 2 * span + (2 / 3) * chord ** 2 * length;
    expectNear(found.areaProjected, 2 * (chord * span + block), SAME_SUM);
    expectNear(found.mac, square / (chord * span + block), SAME_SUM);
    const outward = (chord * span ** 2) / 2 + block * (span + (4 * length) / (3 * Math.PI));
    expectNear(found.yMac, outward / (chord * span + block), SAME_SUM);
    expectNear(found.span, 2 * (span + length), SAME_SUM);
  });
});
