import { describe, expect, it } from 'vitest';
import { spread, type Label } from '#client/features/drawing/figure/labels.ts';
import {
  FITTED,
  fromPx,
  layOnPaper,
  panned,
  pathOf,
  scaleNote,
  toPx,
  zoomedAt,
  type Zoom,
} from '#client/components/drawing/sheet.ts';
import { halfLayers, modelLayers } from '#client/features/drawing/figure/drawings.ts';
import { planSentence, planTitle } from '#client/features/drawing/figure/plan-words.ts';
import { estimate } from '#shared/core/estimate.ts';
import { USUAL_UNITS } from '#shared/format/units.ts';
import { demoPlan } from '#tests/support/plans.ts';

const margins = { top: 10, right: 30, bottom: 20, left: 40 };
const wing = { min: [-5, 0], max: [145, 600] } as const;
const paper = { width: 670, margins, maxHeight: 400, minHeight: 100 };

describe('the sheet', () => {
  it('fits the drawing between its margins, to scale both ways', () => {
    const { sheet, height } = layOnPaper(wing, { ...paper, axes: 'plan' });
    // 600 mm of span on 670 − 40 − 30 = 600 px
    expect(sheet.scale).toBe(1);
    expect(toPx(sheet, [-5, 0])).toEqual([40, 10]);
    expect(toPx(sheet, [145, 600])).toEqual([640, 160]);
    expect(height).toBe(180);
  });

  it('is turned back from px to mm, in plan and in elevation', () => {
    for (const axes of ['plan', 'elevation'] as const) {
      const { sheet } = layOnPaper(wing, { ...paper, axes, factor: 2 });
      const [a, b] = fromPx(sheet, toPx(sheet, [17, 311]));
      expect(a).toBeCloseTo(17, 9);
      expect(b).toBeCloseTo(311, 9);
    }
  });

  it('keeps a tall drawing within its height and a small one within its scale', () => {
    const { sheet } = layOnPaper({ min: [0, 0], max: [740, 600] }, { ...paper, axes: 'plan' });
    expect(sheet.scale).toBe(0.5);
    expect(
      layOnPaper({ min: [0, 0], max: [1, 1] }, { ...paper, axes: 'plan', maxScale: 4 }).sheet.scale,
    ).toBe(4);
  });

  it('tells its scale as on paper: 96 px are an inch (CSS Values and Units)', () => {
    expect(scaleNote({ scale: 96 / 25.4 })).toBe('1\u202f:\u202f1.0');
    expect(scaleNote({ scale: 96 / 25.4 / 3.2 })).toBe('1\u202f:\u202f3.2');
    expect(scaleNote({ scale: (2 * 96) / 25.4 })).toBe('2.0\u202f:\u202f1');
    expect(scaleNote({ scale: 96 / 25.4 / 12 })).toBe('1\u202f:\u202f12');
  });

  it('becomes larger about the place that is pointed at, and smaller again until it is fitted', () => {
    const { sheet, middle } = layOnPaper(wing, { ...paper, axes: 'plan' });
    const place = [500, 90] as const;
    const seen = (zoom: Zoom) => {
      const larger = layOnPaper(wing, { ...paper, axes: 'plan', factor: zoom.factor }).sheet;
      return fromPx(larger, [place[0] - zoom.panX, place[1] - zoom.panY]);
    };
    const near = zoomedAt(FITTED, 3, place, middle);
    const nearer = zoomedAt(near, 1.7, place, middle);
    for (const zoom of [near, nearer]) {
      expect(seen(zoom)[0]).toBeCloseTo(fromPx(sheet, place)[0], 9);
      expect(seen(zoom)[1]).toBeCloseTo(fromPx(sheet, place)[1], 9);
    }
    expect(nearer.factor).toBeCloseTo(5.1, 9);
    expect(zoomedAt(nearer, 1 / 6, place, middle)).toEqual(FITTED);
    expect(zoomedAt(FITTED, 0.5, place, middle)).toEqual(FITTED);
  });

  it('cannot be pushed out of sight', () => {
    const laid = layOnPaper(wing, { ...paper, axes: 'plan', factor: 4 });
    const pushed = panned({ factor: 4, panX: 0, panY: 0 }, 1e6, -1e6, wing, laid);
    const left = toPx(laid.sheet, wing.min)[0] + pushed.panX;
    const bottom = toPx(laid.sheet, wing.max)[1] + pushed.panY;
    expect([left, bottom]).toEqual([laid.width - 60, 60]);
  });

  it('writes lines in tenths of a px, closed where they are areas', () => {
    const sheet = { scale: 1, originX: 0, originY: 0, axes: 'plan' } as const;
    expect(
      pathOf(
        sheet,
        [
          [0, 0],
          [1.04, 2.06],
        ],
        false,
      ),
    ).toBe('M0 0L2.1 1');
    expect(
      pathOf(
        sheet,
        [
          [0, 0],
          [1, 2],
          [0, 4],
        ],
        true,
      ),
    ).toBe('M0 0L2 1L4 0Z');
  });
});

describe('labels', () => {
  const label = (text: string, at: number): Label => ({ text, at, tone: 'pencil' });

  it('stand at their lines where there is room', () => {
    expect(spread([label('b', 80), label('a', 20)], 0, 200).map(({ place }) => place)).toEqual([20, 80]);
  });

  it('are stacked about their lines where these lie close, and stay on the paper', () => {
    const places = spread([label('a', 50), label('b', 52), label('c', 54)], 0, 200).map(({ place }) => place);
    expect(places).toEqual([38, 52, 66]);
    expect(spread([label('a', 198), label('b', 199)], 0, 200).map(({ place }) => place)).toEqual([186, 200]);
  });
});

describe('layers', () => {
  const plan = demoPlan('dunlin');

  it('of a surface that an edit left alone are the same objects as before', () => {
    const edited = {
      ...plan,
      surfaces: plan.surfaces.map((s, i) => (i === 0 ? { ...s, parts: s.parts.slice(1) } : s)),
    };
    const [before, after] = [modelLayers(plan, 'above'), modelLayers(edited, 'above')];
    const shapes = (layers: typeof before, key: string) => layers.find((layer) => layer.key === key)?.shapes;
    expect(shapes(after, 'tailplane')).toBe(shapes(before, 'tailplane'));
    expect(shapes(after, 'wing')).not.toBe(shapes(before, 'wing'));
  });

  it('of the two halves are told apart', () => {
    const [starboard] = halfLayers(plan.surfaces[0]!, plan.materials, 'starboard');
    const [port] = halfLayers(plan.surfaces[0]!, plan.materials, 'port');
    expect(port?.shapes).not.toBe(starboard?.shapes);
  });
});

describe('the drawing in words', () => {
  const plan = demoPlan('dunlin');
  const result = estimate(plan);

  it('says what is seen, how large, and where it balances', () => {
    const sentence = planSentence(plan, result, 'half', plan.surfaces[0]!, USUAL_UNITS);
    expect(sentence).toMatch(/^Wing, one half laid flat: 2 panels of 370 and 215 mm/);
    expect(sentence).toContain('ribs at 13 stations');
    expect(sentence).toContain('aft of the datum');
    expect(planSentence(plan, result, 'side', null, USUAL_UNITS)).toContain(
      'from the side: wing, tailplane, fin',
    );
  });

  it('names the half only where there are two', () => {
    expect(planTitle('half', plan.surfaces[0]!, 'port', false)).toBe('Wing, port half, laid flat');
    expect(planTitle('half', plan.surfaces[2]!, 'starboard', false)).toBe('Fin, laid flat');
  });
});
